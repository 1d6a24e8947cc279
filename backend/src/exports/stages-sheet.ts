import { type GearDataRow, type TrainGearData } from '@stageyard/libs/bill-of-materials';
import { type MeshGeometry } from '@stageyard/libs/gear-geometry';
import { type TrainShaft } from '@stageyard/libs/train-planner';
import { type Worksheet } from 'exceljs';
import { type TrainDto } from '../trains/dto/train.dto.js';
import { setPrintArea } from './page-layout.js';
import { HEAD_ROW } from './sheet-heading.js';
import { type Column, writeTable } from './table.js';
import { COLOUR, dress, font } from './workbook-style.js';

const GROUP_TITLES: Record<GearDataRow['group'], string> = {
  blank: 'Gear body',
  teeth: 'Gear teeth',
  mate: 'Mating gear',
};

/** Text among figures, such as the basic rack, is longer than they are. */
const WRAPPED = { horizontal: 'right', vertical: 'top', wrapText: true } as const;

/** Characters of the columns of words: what a figure is, its symbol, its unit. */
const WORDS = [36, 10, 8] as const;
/**
 * Characters of all columns of figures together, at least five of them. So wide, a page fitted to the width of the
 * sheet holds the whole of the gear data; and the picture has room above them.
 */
const FIGURES = 120;

/** Widths of the columns of the sheet, in characters. */
export function stageWidths(gears: number): number[] {
  const count = Math.max(5, gears);
  return [...WORDS, ...Array.from({ length: count }, () => FIGURES / count)];
}

/** Gear data of every gear side by side in the order of ISO 1340, then the meshes, then the shafts. */
export function writeStagesSheet(
  sheet: Worksheet,
  train: TrainDto,
  gearData: readonly TrainGearData[],
): void {
  const widths = stageWidths(gearData.length);
  const table = writeTable(sheet, HEAD_ROW, gearColumns(gearData, widths), gearRows(gearData));
  sheet.getRow(table.lastRow + 1).addPageBreak();
  const meshes = writeBlock(
    sheet,
    table.lastRow + 2,
    'Meshes',
    meshColumns(train.figures.meshes, widths),
    MESH_ROWS,
  );
  const shafts = train.spec.shafts.map(({ diameter }, index) => ({
    diameter,
    figures: train.figures.shafts[index],
  }));
  const last = writeBlock(sheet, meshes + 2, 'Shafts', shaftColumns(shafts, widths), SHAFT_ROWS);
  setPrintArea(sheet, sheet.getColumn(widths.length).letter, last);
}

/** One row of gear data over all gears. */
interface GearRow {
  group: string;
  first: GearDataRow;
  values: (number | string | null)[];
}

function gearRows(gearData: readonly TrainGearData[]): GearRow[] {
  const [lead] = gearData;
  return (lead?.rows ?? []).map((first, index) => ({
    group: GROUP_TITLES[first.group],
    first,
    values: gearData.map(({ rows }) => rows[index]?.value ?? null),
  }));
}

function gearColumns(gearData: readonly TrainGearData[], widths: readonly number[]): Column<GearRow>[] {
  return [
    {
      title: 'Gear data (ISO 1340)',
      width: WORDS[0],
      kind: 'words',
      value: ({ group, first }) => labelOf(group, first),
    },
    { title: 'Symbol', width: WORDS[1], kind: 'words', value: ({ first }) => first.symbol },
    { title: 'Unit', width: WORDS[2], kind: 'words', value: ({ first }) => first.unit },
    ...gearData.map(({ stage, role, partNumber }, index): Column<GearRow> => ({
      title: `Stage ${stage} ${role}\n${partNumber ?? 'to be made'}`,
      width: widths[WORDS.length + index] ?? 0,
      kind: 'figure',
      value: ({ values }) => values[index] ?? 'not given',
      look: ({ first, values }) => ({
        ...(typeof values[index] === 'number' ? { numFmt: decimals(first.digits) } : {}),
        ...(values[index] === null ? { font: font({ color: { argb: COLOUR.slate } }) } : {}),
        ...(typeof values[index] === 'string' ? { alignment: WRAPPED } : {}),
      }),
    })),
  ];
}

/** The mate's rows name the mate themselves; body and teeth are told apart by their first words. */
function labelOf(group: string, { label, group: kind }: GearDataRow): string {
  return kind === 'blank' ? `${group}: ${label.charAt(0).toLowerCase()}${label.slice(1)}` : label;
}

/** One figure of a mesh or a shaft, over all of them. */
interface FigureRow<T> {
  label: string;
  symbol: string;
  unit: string;
  digits: number;
  of: (item: T) => number | string | null;
}

const MESH_ROWS: FigureRow<MeshGeometry>[] = [
  { label: 'Stage ratio', symbol: 'u', unit: '', digits: 4, of: (mesh) => mesh.ratio },
  { label: 'Centre distance', symbol: 'a', unit: 'mm', digits: 3, of: (mesh) => mesh.centreDistance },
  {
    label: 'Operating pressure angle, transverse',
    symbol: 'α_wt',
    unit: '°',
    digits: 4,
    of: (mesh) => mesh.operatingPressureAngleDeg,
  },
  { label: 'Contact ratio', symbol: 'ε_α', unit: '', digits: 3, of: (mesh) => mesh.contactRatio },
  { label: 'Overlap ratio', symbol: 'ε_β', unit: '', digits: 3, of: (mesh) => mesh.overlapRatio },
  { label: 'Total contact ratio', symbol: 'ε_γ', unit: '', digits: 3, of: (mesh) => mesh.totalContactRatio },
  { label: 'Normal backlash', symbol: 'j_bn', unit: 'mm', digits: 4, of: (mesh) => mesh.normalBacklash },
  {
    label: 'Backlash at the wheel',
    symbol: '',
    unit: '′',
    digits: 2,
    of: (mesh) => mesh.angularBacklashArcmin,
  },
  {
    label: 'Tip clearance of the pinion',
    symbol: 'c_1',
    unit: 'mm',
    digits: 3,
    of: (mesh) => mesh.tipClearancePinion,
  },
  {
    label: 'Tip clearance of the wheel',
    symbol: 'c_2',
    unit: 'mm',
    digits: 3,
    of: (mesh) => mesh.tipClearanceWheel,
  },
];

interface ShaftItem {
  diameter: number;
  figures: TrainShaft | undefined;
}

const SHAFT_ROWS: FigureRow<ShaftItem>[] = [
  { label: 'Diameter', symbol: 'd', unit: 'mm', digits: 2, of: ({ diameter }) => diameter },
  {
    label: 'Least diameter for torsion',
    symbol: '',
    unit: 'mm',
    digits: 0,
    of: ({ figures }) => figures?.leastDiameter ?? null,
  },
  { label: 'Speed', symbol: 'n', unit: 'rpm', digits: 1, of: ({ figures }) => figures?.speed ?? null },
  { label: 'Torque', symbol: 'T', unit: 'N·m', digits: 2, of: ({ figures }) => figures?.torque ?? null },
  { label: 'Power', symbol: 'P', unit: 'kW', digits: 3, of: ({ figures }) => figures?.power ?? null },
  {
    label: 'Turns',
    symbol: '',
    unit: '',
    digits: 0,
    of: ({ figures }) =>
      figures ? (figures.direction === 1 ? 'like the input' : 'against the input') : null,
  },
];

function meshColumns(
  meshes: readonly MeshGeometry[],
  widths: readonly number[],
): Column<FigureRow<MeshGeometry>>[] {
  return figureColumns(meshes, widths, (index) => `Stage ${index + 1}`);
}

function shaftColumns(
  shafts: readonly ShaftItem[],
  widths: readonly number[],
): Column<FigureRow<ShaftItem>>[] {
  const last = shafts.length - 1;
  return figureColumns(
    shafts,
    widths,
    (index) => `Shaft ${index}${index === 0 ? ', input' : index === last ? ', output' : ''}`,
  );
}

function figureColumns<T>(
  items: readonly T[],
  widths: readonly number[],
  title: (index: number) => string,
): Column<FigureRow<T>>[] {
  return [
    { title: 'Figure', width: WORDS[0], kind: 'words', value: (row) => row.label },
    { title: 'Symbol', width: WORDS[1], kind: 'words', value: (row) => row.symbol },
    { title: 'Unit', width: WORDS[2], kind: 'words', value: (row) => row.unit },
    ...items.map((item, index): Column<FigureRow<T>> => ({
      title: title(index),
      width: widths[WORDS.length + index] ?? 0,
      kind: 'figure',
      value: (row) => row.of(item) ?? 'not known',
      look: (row) => {
        const value = row.of(item);
        if (typeof value === 'number') return { numFmt: decimals(row.digits) };
        return value === null ? { font: font({ color: { argb: COLOUR.slate } }) } : {};
      },
    })),
  ];
}

/** @returns the last row written */
function writeBlock<T>(
  sheet: Worksheet,
  row: number,
  title: string,
  columns: readonly Column<FigureRow<T>>[],
  rows: readonly FigureRow<T>[],
): number {
  const cell = sheet.getCell(row, 1);
  cell.value = title;
  dress(cell, { font: font({ size: 12, bold: true, color: { argb: COLOUR.green } }) });
  return writeTable(sheet, row + 1, columns, rows).lastRow;
}

function decimals(digits: number): string {
  return digits > 0 ? `0.${'0'.repeat(digits)}` : '0';
}
