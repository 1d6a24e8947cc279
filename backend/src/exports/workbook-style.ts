import { type Alignment, type Border, type Borders, type Cell, type Fill, type Font } from 'exceljs';

/** The product's light palette as the workbook writes colours (alpha first). */
export const COLOUR = {
  paper: 'FFF6F4EE',
  sheet: 'FFFFFFFF',
  ink: 'FF20282B',
  green: 'FF0F4C43',
  brass: 'FF86590B',
  rust: 'FFA93A1E',
  plum: 'FF5A4A86',
  slate: 'FF4A6572',
  rule: 'FFD9D6CC',
} as const;

/** A face that every office suite has or has a twin of; our own face is not on the reader's machine. */
const FACE = 'Calibri';

export const font = (extra: Partial<Font> = {}): Partial<Font> => ({
  name: FACE,
  size: 10,
  color: { argb: COLOUR.ink },
  ...extra,
});

export const fill = (argb: string): Fill => ({ type: 'pattern', pattern: 'solid', fgColor: { argb } });

const line = (style: Border['style'], argb: string): Partial<Border> => ({ style, color: { argb } });

export const RULE_BELOW: Partial<Borders> = { bottom: line('hair', COLOUR.rule) };
export const HEAD_BELOW: Partial<Borders> = { bottom: line('medium', COLOUR.green) };
export const TOTAL_ABOVE: Partial<Borders> = { top: line('thin', COLOUR.green) };

export interface CellLook {
  font?: Partial<Font>;
  alignment?: Partial<Alignment>;
  border?: Partial<Borders>;
  fill?: Fill;
  numFmt?: string;
}

export function dress(cell: Cell, look: CellLook): void {
  cell.font = look.font ?? font();
  if (look.alignment) cell.alignment = look.alignment;
  if (look.border) cell.border = look.border;
  if (look.fill) cell.fill = look.fill;
  if (look.numFmt) cell.numFmt = look.numFmt;
}

/** Table head: dark words on paper over a green rule. */
export const HEAD_LOOK: CellLook = {
  font: font({ bold: true, color: { argb: COLOUR.green } }),
  fill: fill(COLOUR.paper),
  border: HEAD_BELOW,
  alignment: { vertical: 'middle', wrapText: true },
};

export const VERDICT_COLOUR: Record<string, string> = {
  passes: COLOUR.green,
  marginal: COLOUR.plum,
  fails: COLOUR.rust,
  note: COLOUR.slate,
};
