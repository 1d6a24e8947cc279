import { cellDecimal, cellWhole, type MappedRow } from '@stageyard/libs/bill-of-materials';
import { type ExtraLine } from '../bom-edits.js';
import { type BomPasteRowDto } from './dto/bom-paste.dto.js';
import { DESCRIPTION_LENGTH, LINE_NOTE_LENGTH, MOST_QUANTITY } from './dto/extra-lines.dto.js';
import { PASTE_COLUMNS, type PasteColumn, unitOfWords } from './paste-columns.js';

const MOST_FIND_NUMBER = 999_999;
/** Longest text of a cell that is shown again. */
export const LONGEST_SHOWN = 80;

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

/** The cells of one row, and what is wrong with them. */
export class RowReader {
  readonly problems: BomPasteRowDto['problems'] = [];

  constructor(readonly row: MappedRow<PasteColumn>) {}

  text(column: PasteColumn): string {
    return this.row.cells[column]?.trim() ?? '';
  }

  /** Always null, to be returned in place of an outcome or a value. */
  wrong(column: PasteColumn | null, message: string, value = column ? this.text(column) : ''): null {
    const label = PASTE_COLUMNS.find(({ key }) => key === column)?.label ?? '';
    this.problems.push({ column: label, value: value.slice(0, LONGEST_SHOWN), message });
    return null;
  }
}

export function readCells(reader: RowReader): ReadCells {
  const find = cellWhole(reader.text('findNumber'), { min: 1, max: MOST_FIND_NUMBER });
  const quantity = cellDecimal(reader.text('quantity'), { above: 0, max: MOST_QUANTITY });
  if (find.problem !== null) reader.wrong('findNumber', find.problem);
  if (quantity.problem !== null) reader.wrong('quantity', quantity.problem);
  const unitText = reader.text('unit');
  const unit = unitOfWords(unitText);
  if (unitText !== '' && unit === null)
    reader.wrong('unit', `“${unitText.slice(0, 20)}” is no unit. Use pcs, l or m.`);
  for (const [column, longest] of [
    ['description', DESCRIPTION_LENGTH],
    ['note', LINE_NOTE_LENGTH],
  ] as const) {
    if (reader.text(column).length > longest)
      reader.wrong(column, `At most ${longest} characters. Shorten it.`);
  }
  const [spare] = reader.row.spare;
  if (spare !== undefined) {
    reader.wrong(
      null,
      `The row has a cell beyond the ${PASTE_COLUMNS.length} columns. Name the columns in a head row.`,
      spare,
    );
  }
  return {
    findNumber: find.value,
    partNumber: partNumberOf(reader.row),
    quantity: quantity.value,
    unit,
    description: oneLine(reader.text('description')),
    note: oneLine(reader.text('note')),
  };
}

/** Line breaks and tabs of a quoted cell become blanks. */
function oneLine(text: string): string {
  return text.replace(/\s+/g, ' ').trim();
}
