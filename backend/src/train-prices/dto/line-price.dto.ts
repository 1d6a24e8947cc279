import { ApiProperty, ApiSchema } from '@nestjs/swagger';
import { PRICE_PER, type PricePer } from '../../offers/offer-terms.js';

/** Who sells it. */
@ApiSchema({ name: 'PriceSupplier' })
export class PriceSupplierDto {
  @ApiProperty({ type: 'string', example: 'S-0001' })
  code!: string;

  @ApiProperty({ type: 'string' })
  name!: string;
}

/** A larger order that costs less in total. */
@ApiSchema({ name: 'CheaperOrder' })
export class CheaperOrderDto {
  @ApiProperty({ type: 'number', description: "In the line's unit" })
  orderQuantity!: number;

  @ApiProperty({ type: 'integer', description: 'Minor units of the currency of the price' })
  lineTotal!: number;

  @ApiProperty({ type: 'integer', description: 'Minor units less than what is needed costs' })
  saves!: number;
}

/** What one line costs, and from whom. */
@ApiSchema({ name: 'LinePrice' })
export class LinePriceDto {
  @ApiProperty({ type: 'string' })
  offerId!: string;

  @ApiProperty({ type: PriceSupplierDto })
  supplier!: PriceSupplierDto;

  @ApiProperty({ type: 'string', description: 'Blank when it is not known' })
  supplierPartNumber!: string;

  @ApiProperty({ type: 'string', description: 'ISO 4217' })
  currency!: string;

  @ApiProperty({ type: 'integer', enum: PRICE_PER, description: 'The unit price is for this many' })
  per!: PricePer;

  @ApiProperty({ type: 'integer', description: 'Minor units, at the break that the order reaches' })
  unitPrice!: number;

  @ApiProperty({ type: 'number', description: 'Whole packs, at least the least quantity' })
  orderQuantity!: number;

  @ApiProperty({
    type: 'integer',
    description: 'Minor units: order quantity × unit price ÷ per, rounded once',
  })
  lineTotal!: number;

  @ApiProperty({ type: 'number', description: 'Ordered beyond the need' })
  surplus!: number;

  @ApiProperty({ type: CheaperOrderDto, nullable: true })
  cheaperAt!: CheaperOrderDto | null;

  @ApiProperty({
    type: 'integer',
    nullable: true,
    description: "Calendar days; the supplier's usual lead time where the offer has none; null: not known",
  })
  leadTimeDays!: number | null;

  @ApiProperty({ type: 'string', format: 'date', description: 'Day on which the supplier stated the price' })
  pricedOn!: string;

  @ApiProperty({ type: 'integer', description: 'Age of the price, calendar days' })
  ageDays!: number;

  @ApiProperty({ type: 'boolean', description: 'Older than the house rule allows' })
  tooOld!: boolean;

  @ApiProperty({
    type: 'string',
    format: 'date',
    nullable: true,
    description: 'Last day; null: until further notice',
  })
  validUntil!: string | null;

  @ApiProperty({ type: 'string', enum: ['rule', 'person'] })
  chosenBy!: 'rule' | 'person';
}
