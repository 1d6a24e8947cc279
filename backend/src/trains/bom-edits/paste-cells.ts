import { cellDecimal, cellWhole, type MappedRow } from '@stageyard/libs/bill-of-materials';
import { type RowReader } from '../../common/paste/row-reader.js';
import { type ExtraLine } from '../bom-edits.js';
import { DESCRIPTION_LENGTH, LINE_NOTE_LENGTH, MOST_QUANTITY } from './dto/extra-lines.dto.js';
import { type PasteColumn, unitOfWords } from './paste-columns.js';

const MOST_FIND_NUMBER = 999_999;

/** What the screens write where a line has no part number. */
const NO_PART = new Set(['to be made', 'to be chosen', '-', '–', '—']);

/** What the cells of a row say; null or blank: nothing. */
export interface ReadCells {
  findNumber: number | null;
  partNumber: string;
  quantity: number | null;
  unit: ExtraLine['unit'] | null;
  description: string;
  note: string;
}

/** The part number of a row; blank where it names none. */
export function partNumberOf({ cells }: MappedRow<PasteColumn>): string {
  const text = cells.partNumber?.trim() ?? '';
  return NO_PART.has(text.toLowerCase()) ? '' : text;
}

/** The cells of one row; what is wrong with them is noted at the reader. */
export function readCells(reader: RowReader<PasteColumn>): ReadCells {
  const unitText = reader.text('unit');
  const unit = unitOfWords(unitText);
  if (unitText !== '' && unit === null) {
    reader.wrong('unit', `“${unitText.slice(0, 20)}” is no unit. Use pcs, l or m.`);
  }
  return {
    findNumber: reader.value('findNumber', (text) => cellWhole(text, { min: 1, max: MOST_FIND_NUMBER })),
    partNumber: partNumberOf(reader.source),
    quantity: reader.value('quantity', (text) => cellDecimal(text, { above: 0, max: MOST_QUANTITY })),
    unit,
    description: reader.bounded('description', DESCRIPTION_LENGTH, 'folded') ?? '',
    note: reader.bounded('note', LINE_NOTE_LENGTH, 'folded') ?? '',
  };
}
