import { ApiPropertyOptional } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { IsIn, IsInt, IsOptional, Max, Min } from 'class-validator';
import { numberFromQuery } from '../../common/list-query.js';
import { BUILD_QUANTITY } from '../../briefs/requirement.js';
import { PREFERENCES, type Preference } from '../../offers/offer-terms.js';

const WHOLE = `quantity must be a whole number from ${BUILD_QUANTITY.min} to ${BUILD_QUANTITY.max.toLocaleString('en-GB')}.`;

/** For how many builds something is asked. */
export class BuildQuantityQueryDto {
  @ApiPropertyOptional({
    type: 'integer',
    minimum: BUILD_QUANTITY.min,
    maximum: BUILD_QUANTITY.max,
    description: 'Builds to count with; the build quantity that was named when left out, else 1',
  })
  @IsOptional()
  @Transform(numberFromQuery)
  @IsInt({ message: WHOLE })
  @Min(BUILD_QUANTITY.min, { message: WHOLE })
  @Max(BUILD_QUANTITY.max, { message: WHOLE })
  quantity?: number;
}

/** For how many builds a train is priced, and what the rule prefers. */
export class PriceQueryDto extends BuildQuantityQueryDto {
  @ApiPropertyOptional({ enum: PREFERENCES, default: 'price', description: 'What ranks the offers' })
  @IsOptional()
  @IsIn(PREFERENCES)
  prefer?: Preference;
}
