import { type Workbook, type Worksheet } from 'exceljs';
import { formatErrorPercent, formatRatio, ratio } from '@stageyard/libs/units';
import { type TrainDto } from '../trains/dto/train.dto.js';
import { CAUTION_LINE } from './cautions.js';
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
  /** Column over which the picture's left edge stands, from 0; the head's text keeps to the columns before it. */
  pictureColumn: number;
  /** Rows that every printed page repeats, such as `7:7`. */
  repeatedRows: string;
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
      printTitlesRow: heading.repeatedRows,
      margins: { left: 0.4, right: 0.4, top: 0.5, bottom: 0.6, header: 0.25, footer: 0.3 },
    },
    headerFooter: { oddFooter: footer(heading) },
  });
  headLines(heading).forEach((text, index) => {
    const row = index + 1;
    const { height, look } = TITLE_ROWS[index] ?? TITLE_ROWS[4];
    sheet.getRow(row).height = height;
    sheet.mergeCells(row, 1, row, Math.floor(heading.pictureColumn));
    const cell = sheet.getCell(row, 1);
    cell.value = text;
    dress(cell, { ...look, alignment: { vertical: 'middle', horizontal: 'left', shrinkToFit: true } });
  });
  sheet.getRow(6).height = 8;
  addPicture(sheet, heading);
  return sheet;
}

/** Everything from the first cell to this column and row is printed. The writer adds the column's dollar sign itself. */
export function setPrintArea(sheet: Worksheet, column: string, row: number): void {
  sheet.pageSetup.printArea = `A$1:${column}$${row}`;
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

function longDate(date: Date): string {
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

function addPicture(sheet: Worksheet, { picture, pictureColumn }: Heading): void {
  sheet.addImage(picture.imageId, {
    tl: { col: pictureColumn, row: 0.15 },
    ext: { width: picture.width, height: picture.height },
    editAs: 'oneCell',
  });
}
