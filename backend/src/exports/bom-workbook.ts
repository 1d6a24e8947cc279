import ExcelJS from 'exceljs';
import { type TrainRecord } from '../trains/bom.service.js';
import { type TrainPricesDto } from '../train-prices/dto/train-prices.dto.js';
import { BOM_COLUMNS } from './bom-columns.js';
import { writeBomSheet } from './bom-sheet.js';
import { CHECK_COLUMNS, writeChecksSheet } from './checks-sheet.js';
import { addHeadedSheet, HEAD_ROW } from './sheet-heading.js';
import { stageWidths, writeStagesSheet } from './stages-sheet.js';
import { stripPicture } from './strip-picture.js';

export const XLSX_TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

/** px of 1/96 inch. */
const PICTURE = { width: 360, height: 118 };

/** `T-0001-A-bom.xlsx` */
export function workbookName({ code, revision }: { code: string; revision: string }): string {
  return `${code}-${revision}-bom.xlsx`;
}

/** What the workbook shows. */
export interface PricedRecord extends TrainRecord {
  prices: TrainPricesDto;
}

/**
 * The bill of materials of a train as a workbook: sheets BOM, Stages and Checks, each with the train's head.
 * @param date shown in the head, and the only date among the document's properties
 */
export async function bomWorkbook(
  { train, bom, gearData, prices }: PricedRecord,
  date: Date,
): Promise<Buffer> {
  const workbook = new ExcelJS.Workbook();
  workbook.title = `${train.code} revision ${train.revision}: bill of materials`;
  // Left alone, the writer names nobody as the author and the present moment as the date.
  workbook.creator = 'Stageyard';
  workbook.lastModifiedBy = 'Stageyard';
  workbook.created = date;
  workbook.modified = date;
  // Whoever opens it sees totals of what they filled in, not what was stored.
  workbook.calcProperties.fullCalcOnLoad = true;
  const { png } = stripPicture(train.spec, PICTURE.width, PICTURE.height);
  const imageId = workbook.addImage({ base64: png.toString('base64'), extension: 'png' });
  const heading = { train, date, picture: { ...PICTURE, imageId } };
  const tableHead = `${HEAD_ROW}:${HEAD_ROW}`;
  const lines = { subject: 'Bill of materials', widths: widthsOf(BOM_COLUMNS), repeatedRows: tableHead };
  writeBomSheet(addHeadedSheet(workbook, 'BOM', { ...heading, ...lines }), bom, prices);
  // Three tables stand on this sheet, so that no page repeats the head of one.
  const stages = { subject: 'Stages', widths: stageWidths(gearData.length) };
  writeStagesSheet(addHeadedSheet(workbook, 'Stages', { ...heading, ...stages }), train, gearData);
  const checks = { subject: 'Checks', widths: widthsOf(CHECK_COLUMNS), repeatedRows: tableHead };
  writeChecksSheet(addHeadedSheet(workbook, 'Checks', { ...heading, ...checks }), train);
  return Buffer.from(await workbook.xlsx.writeBuffer());
}

function widthsOf(columns: readonly { width: number }[]): number[] {
  return columns.map(({ width }) => width);
}
