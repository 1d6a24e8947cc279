import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { MoneyDto } from './money.dto.js';

/** A larger order that costs less in total. */
@ApiSchema({ name: 'LargerOrder' })
export class LargerOrderDto {
  @ApiProperty({ type: 'number' })
  orderQuantity!: number;

  @ApiProperty({ type: MoneyDto })
  lineTotal!: MoneyDto;

  @ApiProperty({ type: MoneyDto })
  saves!: MoneyDto;
}
