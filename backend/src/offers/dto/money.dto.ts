import { ApiProperty, ApiSchema } from '@nestjs/swagger';

/** An amount of money. */
@ApiSchema({ name: 'Money' })
export class MoneyDto {
  @ApiProperty({ type: 'integer', description: 'Whole minor units: 1250 is 12.50 EUR or 1,250 JPY' })
  minor!: number;

  @ApiProperty({ type: 'string', description: 'ISO 4217', example: 'EUR' })
  currency!: string;
}
