import { ApiPropertyOptional, ApiSchema } from '@nestjs/swagger';
import { isInThousandths } from '@stageyard/libs/bill-of-materials';
import { Transform } from 'class-transformer';
import { IsOptional, ValidateBy } from 'class-validator';

/** Greatest quantity that can be asked for. */
export const MOST_ASKED = 1_000_000;

/** How many are needed. */
@ApiSchema({ name: 'SubstitutesQuery' })
export class SubstitutesQueryDto {
  @ApiPropertyOptional({
    type: 'number',
    minimum: 0,
    exclusiveMinimum: true,
    maximum: MOST_ASKED,
    description: 'In the unit of the part, at most three decimals; 1 when left out',
  })
  @IsOptional()
  @Transform(({ value }: { value: unknown }) =>
    typeof value === 'string' && /^\d{1,9}(\.\d+)?$/.test(value) ? Number(value) : value,
  )
  @ValidateBy({
    name: 'askedQuantity',
    constraints: [MOST_ASKED],
    validator: {
      validate: (value) =>
        typeof value === 'number' && value > 0 && value <= MOST_ASKED && isInThousandths(value),
      defaultMessage: () =>
        'quantity must be a number above 0 and at most 1,000,000 with at most three decimals.',
    },
  })
  quantity?: number;
}
