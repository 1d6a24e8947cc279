import { type SupplierInputDto } from '@stageyard/backend/suppliers/dto/supplier-input.dto';
import { SUPPLIER, type SupplierName } from './supplier-names.js';

export interface SupplierRow extends SupplierInputDto {
  name: SupplierName;
  leadTimeDays: number;
}

/** In the order in which they were added; amounts in minor units of the supplier's currency. */
export const DEMO_SUPPLIERS: readonly SupplierRow[] = [
  {
    name: SUPPLIER.marrow,
    currency: 'EUR',
    language: 'en',
    contacts: [
      { name: 'Order desk', role: 'enquiries and orders', email: 'orders@marrowsound.example', phone: '' },
      { name: 'Ines Falk', role: 'gear cutting', email: 'cutting@marrowsound.example', phone: '' },
    ],
    address: 'Marrow Sound Gear Works\n4 Slip Lane\nMarrow Sound',
    freight: { kind: 'free-from', charge: 1450, freeFrom: 50_000 },
    leastOrderValue: 5000,
    leadTimeDays: 14,
    note: 'Cuts special tooth counts too: ask for a quotation with the gear data sheet.',
  },
  {
    name: SUPPLIER.tidewrack,
    currency: 'EUR',
    language: 'de',
    contacts: [
      { name: 'Verkauf', role: 'Anfragen', email: 'verkauf@tidewrack.example', phone: '' },
      { name: 'Joris Tamm', role: 'Lager', email: 'lager@tidewrack.example', phone: '' },
    ],
    address: 'Tidewrack Transmission Supply\nHafenkontor 11\nTidewrack',
    freight: { kind: 'flat', charge: 990, freeFrom: null },
    leastOrderValue: 2500,
    leadTimeDays: 5,
    note: 'Answers enquiries the same day. German is read first.',
  },
  {
    name: SUPPLIER.larkspit,
    currency: 'GBP',
    language: 'en',
    contacts: [{ name: 'Sales', role: 'quotations', email: 'sales@larkspit.example', phone: '' }],
    address: 'Larkspit Plastics & Brass\nThe Old Net Loft\nLarkspit',
    freight: { kind: 'as-charged', charge: null, freeFrom: null },
    leastOrderValue: null,
    leadTimeDays: 21,
    note: '',
  },
  {
    name: SUPPLIER.corrie,
    currency: 'EUR',
    language: 'en',
    contacts: [
      { name: 'Counter', role: 'orders', email: 'counter@corrielane.example', phone: '' },
      { name: 'Bea Lund', role: 'technical questions', email: 'technical@corrielane.example', phone: '' },
    ],
    address: 'Corrie Lane Bearings\n27 Corrie Lane\nBracken Bay',
    freight: { kind: 'included', charge: null, freeFrom: null },
    leastOrderValue: null,
    leadTimeDays: 2,
    note: 'Round the corner: can be fetched.',
  },
  {
    name: SUPPLIER.asanagi,
    currency: 'JPY',
    language: 'ja',
    contacts: [{ name: 'Export desk', role: 'quotations', email: 'export@asanagi.example', phone: '' }],
    address: 'Asanagi Fine Gears\n2-8 Asanagi-dori',
    freight: { kind: 'free-from', charge: 3800, freeFrom: 120_000 },
    leastOrderValue: 20_000,
    leadTimeDays: 35,
    note: 'Ground teeth. Customs and freight take about two weeks of the lead time.',
  },
  {
    name: SUPPLIER.lazuli,
    currency: 'TND',
    language: 'fr',
    contacts: [{ name: 'Service commercial', role: 'devis', email: 'devis@caplazuli.example', phone: '' }],
    address: 'Engrenages du Cap Lazuli\n9, quai des Fondeurs\nCap Lazuli',
    freight: { kind: 'flat', charge: 48_500, freeFrom: null },
    leastOrderValue: 250_000,
    leadTimeDays: 28,
    note: 'Castings to order in lots; prices in dinar with three decimals.',
  },
];
