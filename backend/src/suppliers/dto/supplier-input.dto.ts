import { ApiSchema } from '@nestjs/swagger';
import { FieldChoice } from '../../common/field-choice.decorator.js';
import { FieldCurrency } from '../../common/field-currency.decorator.js';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { FieldText } from '../../common/field-text.decorator.js';
import {
  GREATEST_AMOUNT,
  LONGEST_LEAD_TIME,
  SUPPLIER_LANGUAGES,
  type SupplierLanguage,
} from '../supplier-terms.js';
import { type FreightRuleDto } from './freight-rule.dto.js';
import { type SupplierContactDto } from './supplier-contact.dto.js';
import { FieldContacts, FieldFreight } from './supplier-fields.js';

/** A new supplier; it starts active and gets the next code. */
@ApiSchema({ name: 'SupplierInput' })
export class SupplierInputDto {
  @FieldText({ description: 'Name, unlike that of any other supplier', min: 1, max: 200 })
  name!: string;

  @FieldCurrency({ description: 'What enquiries ask for and new offers start with' })
  currency!: string;

  @FieldChoice({
    description: 'Language that enquiries are written in; English when left out',
    values: SUPPLIER_LANGUAGES,
    optional: true,
    default: 'en',
    enumName: 'SupplierLanguage',
  })
  language?: SupplierLanguage;

  @FieldContacts()
  contacts?: SupplierContactDto[];

  @FieldText({ description: 'Postal address', max: 1000, multiline: true, optional: true })
  address?: string;

  @FieldFreight('Freight; as charged when left out')
  freight?: FreightRuleDto;

  @FieldFigure({
    description: 'Least value of one order, minor units; null when there is none',
    min: 1,
    max: GREATEST_AMOUNT,
    whole: true,
    nullable: true,
  })
  leastOrderValue?: number | null;

  @FieldFigure({
    description: 'Usual lead time, calendar days; null when it is not known',
    min: 0,
    max: LONGEST_LEAD_TIME,
    whole: true,
    nullable: true,
  })
  leadTimeDays?: number | null;

  @FieldText({ description: 'Note', max: 10_000, multiline: true, optional: true })
  note?: string;
}
