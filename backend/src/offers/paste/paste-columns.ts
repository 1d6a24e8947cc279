import { type ColumnSpec } from '@stageyard/libs/bill-of-materials';

export type OfferColumn =
  | 'partNumber'
  | 'supplierPartNumber'
  | 'from'
  | 'price'
  | 'priceFrom'
  | 'currency'
  | 'per'
  | 'pack'
  | 'leastQuantity'
  | 'leadTimeDays'
  | 'validFrom'
  | 'validUntil'
  | 'pricedOn'
  | 'source'
  | 'note';

/** Columns in the order in which they are taken where there is no head row. */
export const OFFER_COLUMNS: readonly ColumnSpec<OfferColumn>[] = [
  { key: 'partNumber', label: 'Part number', synonyms: ['part', 'part no', 'our number', 'our part number'] },
  {
    key: 'supplierPartNumber',
    label: 'Supplier part number',
    synonyms: [
      'their number',
      'their part number',
      'supplier number',
      'supplier part no',
      'your number',
      'order number',
      'order no',
    ],
  },
  { key: 'from', label: 'From quantity', synonyms: ['from', 'quantity', 'qty', 'break', 'from qty'] },
  { key: 'price', label: 'Price', synonyms: ['unit price', 'price each', 'net price'] },
  { key: 'priceFrom', label: 'Price from', synonyms: ['price at', 'price @'], series: true },
  { key: 'currency', label: 'Currency', synonyms: ['cur', 'ccy'] },
  { key: 'per', label: 'Per', synonyms: ['price per', 'price unit', 'price for'] },
  { key: 'pack', label: 'Pack', synonyms: ['pack size', 'packing unit', 'multiple'] },
  {
    key: 'leastQuantity',
    label: 'Least quantity',
    synonyms: ['minimum quantity', 'minimum order quantity', 'min qty', 'moq', 'least'],
  },
  {
    key: 'leadTimeDays',
    label: 'Lead time days',
    synonyms: ['lead time', 'lead days', 'days', 'delivery days'],
  },
  { key: 'validFrom', label: 'Valid from', synonyms: ['starts', 'starts on'] },
  { key: 'validUntil', label: 'Valid until', synonyms: ['valid to', 'ends', 'ends on', 'until'] },
  { key: 'pricedOn', label: 'Priced on', synonyms: ['price date', 'date', 'quoted on'] },
  { key: 'source', label: 'Source', synonyms: ['quotation', 'quote', 'price list'] },
  { key: 'note', label: 'Note', synonyms: ['remark', 'remarks', 'comment'] },
];
