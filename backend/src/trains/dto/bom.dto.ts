import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type BomEdits } from '../bom-edits.js';
import { ExtraLineDto } from '../bom-edits/dto/extra-line.dto.js';
import {
  BOM_KINDS,
  type BomKind,
  type BomLine,
  bomTotals,
  type EditedBom,
  type GearDataRow,
} from '@stageyard/libs/bill-of-materials';

/** One row of the data for the gear maker. */
@ApiSchema({ name: 'GearDataRow' })
export class GearDataRowDto implements GearDataRow {
  @ApiProperty({ type: 'string', enum: ['blank', 'teeth', 'mate'] })
  group!: GearDataRow['group'];

  @ApiProperty({ type: 'string' })
  label!: string;

  @ApiProperty({ type: 'string' })
  symbol!: string;

  @ApiProperty({ oneOf: [{ type: 'number' }, { type: 'string' }], nullable: true })
  value!: number | string | null;

  @ApiProperty({ type: 'string', enum: ['', 'mm', '°'] })
  unit!: GearDataRow['unit'];

  @ApiProperty({ type: 'integer', description: 'Decimals to show a number with' })
  digits!: number;
}

/** What a line would hold if nobody had chosen another part for it. */
@ApiSchema({ name: 'ReplacedPart' })
export class ReplacedPartDto {
  @ApiProperty({ type: 'string', nullable: true, description: 'Null: the library holds none' })
  partNumber!: string | null;

  @ApiProperty({ type: 'string' })
  description!: string;
}

/** A chosen part whose line the kit no longer has. */
@ApiSchema({ name: 'IdleSwap' })
export class IdleSwapDto {
  @ApiProperty({ type: 'string' })
  key!: string;

  @ApiProperty({ type: 'string' })
  partNumber!: string;
}

/** One line of a bill of materials. */
@ApiSchema({ name: 'BomLine' })
export class BomLineDto implements Omit<BomLine, 'needs' | 'replaces' | 'extraLineId'> {
  @ApiProperty({ type: 'integer' })
  findNumber!: number;

  @ApiProperty({ type: 'string', description: 'Stays with the line while its kit asks for the same' })
  key!: string;

  @ApiProperty({ type: 'string', nullable: true, description: 'Null: to be made, or to be chosen' })
  partNumber!: string | null;

  @ApiProperty({ enum: BOM_KINDS, enumName: 'BomKind' })
  kind!: BomKind;

  @ApiProperty({ type: 'string' })
  description!: string;

  @ApiProperty({ type: 'number' })
  quantity!: number;

  @ApiProperty({ type: 'string', enum: ['pcs', 'l', 'm'] })
  unit!: BomLine['unit'];

  @ApiProperty({ type: 'string', nullable: true })
  material!: string | null;

  @ApiProperty({ type: 'string', enum: ['made', 'bought'] })
  supply!: BomLine['supply'];

  @ApiProperty({ type: 'string', nullable: true })
  supplier!: string | null;

  @ApiProperty({ type: 'number', nullable: true, description: 'For one unit of quantity (kg)' })
  mass!: number | null;

  @ApiProperty({ type: [String], description: 'Where it is used: `Stage 1 pinion`, `Shaft 2`' })
  source!: string[];

  @ApiProperty({ type: 'string' })
  note!: string;

  @ApiProperty({ type: [String], description: 'What a person must look at before ordering' })
  flags!: string[];

  @ApiProperty({
    type: ReplacedPartDto,
    nullable: true,
    description: 'The kit’s own part, where a person chose another for the line',
  })
  replaces!: ReplacedPartDto | null;

  @ApiProperty({ type: 'string', nullable: true, description: 'Of a line that a person added' })
  extraLineId!: string | null;

  @ApiProperty({ type: [GearDataRowDto], required: false, description: 'For a gear to be made' })
  gearData?: GearDataRowDto[];
}

@ApiSchema({ name: 'BomTotals' })
export class BomTotalsDto {
  @ApiProperty({ type: 'integer' })
  lines!: number;

  @ApiProperty({ type: 'integer', description: 'Lines to be made' })
  made!: number;

  @ApiProperty({ type: 'integer', description: 'Lines to be bought' })
  bought!: number;

  @ApiProperty({ type: 'number', description: 'Over the lines with a known mass (kg)' })
  massKg!: number;

  @ApiProperty({ type: 'integer' })
  linesWithoutMass!: number;
}

/** The bill of materials of a train. */
@ApiSchema({ name: 'Bom' })
export class BomDto {
  @ApiProperty({ type: [BomLineDto] })
  lines!: BomLineDto[];

  @ApiProperty({ type: BomTotalsDto })
  totals!: BomTotalsDto;

  @ApiProperty({ type: [String], description: 'Every flag that stands on a line, once' })
  flags!: string[];

  @ApiProperty({ type: [ExtraLineDto], description: 'The added lines as they were typed, to be edited' })
  extraLines!: ExtraLineDto[];

  @ApiProperty({ type: [IdleSwapDto], description: 'Kept in case their lines come back' })
  idleSwaps!: IdleSwapDto[];
}

/** @param edits of the train, as they are stored */
export function toBomDto({ lines, idleKeys }: EditedBom, edits: BomEdits): BomDto {
  return {
    lines: lines.map(toBomLine),
    totals: bomTotals(lines),
    flags: [...new Set(lines.flatMap((line) => line.flags))],
    extraLines: edits.extraLines,
    idleSwaps: idleKeys.map((key) => ({ key, partNumber: edits.swaps[key] ?? '' })),
  };
}

/** What its places ask for stays inside. */
function toBomLine({ needs: _, ...line }: BomLine): BomLineDto {
  return { ...line, replaces: line.replaces ?? null, extraLineId: line.extraLineId ?? null };
}
