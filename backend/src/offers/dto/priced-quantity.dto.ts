import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { type PricedQuantity } from '@stageyard/libs/bill-of-materials';
import { PRICE_PER, type PricePer } from '../offer-terms.js';
import { LargerOrderDto } from './larger-order.dto.js';
import { MoneyDto } from './money.dto.js';

/** The price of a needed quantity at one offer. Quantities are in the part's unit. */
@ApiSchema({ name: 'PricedQuantity' })
export class PricedQuantityDto implements PricedQuantity {
  @ApiProperty({ type: 'number' })
  needed!: number;

  @ApiProperty({
    type: 'number',
    description: 'Whole packs, at least the least quantity and the first break',
  })
  orderQuantity!: number;

  @ApiProperty({ type: 'number', description: 'Ordered beyond the need' })
  surplus!: number;

  @ApiProperty({ type: 'integer', description: 'Minor units for `per` units, at the break that is reached' })
  unitPrice!: number;

  @ApiProperty({ type: 'integer', enum: PRICE_PER })
  per!: PricePer;

  @ApiProperty({ type: 'number', description: 'From this quantity on the price holds' })
  breakQuantity!: number;

  @ApiProperty({ type: MoneyDto, description: 'Order quantity × unit price ÷ per, rounded once' })
  lineTotal!: MoneyDto;

  @ApiProperty({
    type: LargerOrderDto,
    nullable: true,
    description: 'A larger order that costs less in total',
  })
  cheaperAt!: LargerOrderDto | null;
}
