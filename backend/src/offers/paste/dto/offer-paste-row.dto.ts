import { ApiProperty, ApiSchema } from '@nestjs/swagger';

export const OFFER_PASTE_ACTIONS = ['add', 'change', 'same', 'wrong'] as const;
export type OfferPasteAction = (typeof OFFER_PASTE_ACTIONS)[number];

/** One thing that is wrong in a pasted row. */
@ApiSchema({ name: 'OfferPasteProblem' })
export class OfferPasteProblemDto {
  @ApiProperty({ type: 'string', description: 'Name of the column; blank for the row as a whole' })
  column!: string;

  @ApiProperty({ type: 'string', description: 'The cell, cut short' })
  value!: string;

  @ApiProperty({ type: 'string' })
  message!: string;
}

/** What one pasted row would do. Rows of one part are the price breaks of one offer and do the same. */
@ApiSchema({ name: 'OfferPasteRow' })
export class OfferPasteRowDto {
  @ApiProperty({ type: 'integer', description: 'Row of the pasted text, from 1; the head counts' })
  row!: number;

  @ApiProperty({ enum: OFFER_PASTE_ACTIONS, enumName: 'OfferPasteAction' })
  action!: OfferPasteAction;

  @ApiProperty({ type: 'string', nullable: true })
  partNumber!: string | null;

  @ApiProperty({ type: 'string', nullable: true })
  partDescription!: string | null;

  @ApiProperty({ type: 'string' })
  supplierPartNumber!: string;

  @ApiProperty({ type: 'string', description: 'What happens, in one sentence' })
  summary!: string;

  @ApiProperty({ type: [String], description: 'What changes of the offer, one line each' })
  changes!: string[];

  @ApiProperty({ type: [OfferPasteProblemDto] })
  problems!: OfferPasteProblemDto[];
}
