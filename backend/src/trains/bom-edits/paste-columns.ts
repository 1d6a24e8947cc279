import { type ColumnSpec } from '@stageyard/libs/bill-of-materials';
import { type ExtraLine } from '../bom-edits.js';

/** Columns in the order in which they are taken where there is no head row. */
export type PasteColumn = 'findNumber' | 'partNumber' | 'quantity' | 'unit' | 'description' | 'note';

export const PASTE_COLUMNS: readonly ColumnSpec<PasteColumn>[] = [
  { key: 'findNumber', label: 'Find number', synonyms: ['find', 'find no', 'item', 'pos', 'position'] },
  { key: 'partNumber', label: 'Part number', synonyms: ['part', 'part no', 'number'] },
  { key: 'quantity', label: 'Quantity', synonyms: ['qty', 'pieces', 'amount', 'count'] },
  { key: 'unit', label: 'Unit', synonyms: ['uom'] },
  { key: 'description', label: 'Description', synonyms: ['name', 'what'] },
  { key: 'note', label: 'Note', synonyms: ['remark', 'remarks', 'comment'] },
];

const UNIT_WORDS: Readonly<Record<ExtraLine['unit'], readonly string[]>> = {
  pcs: ['pcs', 'pc', 'piece', 'pieces', 'each', 'ea'],
  l: ['l', 'litre', 'litres', 'liter', 'liters'],
  m: ['m', 'metre', 'metres', 'meter', 'meters'],
};

/** The unit that a cell names; null when it is none. */
export function unitOfWords(text: string): ExtraLine['unit'] | null {
  const word = text.trim().toLowerCase().replace(/\.$/, '');
  return (
    (Object.keys(UNIT_WORDS) as ExtraLine['unit'][]).find((unit) => UNIT_WORDS[unit].includes(word)) ?? null
  );
}
