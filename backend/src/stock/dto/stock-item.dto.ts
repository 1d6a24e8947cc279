import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { PART_KINDS, PART_STANDINGS, type PartKind, type PartStanding } from '../../parts/part-kinds.js';
import { PART_UNITS, unitOf, type PartUnit } from '../../parts/part-unit.js';
import type { Part } from '../../parts/entities/part.entity.js';
import { fromThousandths } from '../thousandths.js';
import type { ShelfLevels } from '../stock-levels.service.js';
import { StockPlaceDto } from './stock-place.dto.js';

/** One part as it lies on the shelf, over all places. */
@ApiSchema({ name: 'StockItem' })
export class StockItemDto {
  @ApiProperty({ type: 'string', example: 'KW-00417' })
  number!: string;

  @ApiProperty({ type: 'string' })
  description!: string;

  @ApiProperty({ enum: PART_KINDS, enumName: 'PartKind' })
  kind!: PartKind;

  @ApiProperty({ enum: PART_STANDINGS, enumName: 'PartStanding' })
  standing!: PartStanding;

  @ApiProperty({ enum: PART_UNITS, enumName: 'PartUnit' })
  unit!: PartUnit;

  @ApiProperty({ type: 'number', description: 'The sum over all places' })
  quantity!: number;

  @ApiProperty({
    type: 'number',
    nullable: true,
    description: 'Below this the shelf is low; null: not watched',
  })
  leastStock!: number | null;

  @ApiProperty({ type: 'boolean' })
  low!: boolean;

  @ApiProperty({
    type: [StockPlaceDto],
    description: 'Every place it ever lay at, also those with none left',
  })
  places!: StockPlaceDto[];

  @ApiProperty({ type: 'integer', description: "The part's version; send it back with the least stock" })
  version!: number;
}

/** @param shelf of this part; undefined when it never lay anywhere */
export function toStockItem(part: Part, shelf: ShelfLevels | undefined): StockItemDto {
  const { total, places } = shelf ?? { total: 0, places: [] };
  const leastStock = part.leastStock === null ? null : fromThousandths(part.leastStock);
  return {
    number: part.number,
    description: part.description,
    kind: part.kind,
    standing: part.standing,
    unit: unitOf(part.kind),
    quantity: total,
    leastStock,
    low: leastStock !== null && total < leastStock,
    places,
    version: part.version,
  };
}
