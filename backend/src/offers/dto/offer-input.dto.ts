import { ApiSchema } from '@nestjs/swagger';
import { FieldChoice } from '../../common/field-choice.decorator.js';
import { FieldCurrency } from '../../common/field-currency.decorator.js';
import { FieldDate } from '../../common/field-date.decorator.js';
import { FieldText } from '../../common/field-text.decorator.js';
import { FieldPartNumber } from '../../parts/part-number.js';
import { PRICE_PER, type PricePer, SOURCE_LENGTH, SUPPLIER_NUMBER_LENGTH } from '../offer-terms.js';
import { FieldBreaks, FieldLeadTime, FieldOfferQuantity } from './offer-fields.js';
import { type PriceBreakDto } from './price-break.dto.js';

/** A new offer: what one supplier asks for one part. Quantities are in the part's unit. */
@ApiSchema({ name: 'OfferInput' })
export class OfferInputDto {
  @FieldPartNumber({ description: 'Part that is offered' })
  partNumber!: string;

  @FieldText({ description: 'Code of the supplier', min: 1, max: 20, example: 'S-0001' })
  supplierCode!: string;

  @FieldText({
    description: "The supplier's own number for the part",
    max: SUPPLIER_NUMBER_LENGTH,
    optional: true,
  })
  supplierPartNumber?: string;

  @FieldCurrency({ description: "Currency of the prices; the supplier's when left out", optional: true })
  currency?: string;

  @FieldChoice({
    description: 'Prices are for this many; 1 when left out',
    values: PRICE_PER,
    optional: true,
    default: 1,
  })
  per?: PricePer;

  @FieldBreaks()
  breaks!: PriceBreakDto[];

  @FieldOfferQuantity('Sold in multiples of this; 1 when left out')
  pack?: number;

  @FieldOfferQuantity('Least quantity of one order; the smallest price break when left out')
  leastQuantity?: number;

  @FieldLeadTime()
  leadTimeDays?: number | null;

  @FieldDate({ description: 'First day on which it can be ordered; today when left out', optional: true })
  validFrom?: string;

  @FieldDate({ description: 'Last day; null: until further notice', nullable: true })
  validUntil?: string | null;

  @FieldDate({
    description: 'Day on which the supplier stated the price; today when left out',
    optional: true,
  })
  pricedOn?: string;

  @FieldText({
    description: 'Where the price comes from: a quotation, a price list, a call',
    max: SOURCE_LENGTH,
    optional: true,
  })
  source?: string;

  @FieldText({ description: 'Note', max: 10_000, multiline: true, optional: true })
  note?: string;
}
