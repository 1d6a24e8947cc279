import { type Workbook, type Worksheet } from 'exceljs';
import { formatErrorPercent, formatRatio, ratio } from '@stageyard/libs/units';
import { type TrainDto } from '../trains/dto/train.dto.js';
import { CAUTION_LINE } from './cautions.js';
import { columnPixels, MARGINS } from './page-layout.js';
import { type Picture } from './strip-picture.js';
import { COLOUR, dress, font } from './workbook-style.js';

/** The table of every sheet has its head in this row; above it stands what the sheet is about. */
export const HEAD_ROW = 7;

const TITLE_ROWS = [
  { height: 26, look: { font: font({ size: 16, bold: true, color: { argb: COLOUR.green } }) } },
  { height: 17, look: { font: font({ size: 11, bold: true }) } },
  { height: 17, look: { font: font({ size: 11 }) } },
  { height: 17, look: { font: font({ color: { argb: COLOUR.slate } }) } },
  { height: 17, look: { font: font({ italic: true, color: { argb: COLOUR.slate } }) } },
] as const;

export interface Heading {
  train: TrainDto;
  /** What the sheet shows, such as `Bill of materials`. */
  subject: string;
  date: Date;
  /** The train to scale, already in the workbook. */
  picture: Pick<Picture, 'width' | 'height'> & { imageId: number };
  /** Characters, column by column. The picture ends with the last one; the head's text keeps left of it. */
  widths: readonly number[];
  /** Rows that every printed page repeats, such as `7:7`; none where a sheet holds several tables. */
  repeatedRows?: string;
}

/** Adds a sheet with its head: what train, which revision, when, the exact ratio, and the train to scale. */
export function addHeadedSheet(workbook: Workbook, name: string, heading: Heading): Worksheet {
  const sheet = workbook.addWorksheet(name, {
    views: [{ state: 'frozen', ySplit: HEAD_ROW, showGridLines: false, zoomScale: 100 }],
    pageSetup: {
      paperSize: 9,
      orientation: 'landscape',
      fitToPage: true,
      fitToWidth: 1,
      fitToHeight: 0,
      horizontalCentered: true,
      ...(heading.repeatedRows ? { printTitlesRow: heading.repeatedRows } : {}),
      margins: MARGINS,
    },
    headerFooter: { oddFooter: footer(heading) },
  });
  heading.widths.forEach((width, index) => (sheet.getColumn(index + 1).width = width));
  const place = picturePlace(heading);
  headLines(heading).forEach((text, index) => {
    const row = index + 1;
    const { height, look } = TITLE_ROWS[index] ?? TITLE_ROWS[4];
    sheet.getRow(row).height = height;
    sheet.mergeCells(row, 1, row, Math.max(1, place.nativeCol));
    const cell = sheet.getCell(row, 1);
    cell.value = text;
    dress(cell, { ...look, alignment: { vertical: 'middle', horizontal: 'left', shrinkToFit: true } });
  });
  sheet.getRow(6).height = 8;
  addPicture(sheet, heading, place);
  return sheet;
}

function headLines({ train, subject, date }: Heading): string[] {
  const { brief } = train;
  const from = brief ? `, from brief ${brief.code} “${brief.title}”` : '';
  return [
    train.title,
    `${subject} of ${train.code}, revision ${train.revision} (${train.state})`,
    ratioLine(train),
    `${longDate(date)}${from}`,
    CAUTION_LINE,
  ];
}

/** `Ratio 75 : 2 exactly = 37.5 : 1, +0.000 % of 37.5 : 1 ± 1 %` */
export function ratioLine({ figures, spec }: Pick<TrainDto, 'figures' | 'spec'>): string {
  const { numerator, denominator, errorPercent } = figures.ratio;
  const value = formatRatio(ratio(BigInt(numerator), BigInt(denominator)));
  const exact = `Ratio ${numerator} : ${denominator} exactly, ${value}`;
  if (!spec.target || errorPercent === null) return exact;
  const { ratio: target, tolerancePercent } = spec.target;
  return `${exact}; ${formatErrorPercent(errorPercent)} from the ${target} : 1 ± ${tolerancePercent} % asked for`;
}

/** `9 March 2026` */
export function longDate(date: Date): string {
  return date.toLocaleDateString('en-GB', {
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    timeZone: 'UTC',
  });
}

function footer({ train, subject, date }: Heading): string {
  const day = date.toISOString().slice(0, 10);
  return `&L&8${train.code} revision ${train.revision}: ${subject.toLowerCase()}&C&8Page &P of &N&R&8Stageyard, ${day}`;
}

const EMU_A_PIXEL = 9525;

/** Where the picture begins so that it ends with the last column. */
function picturePlace({ picture, widths }: Heading): { nativeCol: number; nativeColOff: number } {
  let left = widths.reduce((sum, width) => sum + columnPixels(width), 0) - picture.width;
  let column = 0;
  for (; column < widths.length - 1; column += 1) {
    const wide = columnPixels(widths[column] ?? 0);
    if (left < wide) break;
    left -= wide;
  }
  return { nativeCol: column, nativeColOff: Math.max(0, Math.round(left * EMU_A_PIXEL)) };
}

function addPicture(
  sheet: Worksheet,
  { picture }: Heading,
  place: { nativeCol: number; nativeColOff: number },
): void {
  // The writer knows a whole anchor too, and takes it before the plain column and row of its types.
  const corner = { ...place, nativeRow: 0, nativeRowOff: 5 * EMU_A_PIXEL, col: place.nativeCol, row: 0 };
  sheet.addImage(picture.imageId, {
    tl: corner,
    ext: { width: picture.width, height: picture.height },
    editAs: 'oneCell',
  });
}
