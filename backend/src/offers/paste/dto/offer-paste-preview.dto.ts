import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { OfferPasteRowDto } from './offer-paste-row.dto.js';

/** A column of the pasted table as it was understood. */
@ApiSchema({ name: 'OfferPasteColumn' })
export class OfferPasteColumnDto {
  @ApiProperty({ type: 'string', description: 'What it is taken for' })
  name!: string;

  @ApiProperty({ type: 'string', description: 'Its own heading, or its place where there is no head row' })
  from!: string;
}

/** Rows by what they would do. */
@ApiSchema({ name: 'OfferPasteCounts' })
export class OfferPasteCountsDto {
  @ApiProperty({ type: 'integer' })
  add!: number;

  @ApiProperty({ type: 'integer' })
  change!: number;

  @ApiProperty({ type: 'integer' })
  same!: number;

  @ApiProperty({ type: 'integer' })
  wrong!: number;
}

/** What pasted rows would do; nothing is booked. */
@ApiSchema({ name: 'OfferPastePreview' })
export class OfferPastePreviewDto {
  @ApiProperty({ type: [OfferPasteColumnDto] })
  columns!: OfferPasteColumnDto[];

  @ApiProperty({ type: [OfferPasteRowDto] })
  rows!: OfferPasteRowDto[];

  @ApiProperty({ type: OfferPasteCountsDto })
  counts!: OfferPasteCountsDto;

  @ApiProperty({ type: 'string', description: 'Send it back to book exactly this' })
  token!: string;
}

/** What was booked. */
@ApiSchema({ name: 'OfferPasteBooked' })
export class OfferPasteBookedDto {
  @ApiProperty({ type: 'integer', description: 'Offers that are new' })
  added!: number;

  @ApiProperty({ type: 'integer', description: 'Offers that changed' })
  changed!: number;

  @ApiProperty({ type: 'integer', description: 'Offers that were like this already' })
  same!: number;

  @ApiProperty({ type: 'integer', description: 'Rows that are wrong and were left out' })
  leftOut!: number;
}
