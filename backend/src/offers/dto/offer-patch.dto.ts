import { ApiSchema } from '@nestjs/swagger';
import { FieldChoice } from '../../common/field-choice.decorator.js';
import { FieldCurrency } from '../../common/field-currency.decorator.js';
import { FieldDate } from '../../common/field-date.decorator.js';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { FieldText } from '../../common/field-text.decorator.js';
import {
  OFFER_STANDINGS,
  type OfferStanding,
  PRICE_PER,
  type PricePer,
  SOURCE_LENGTH,
  SUPPLIER_NUMBER_LENGTH,
} from '../offer-terms.js';
import { FieldBreaks, FieldLeadTime, FieldOfferQuantity } from './offer-fields.js';
import { type PriceBreakDto } from './price-break.dto.js';

/** A change to an offer: the version that was seen, and the fields that change. Part and supplier stay for good. */
@ApiSchema({ name: 'OfferPatch' })
export class OfferPatchDto {
  @FieldFigure({
    description: 'Version that was seen before the edit',
    min: 1,
    max: Number.MAX_SAFE_INTEGER,
    whole: true,
  })
  version!: number;

  @FieldText({
    description: "The supplier's own number for the part",
    max: SUPPLIER_NUMBER_LENGTH,
    optional: true,
  })
  supplierPartNumber?: string;

  @FieldChoice({
    description: 'open, or closed: kept for the record and never chosen',
    values: OFFER_STANDINGS,
    optional: true,
    enumName: 'OfferStanding',
  })
  standing?: OfferStanding;

  @FieldCurrency({ description: 'Currency of the prices', optional: true })
  currency?: string;

  @FieldChoice({ description: 'Prices are for this many', values: PRICE_PER, optional: true })
  per?: PricePer;

  @FieldBreaks({ optional: true })
  breaks?: PriceBreakDto[];

  @FieldOfferQuantity('Sold in multiples of this')
  pack?: number;

  @FieldOfferQuantity('Least quantity of one order')
  leastQuantity?: number;

  @FieldLeadTime()
  leadTimeDays?: number | null;

  @FieldDate({ description: 'First day on which it can be ordered', optional: true })
  validFrom?: string;

  @FieldDate({ description: 'Last day; null: until further notice', nullable: true })
  validUntil?: string | null;

  @FieldDate({ description: 'Day on which the supplier stated the price', optional: true })
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
