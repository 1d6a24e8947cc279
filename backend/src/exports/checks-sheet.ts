import { type Worksheet } from 'exceljs';
import { type TrainDto } from '../trains/dto/train.dto.js';
import { CAUTIONS } from './cautions.js';
import { HEAD_ROW, setPrintArea } from './sheet-heading.js';
import { type Column, writeTable } from './table.js';
import { COLOUR, dress, font, RULE_BELOW, VERDICT_COLOUR } from './workbook-style.js';

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
const FIGURE = '0.####';

const CHECK_COLUMNS: readonly Column<CheckRow>[] = [
  { title: 'Where', width: 12, kind: 'words', value: (row) => row.where },
  { title: 'Check or finding', width: 30, kind: 'words', value: (row) => row.name },
  { title: 'Value', width: 11, kind: 'figure', value: (row) => row.value, numFmt: FIGURE },
  { title: 'Limit', width: 11, kind: 'figure', value: (row) => row.limit, numFmt: FIGURE },
  { title: 'Unit', width: 8, kind: 'words', value: (row) => row.unit },
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
  { title: 'In words', width: 80, kind: 'words', value: (row) => row.message },
];

/** Every check with its verdict, then what else was found, then the cautions. */
export function writeChecksSheet(sheet: Worksheet, { figures }: TrainDto): void {
  CHECK_COLUMNS.forEach(({ width }, index) => (sheet.getColumn(index + 1).width = width));
  const table = writeTable(sheet, HEAD_ROW, CHECK_COLUMNS, checkRows(figures));
  sheet.autoFilter = {
    from: { row: table.headRow, column: 1 },
    to: { row: Math.max(table.headRow, table.lastRow), column: CHECK_COLUMNS.length },
  };
  const last = writeCautions(sheet, table.lastRow + 2);
  setPrintArea(sheet, 'G', last);
}

function checkRows({ checks, findings }: TrainDto['figures']): CheckRow[] {
  const where = (stage: number | undefined) => (stage === undefined ? 'Train' : `Stage ${stage + 1}`);
  return [
    ...checks.map(({ stage, label, value, limit, unit, verdict, message }): CheckRow => {
      return { where: where(stage), name: label, value, limit, unit, verdict, message };
    }),
    ...findings.map(({ stage, code, severity, message, value, limit }): CheckRow => {
      const figures = { value: value ?? null, limit: limit ?? null, unit: '' };
      return { where: where(stage), name: asWords(code), ...figures, verdict: VERDICT_OF[severity], message };
    }),
  ];
}

/** `tip-clearance` → `Tip clearance`. */
function asWords(code: string): string {
  const words = code.replaceAll('-', ' ');
  return words.charAt(0).toUpperCase() + words.slice(1);
}

function writeCautions(sheet: Worksheet, row: number): number {
  const title = sheet.getCell(row, 1);
  title.value = 'Cautions';
  dress(title, { font: font({ size: 12, bold: true, color: { argb: COLOUR.rust } }) });
  CAUTIONS.forEach((caution, index) => {
    const at = row + 1 + index;
    sheet.mergeCells(at, 1, at, CHECK_COLUMNS.length);
    const cell = sheet.getCell(at, 1);
    cell.value = caution;
    dress(cell, { alignment: { wrapText: true, vertical: 'top' } });
    sheet.getRow(at).height = 28;
  });
  return row + CAUTIONS.length;
}
