import { ApiSchema } from '@nestjs/swagger';
import { FieldChoice } from '../../common/field-choice.decorator.js';
import { FieldCurrency } from '../../common/field-currency.decorator.js';
import { FieldFigure } from '../../common/field-figure.decorator.js';
import { FieldText } from '../../common/field-text.decorator.js';
import {
  GREATEST_AMOUNT,
  LONGEST_LEAD_TIME,
  SUPPLIER_LANGUAGES,
  SUPPLIER_STANDINGS,
  type SupplierLanguage,
  type SupplierStanding,
} from '../supplier-terms.js';
import { type FreightRuleDto } from './freight-rule.dto.js';
import { type SupplierContactDto } from './supplier-contact.dto.js';
import { FieldContacts, FieldFreight } from './supplier-fields.js';

/** A change to a supplier: the version that was seen, and the fields that change. The code stays for good. */
@ApiSchema({ name: 'SupplierPatch' })
export class SupplierPatchDto {
  @FieldFigure({
    description: 'Version that was seen before the edit',
    min: 1,
    max: Number.MAX_SAFE_INTEGER,
    whole: true,
  })
  version!: number;

  @FieldText({ description: 'Name, unlike that of any other supplier', min: 1, max: 200, optional: true })
  name?: string;

  @FieldChoice({
    description: 'active, or closed: no new offers, and none of theirs is chosen any more',
    values: SUPPLIER_STANDINGS,
    optional: true,
    enumName: 'SupplierStanding',
  })
  standing?: SupplierStanding;

  @FieldCurrency({
    description: 'What enquiries ask for and new offers start with; offers that are there keep theirs',
    optional: true,
  })
  currency?: string;

  @FieldChoice({
    description: 'Language that enquiries are written in',
    values: SUPPLIER_LANGUAGES,
    optional: true,
    enumName: 'SupplierLanguage',
  })
  language?: SupplierLanguage;

  @FieldContacts()
  contacts?: SupplierContactDto[];

  @FieldText({ description: 'Postal address', max: 1000, multiline: true, optional: true })
  address?: string;

  @FieldFreight('Freight, the whole rule in place of the old one')
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
