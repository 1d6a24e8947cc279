import ExcelJS from 'exceljs';
import { type TrainRecord } from '../trains/bom.service.js';
import { BOM_COLUMNS, writeBomSheet } from './bom-sheet.js';
import { writeChecksSheet } from './checks-sheet.js';
import { addHeadedSheet } from './sheet-heading.js';
import { writeStagesSheet } from './stages-sheet.js';
import { stripPicture } from './strip-picture.js';

export const XLSX_TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

const PICTURE = { width: 360, height: 118 };

/** `T-0001-A-bom.xlsx` */
export function workbookName({ code, revision }: { code: string; revision: string }): string {
  return `${code}-${revision}-bom.xlsx`;
}

/**
 * The bill of materials of a train as a workbook: sheets BOM, Stages and Checks, each with the train's head.
 * @param date shown in the head, and the only date among the document's properties
 */
export async function bomWorkbook({ train, bom, gearData }: TrainRecord, date: Date): Promise<Buffer> {
  const workbook = new ExcelJS.Workbook();
  workbook.title = `${train.code} revision ${train.revision}: bill of materials`;
  // What the library would fill in by itself names a machine's user; these say only what made the file.
  workbook.creator = 'Stageyard';
  workbook.lastModifiedBy = 'Stageyard';
  workbook.created = date;
  workbook.modified = date;
  const picture = stripPicture(train.spec, PICTURE.width, PICTURE.height);
  const heading = { train, date, picture };
  const lines = {
    ...heading,
    subject: 'Bill of materials',
    columns: BOM_COLUMNS.length,
    pictureColumn: 11.5,
  };
  writeBomSheet(addHeadedSheet(workbook, 'BOM', lines), bom);
  const stages = { ...heading, subject: 'Stages', columns: 3 + gearData.length, pictureColumn: 5 };
  writeStagesSheet(addHeadedSheet(workbook, 'Stages', stages), train, gearData);
  const checks = { ...heading, subject: 'Checks', columns: 7, pictureColumn: 6.35 };
  writeChecksSheet(addHeadedSheet(workbook, 'Checks', checks), train);
  return Buffer.from(await workbook.xlsx.writeBuffer());
}
