import { ApiSchema } from '@nestjs/swagger';
import { FieldCurrency } from '../../../common/field-currency.decorator.js';
import { FieldDate } from '../../../common/field-date.decorator.js';
import { FieldText } from '../../../common/field-text.decorator.js';
import { SOURCE_LENGTH } from '../../offer-terms.js';

/** What holds for every row whose own cell is blank. */
@ApiSchema({ name: 'OfferPasteDefaults' })
export class OfferPasteDefaultsDto {
  @FieldDate({
    description: 'Day on which the supplier stated the prices; today when left out',
    optional: true,
  })
  pricedOn?: string;

  @FieldDate({ description: 'First day on which can be ordered', optional: true })
  validFrom?: string;

  @FieldDate({ description: 'Last day', optional: true })
  validUntil?: string;

  @FieldText({ description: 'Where the prices come from', max: SOURCE_LENGTH, optional: true })
  source?: string;

  @FieldCurrency({ description: "Currency of bare figures; the supplier's when left out", optional: true })
  currency?: string;
}
