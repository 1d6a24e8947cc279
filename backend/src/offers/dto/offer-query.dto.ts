import { ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { isCalendarDate, type OfferState } from '@stageyard/libs/bill-of-materials';
import { Transform } from 'class-transformer';
import { IsBoolean, IsIn, IsOptional, IsString, MaxLength, ValidateBy } from 'class-validator';
import { booleanFromQuery, ListQueryDto } from '../../common/list-query.js';
import { OFFER_STATES } from '../offer-terms.js';

/** Fields that the list of offers can be sorted by. */
export const OFFER_SORTS = [
  'part',
  'supplier',
  'supplierPartNumber',
  'leadTimeDays',
  'pricedOn',
  'validUntil',
  'updatedAt',
] as const;
export type OfferSort = (typeof OFFER_SORTS)[number];

/**
 * Filters of the offers; every one narrows the list. Every word of the text must stand in the part's number or
 * description, the supplier's name or code, or the supplier's part number.
 */
@ApiSchema({ name: 'OfferQuery' })
export class OfferQueryDto extends ListQueryDto {
  @ApiPropertyOptional({ type: 'string', maxLength: 20, description: 'Code of the supplier' })
  @IsOptional()
  @IsString()
  @MaxLength(20)
  supplier?: string;

  @ApiPropertyOptional({ type: 'string', maxLength: 40, description: 'Part number, whole' })
  @IsOptional()
  @IsString()
  @MaxLength(40)
  part?: string;

  @ApiPropertyOptional({ type: 'string', maxLength: 3, description: 'Currency (ISO 4217)' })
  @IsOptional()
  @IsString()
  @MaxLength(3)
  currency?: string;

  @ApiPropertyOptional({ enum: OFFER_STATES, description: 'State today' })
  @IsOptional()
  @IsIn(OFFER_STATES, { message: `state must be one of: ${OFFER_STATES.join(', ')}.` })
  state?: OfferState;

  @ApiPropertyOptional({
    type: 'boolean',
    description: 'true: the price is older than the house rule allows',
  })
  @IsOptional()
  @Transform(booleanFromQuery)
  @IsBoolean()
  tooOld?: boolean;

  @ApiPropertyOptional({
    type: 'string',
    format: 'date',
    description: 'Valid today, with a last day at or before this one',
  })
  @IsOptional()
  @ValidateBy({
    name: 'calendarDay',
    validator: {
      validate: (value) => typeof value === 'string' && isCalendarDate(value),
      defaultMessage: () => 'endsBy must be a day of the calendar, written like 2026-03-31.',
    },
  })
  endsBy?: string;
}
