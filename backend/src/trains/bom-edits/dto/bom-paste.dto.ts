import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { TrainDto } from '../../dto/train.dto.js';

export const PASTE_ACTIONS = ['choose', 'add', 'same', 'wrong'] as const;
export type BomPasteAction = (typeof PASTE_ACTIONS)[number];

/** One thing that is wrong in a pasted row. */
@ApiSchema({ name: 'BomPasteProblem' })
export class BomPasteProblemDto {
  @ApiProperty({ type: 'string', description: 'Name of the column' })
  column!: string;

  @ApiProperty({ type: 'string', description: 'The cell, cut short' })
  value!: string;

  @ApiProperty({ type: 'string' })
  message!: string;
}

/** What one pasted row would do. */
@ApiSchema({ name: 'BomPasteRow' })
export class BomPasteRowDto {
  @ApiProperty({ type: 'integer', description: 'Row of the pasted text, from 1; the head counts' })
  row!: number;

  @ApiProperty({
    enum: PASTE_ACTIONS,
    enumName: 'BomPasteAction',
    description: 'choose: another part or quantity for a line; add: a new line',
  })
  action!: BomPasteAction;

  @ApiProperty({ type: 'integer', nullable: true })
  findNumber!: number | null;

  @ApiProperty({ type: 'string', nullable: true })
  partNumber!: string | null;

  @ApiProperty({ type: 'string', nullable: true })
  partDescription!: string | null;

  @ApiProperty({ type: 'string', description: 'What happens, in one sentence' })
  summary!: string;

  @ApiProperty({ type: [String] })
  changes!: string[];

  @ApiProperty({ type: [BomPasteProblemDto] })
  problems!: BomPasteProblemDto[];
}

/** A column of the pasted table as it was understood. */
@ApiSchema({ name: 'BomPasteColumn' })
export class BomPasteColumnDto {
  @ApiProperty({ type: 'string', description: 'What it is taken for' })
  name!: string;

  @ApiProperty({ type: 'string', description: 'Its own heading, or its place where there is no head row' })
  from!: string;
}

@ApiSchema({ name: 'BomPasteCounts' })
export class BomPasteCountsDto {
  @ApiProperty({ type: 'integer' })
  choose!: number;

  @ApiProperty({ type: 'integer' })
  add!: number;

  @ApiProperty({ type: 'integer' })
  same!: number;

  @ApiProperty({ type: 'integer' })
  wrong!: number;
}

/** What pasted rows would do; nothing is booked. */
@ApiSchema({ name: 'BomPastePreview' })
export class BomPastePreviewDto {
  @ApiProperty({ type: [BomPasteColumnDto] })
  columns!: BomPasteColumnDto[];

  @ApiProperty({ type: [BomPasteRowDto] })
  rows!: BomPasteRowDto[];

  @ApiProperty({ type: BomPasteCountsDto })
  counts!: BomPasteCountsDto;

  @ApiProperty({ type: 'integer', description: 'The version of the train that was looked at' })
  version!: number;

  @ApiProperty({ type: 'string', description: 'Send it back to book exactly this' })
  token!: string;
}

/** What was booked. */
@ApiSchema({ name: 'BomPasteBooked' })
export class BomPasteBookedDto {
  @ApiProperty({ type: 'integer', description: 'Lines with another part or quantity' })
  chosen!: number;

  @ApiProperty({ type: 'integer' })
  added!: number;

  @ApiProperty({ type: 'integer' })
  same!: number;

  @ApiProperty({ type: 'integer' })
  leftOut!: number;

  @ApiProperty({ type: TrainDto })
  train!: TrainDto;
}
