import { type Worksheet } from 'exceljs';
import { type TrainDto } from '../trains/dto/train.dto.js';
import { CAUTIONS } from './cautions.js';
import { keepTogether, setPrintArea } from './page-layout.js';
import { heightOfLines, wrappedLines } from './row-height.js';
import { HEAD_ROW } from './sheet-heading.js';
import { type Column, writeTable } from './table.js';
import { type CellLook, COLOUR, dress, font, RULE_BELOW, VERDICT_COLOUR } from './workbook-style.js';

/** A check or a finding, as one row. */
interface CheckRow {
  where: string;
  name: string;
  value: number | null;
  limit: number | null;
  unit: string;
  verdict: 'passes' | 'marginal' | 'fails' | 'note';
  message: string;
}

const VERDICT_OF = { fail: 'fails', marginal: 'marginal', note: 'note' } as const;
/** Findings name no unit. Ratios and shifts are pure figures; everything else they hold against a limit is a length. */
const FINDING_UNITS: Record<string, string> = {
  'face-width-missing': '',
  'contact-not-continuous': '',
  'contact-ratio-low': '',
  'contact-ratio-cut': '',
  undercut: 'modules',
};
const LENGTH = 'mm';

/** What a check without a figure shows in its place. */
const NONE = '–';

/** Three decimals show what a verdict rests on; sizes that are whole, such as shafts, stay so. */
function figureLook({ value, limit, unit }: CheckRow): CellLook {
  const whole =
    unit === LENGTH && [value, limit].every((figure) => figure === null || Number.isInteger(figure));
  return { font: font(), border: RULE_BELOW, numFmt: whole ? '0' : '0.000;−0.000' };
}

export const CHECK_COLUMNS: readonly Column<CheckRow>[] = [
  { title: 'Where', width: 12, kind: 'words', value: (row) => row.where },
  { title: 'Check or finding', width: 36, kind: 'words', value: (row) => row.name },
  { title: 'Value', width: 11, kind: 'figure', value: (row) => row.value ?? NONE, look: figureLook },
  { title: 'Limit', width: 11, kind: 'figure', value: (row) => row.limit ?? NONE, look: figureLook },
  { title: 'Unit', width: 11, kind: 'words', value: (row) => row.unit },
  {
    title: 'Verdict',
    width: 11,
    kind: 'label',
    value: (row) => row.verdict,
    look: ({ verdict }) => ({
      font: font({ bold: true, color: { argb: VERDICT_COLOUR[verdict] ?? COLOUR.ink } }),
      border: RULE_BELOW,
    }),
  },
  { title: 'In words', width: 78, kind: 'words', value: (row) => row.message },
];

/** Rows of the table that go with the cautions when these need another page. */
const ROWS_BEFORE_CAUTIONS = 6;

/** Every check with its verdict, then what else was found, then the cautions. */
export function writeChecksSheet(sheet: Worksheet, { figures }: TrainDto): void {
  const table = writeTable(sheet, HEAD_ROW, CHECK_COLUMNS, checkRows(figures), true);
  sheet.autoFilter = {
    from: { row: table.headRow, column: 1 },
    to: { row: Math.max(table.headRow, table.lastRow), column: CHECK_COLUMNS.length },
  };
  const first = table.lastRow + 2;
  const widths = CHECK_COLUMNS.map(({ width }) => width);
  const last = writeCautions(sheet, first, widths);
  // The cautions are read as one, and the table's head never stands on a page without rows.
  const rows = Math.min(ROWS_BEFORE_CAUTIONS, table.lastRow - table.firstRow + 1);
  keepTogether(sheet, widths, { first: first - 1 - rows, last, repeated: HEAD_ROW });
  setPrintArea(sheet, 'G', last);
}

function checkRows({ checks, findings }: TrainDto['figures']): CheckRow[] {
  const where = (stage: number | undefined) => (stage === undefined ? 'Train' : `Stage ${stage + 1}`);
  return [
    ...checks.map(({ stage, label, value, limit, unit, verdict, message }): CheckRow => {
      return rowOf({ where: where(stage), name: label, value, limit, unit, verdict, message });
    }),
    ...findings.map(({ stage, code, severity, message, value, limit }): CheckRow => {
      const verdict = VERDICT_OF[severity];
      const figures = { value: value ?? null, limit: limit ?? null, unit: FINDING_UNITS[code] ?? LENGTH };
      return rowOf({
        where: where(stage),
        name: FINDING_NAMES[code] ?? asWords(code),
        ...figures,
        verdict,
        message,
      });
    }),
  ];
}

/** Where there is no figure there is nothing for a unit to stand beside. */
function rowOf(row: CheckRow): CheckRow {
  return row.value === null && row.limit === null ? { ...row, unit: '' } : row;
}

/** Findings whose code alone would not say what the figure is. */
const FINDING_NAMES: Record<string, string> = { undercut: 'Profile shift against undercut' };

/** `tip-clearance` → `Tip clearance`. */
function asWords(code: string): string {
  const words = code.replaceAll('-', ' ');
  return words.charAt(0).toUpperCase() + words.slice(1);
}

function writeCautions(sheet: Worksheet, row: number, widths: readonly number[]): number {
  const width = widths.reduce((sum, each) => sum + each, 0);
  const title = sheet.getCell(row, 1);
  title.value = 'Cautions';
  sheet.getRow(row).height = 20;
  dress(title, { font: font({ size: 12, bold: true, color: { argb: COLOUR.rust } }) });
  CAUTIONS.forEach((caution, index) => {
    const at = row + 1 + index;
    sheet.mergeCells(at, 1, at, CHECK_COLUMNS.length);
    const cell = sheet.getCell(at, 1);
    cell.value = caution;
    dress(cell, { alignment: { wrapText: true, vertical: 'top' } });
    sheet.getRow(at).height = heightOfLines(wrappedLines(caution, width)) + 3;
  });
  return row + CAUTIONS.length;
}
