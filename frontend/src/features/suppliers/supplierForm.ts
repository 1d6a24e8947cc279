import type { Supplier, SupplierInput } from '../../api/types';
import { amountText, minorOrNull } from '../../components/moneyText';
import { numberOrNull, textOf } from '../../components/NumberField';

type Contact = Supplier['contacts'][number];

/** The supplier form holds text as typed; nothing is rewritten until it is sent. */
export interface SupplierForm {
  name: string;
  currency: string;
  language: Supplier['language'];
  contacts: Contact[];
  address: string;
  freightKind: Supplier['freight']['kind'];
  freightCharge: string;
  freightFreeFrom: string;
  leastOrderValue: string;
  leadTimeDays: string;
  note: string;
}

export const BLANK_CONTACT: Contact = { name: '', role: '', email: '', phone: '' };

export const NEW_SUPPLIER: SupplierForm = {
  name: '',
  currency: 'EUR',
  language: 'en',
  contacts: [BLANK_CONTACT],
  address: '',
  freightKind: 'as-charged',
  freightCharge: '',
  freightFreeFrom: '',
  leastOrderValue: '',
  leadTimeDays: '',
  note: '',
};

export function formOfSupplier(supplier: Supplier): SupplierForm {
  const { currency, freight } = supplier;
  return {
    name: supplier.name,
    currency,
    language: supplier.language,
    contacts: supplier.contacts.map(({ name, role, email, phone }) => ({ name, role, email, phone })),
    address: supplier.address,
    freightKind: freight.kind,
    freightCharge: amountText(freight.charge ?? null, currency),
    freightFreeFrom: amountText(freight.freeFrom ?? null, currency),
    leastOrderValue: amountText(supplier.leastOrderValue, currency),
    leadTimeDays: textOf(supplier.leadTimeDays),
    note: supplier.note,
  };
}

export const isBlankContact = (contact: Contact): boolean =>
  Object.values(contact).every((text) => text.trim() === '');

export const chargesFreight = (kind: SupplierForm['freightKind']): boolean =>
  kind === 'flat' || kind === 'free-from';

/** What is sent; contacts that were left blank are left out. */
export function inputOfSupplier(form: SupplierForm): SupplierInput {
  const { currency, freightKind } = form;
  return {
    name: form.name.trim(),
    currency,
    language: form.language,
    contacts: form.contacts
      .filter((contact) => !isBlankContact(contact))
      .map(({ name, role, email, phone }) => ({
        name: name.trim(),
        role: role.trim(),
        email: email.trim(),
        phone: phone.trim(),
      })),
    address: form.address,
    freight: {
      kind: freightKind,
      charge: chargesFreight(freightKind) ? minorOrNull(form.freightCharge, currency) : null,
      freeFrom: freightKind === 'free-from' ? minorOrNull(form.freightFreeFrom, currency) : null,
    },
    leastOrderValue: minorOrNull(form.leastOrderValue, currency),
    leadTimeDays: numberOrNull(form.leadTimeDays),
    note: form.note,
  };
}

export type SupplierField = keyof SupplierForm | `contacts.${number}.${keyof Contact}`;

const FIELDS: Record<string, SupplierField> = {
  'freight.kind': 'freightKind',
  'freight.charge': 'freightCharge',
  'freight.freeFrom': 'freightFreeFrom',
};
const PLAIN: readonly string[] = Object.keys(NEW_SUPPLIER).filter((name) => name !== 'contacts');

/** Where the server's dotted path stands on this form; contacts are counted as they were sent, without blank ones. */
export function fieldOfSupplier(path: string, form: SupplierForm): SupplierField | null {
  const contact = /^contacts\.(\d+)\.(name|role|email|phone)$/.exec(path);
  if (contact) {
    const sent = form.contacts.flatMap((each, index) => (isBlankContact(each) ? [] : [index]));
    const index = sent[Number(contact[1])];
    return index === undefined ? null : `contacts.${index}.${contact[2] as keyof Contact}`;
  }
  return FIELDS[path] ?? (PLAIN.includes(path) ? (path as SupplierField) : null);
}
