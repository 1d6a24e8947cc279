import { describe, expect, it } from 'vitest';
import { newSupplier } from '../../testing/offers';
import {
  BLANK_CONTACT,
  fieldOfSupplier,
  formOfSupplier,
  inputOfSupplier,
  NEW_SUPPLIER,
} from './supplierForm';

const CONTACT = { name: 'Marit Solheim', role: 'Sales', email: 'sales@fjordtann.example', phone: '' };

describe('the supplier form', () => {
  it('sends amounts in whole minor units of the currency, and only what the freight rule needs', () => {
    const typed = { ...NEW_SUPPLIER, name: ' Fjordtann ', leastOrderValue: '50,5', freightCharge: '12.50' };
    expect(inputOfSupplier({ ...typed, freightKind: 'flat', freightFreeFrom: '250' })).toMatchObject({
      name: 'Fjordtann',
      leastOrderValue: 5050,
      freight: { kind: 'flat', charge: 1250, freeFrom: null },
    });
    expect(inputOfSupplier({ ...typed, currency: 'JPY', leastOrderValue: '20000' })).toMatchObject({
      leastOrderValue: 20_000,
      freight: { kind: 'as-charged', charge: null, freeFrom: null },
    });
    // Three decimals: 250 dinar are 250,000 millimes (ISO 4217, from memory).
    expect(inputOfSupplier({ ...typed, currency: 'TND', leastOrderValue: '250' }).leastOrderValue).toBe(
      250_000,
    );
  });

  it('leaves blank contacts out and finds the field of a refused one all the same', () => {
    const form = { ...NEW_SUPPLIER, contacts: [BLANK_CONTACT, CONTACT] };
    expect(inputOfSupplier(form).contacts).toEqual([CONTACT]);
    expect(fieldOfSupplier('contacts.0.email', form)).toBe('contacts.1.email');
    expect(fieldOfSupplier('freight.freeFrom', form)).toBe('freightFreeFrom');
    expect(fieldOfSupplier('leastOrderValue', form)).toBe('leastOrderValue');
    expect(fieldOfSupplier('elsewhere', form)).toBeNull();
  });

  it('sends an unchanged supplier back as it was', () => {
    const stored = newSupplier({
      currency: 'TND',
      leastOrderValue: 250_000,
      freight: { kind: 'free-from', charge: 48_500, freeFrom: 1_000_001 },
      contacts: [CONTACT],
    });
    const { freight, leastOrderValue, contacts, leadTimeDays } = stored;
    expect(inputOfSupplier(formOfSupplier(stored))).toMatchObject({
      freight,
      leastOrderValue,
      contacts,
      leadTimeDays,
    });
  });
});
