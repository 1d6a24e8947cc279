import { ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { OFFER_LIMITS } from '@stageyard/libs/bill-of-materials';
import { Transform } from 'class-transformer';
import { IsIn, IsOptional, ValidateBy } from 'class-validator';
import { numberFromQuery } from '../../common/list-query.js';
import { PREFERENCES, type Preference } from '../offer-terms.js';

const MOST = OFFER_LIMITS.quantity;

/** What is asked of a part's offers. */
@ApiSchema({ name: 'PartOffersQuery' })
export class PartOffersQueryDto {
  @ApiPropertyOptional({
    type: 'number',
    minimum: 0,
    exclusiveMinimum: true,
    maximum: MOST,
    default: 1,
    description: "Needed, in the part's unit: whole pieces, or litres with at most three decimals",
  })
  @IsOptional()
  @Transform(numberFromQuery)
  @ValidateBy({
    name: 'neededQuantity',
    constraints: [MOST],
    validator: {
      validate: (value) => typeof value === 'number' && value > 0 && value <= MOST,
      defaultMessage: () => `quantity must be above 0 and at most ${MOST.toLocaleString('en-GB')}.`,
    },
  })
  quantity?: number;

  @ApiPropertyOptional({
    enum: PREFERENCES,
    default: 'price',
    description: 'What the best offer is chosen by',
  })
  @IsOptional()
  @IsIn(PREFERENCES, { message: `prefer must be one of: ${PREFERENCES.join(', ')}.` })
  prefer?: Preference;
}
