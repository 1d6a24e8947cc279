import { ApiExtraModels, ApiProperty, ApiSchema, refs } from '@nestjs/swagger';
import { type Part } from '../entities/part.entity.js';
import {
  PART_KINDS,
  PART_STANDINGS,
  PART_SUPPLIES,
  type PartKind,
  type PartStanding,
  type PartSupply,
} from '../part-kinds.js';
import { fromThousandths } from '../../stock/thousandths.js';
import { PART_UNITS, type PartUnit, unitOf } from '../part-unit.js';
import { ATTRIBUTE_CLASSES, type PartAttributes } from './attributes/part-attributes.js';

/** One row of the library: everything that is stored about a part. */
@ApiSchema({ name: 'PartSummary' })
@ApiExtraModels(...ATTRIBUTE_CLASSES)
export class PartSummaryDto {
  @ApiProperty({ type: 'string', description: 'Stays for good, whatever happens to the part' })
  id!: string;

  @ApiProperty({ type: 'string', example: 'KW-00417' })
  number!: string;

  @ApiProperty({ enum: PART_KINDS, enumName: 'PartKind' })
  kind!: PartKind;

  @ApiProperty({ type: 'string' })
  description!: string;

  @ApiProperty({ enum: PART_STANDINGS, enumName: 'PartStanding' })
  standing!: PartStanding;

  @ApiProperty({ type: 'string', nullable: true, description: 'Part to use instead of a withdrawn one' })
  successorNumber!: string | null;

  @ApiProperty({ type: 'string', nullable: true })
  material!: string | null;

  @ApiProperty({ type: 'number', nullable: true, description: 'Mass of one (kg)' })
  mass!: number | null;

  @ApiProperty({ enum: PART_SUPPLIES, enumName: 'PartSupply' })
  supply!: PartSupply;

  @ApiProperty({ type: 'string', nullable: true })
  supplier!: string | null;

  @ApiProperty({ type: 'string' })
  note!: string;

  @ApiProperty({ anyOf: refs(...ATTRIBUTE_CLASSES), description: 'The attributes of the kind' })
  attributes!: PartAttributes;

  @ApiProperty({
    type: 'number',
    nullable: true,
    description: "What lies on the shelf over all places, in the part's unit; null: never booked",
  })
  shelf!: number | null;

  @ApiProperty({
    type: 'number',
    nullable: true,
    description: 'Below this the shelf is low; null: not watched',
  })
  leastStock!: number | null;

  @ApiProperty({ enum: PART_UNITS, enumName: 'PartUnit', description: 'What it is counted in' })
  unit!: PartUnit;

  @ApiProperty({ type: 'integer', description: 'Send it back with an edit' })
  version!: number;

  @ApiProperty({ type: 'string', format: 'date-time' })
  createdAt!: string;

  @ApiProperty({ type: 'string', format: 'date-time' })
  updatedAt!: string;

  @ApiProperty({ type: 'string', description: 'Name of the person who changed it last' })
  updatedBy!: string;
}

/** The columns of a part that people see in a row of the library. */
export const SUMMARY_COLUMNS = [
  'id',
  'number',
  'kind',
  'description',
  'standing',
  'successorNumber',
  'material',
  'mass',
  'supply',
  'supplier',
  'note',
  'attributes',
  'leastStock',
  'version',
  'createdAt',
  'updatedAt',
  'updatedBy',
] as const satisfies readonly (keyof Part)[];

/** What is known of a part where a row of the library is shown. */
export type SummarizedPart = Pick<Part, (typeof SUMMARY_COLUMNS)[number]>;

/**
 * What people see of a stored part; the index columns stay inside.
 * @param shelf what lies on the shelf, in the part's unit; null when it never lay there (see `StockLevels`)
 */
export function toPartSummaryDto(part: SummarizedPart, shelf: number | null): PartSummaryDto {
  return {
    id: String(part.id),
    number: part.number,
    kind: part.kind,
    description: part.description,
    standing: part.standing,
    successorNumber: part.successorNumber,
    material: part.material,
    mass: part.mass,
    supply: part.supply,
    supplier: part.supplier,
    note: part.note,
    attributes: part.attributes,
    shelf,
    leastStock: part.leastStock === null ? null : fromThousandths(part.leastStock),
    unit: unitOf(part.kind),
    version: part.version,
    createdAt: part.createdAt,
    updatedAt: part.updatedAt,
    updatedBy: part.updatedBy,
  };
}
