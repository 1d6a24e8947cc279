import type { PasteColumnsHelp } from '../../components/paste/pasteTypes';

/** The columns of a supplier's price rows, in the order in which they stand without heads. */
export const OFFER_COLUMNS_HELP: PasteColumnsHelp = {
  columns: [
    { name: 'Part number', hint: 'Ours; blank where their number is known already', required: true },
    { name: 'Supplier part number', hint: 'Theirs' },
    { name: 'From quantity', hint: 'Rows of one part with rising quantities become its price breaks' },
    { name: 'Price', hint: 'Or columns “Price from 1”, “Price from 10” in one row', required: true },
    { name: 'Currency', hint: 'Such as EUR; the supplier’s where blank' },
    { name: 'Per', hint: 'The price is for 1, 10, 100 or 1000' },
    { name: 'Pack', hint: 'Sold in multiples of this' },
    { name: 'Least quantity', hint: 'Of one order' },
    { name: 'Lead time days', hint: 'Blank: the supplier’s usual one' },
    { name: 'Valid from', hint: 'Such as 2026-12-01 or 1.12.2026' },
    { name: 'Valid until', hint: 'Blank: until further notice' },
    { name: 'Priced on', hint: 'The day on which they stated it' },
    { name: 'Source', hint: 'A quotation’s number, a price list' },
    { name: 'Note', hint: 'Anything else' },
  ],
  example: [
    [
      'Part number',
      'Supplier part number',
      'Price from 1',
      'Price from 10',
      'Price from 100',
      'Pack',
      'Lead time days',
    ],
    ['KW-00100', 'M-2031', '12.40', '11.10', '9.85', '1', '12'],
    ['KW-00101', 'M-2032', '13.90', '12.50', '11.20', '1', '12'],
  ],
};
