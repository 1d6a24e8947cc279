import { type GearDataRow } from './gear-data.js';
import { type PartNeed } from './part-finder.js';
import { type BomKind } from './part-kinds.js';

/** One line of a bill of materials. */
export interface BomLine {
  findNumber: number;
  /**
   * Names the line for as long as its kit asks for the same: the part number that the kit rules found, else kind and
   * description. Find numbers shift when lines come and go; what people decide for a line is kept under its key.
   */
  key: string;
  /** The library's number, or the number chosen although the library does not hold it; null when there is none. */
  partNumber: string | null;
  kind: BomKind;
  description: string;
  quantity: number;
  unit: 'pcs' | 'l' | 'm';
  material: string | null;
  supply: 'made' | 'bought';
  supplier: string | null;
  /** kg for one unit of quantity; null when not known. */
  mass: number | null;
  /** Where it is used: `Stage 1 pinion`, `Shaft 2`. */
  source: string[];
  note: string;
  /** What a person must look at before ordering; empty when there is nothing. */
  flags: string[];
  /** For a gear to be made: its data in the order of ISO 1340. */
  gearData?: GearDataRow[];
  /** What the places of the line ask the library for. */
  needs?: PartNeed[];
  /** The kit's own part or need, where a person chose another part for the line. */
  replaces?: { partNumber: string | null; description: string };
  /** Of a line that a person added. */
  extraLineId?: string;
}

/** A line before roll-up: no find number yet, and a key only where another part took the place of the kit's own. */
export type KitItem = Omit<BomLine, 'findNumber' | 'key'> & Partial<Pick<BomLine, 'key'>>;

export interface BomTotals {
  lines: number;
  /** Lines to be made, and lines to be bought. */
  made: number;
  bought: number;
  /** Sum of quantity × mass over the lines with a known mass, kg. */
  massKg: number;
  /** Lines whose mass is not known and so not in `massKg`. */
  linesWithoutMass: number;
}

export function bomTotals(lines: readonly BomLine[]): BomTotals {
  return {
    lines: lines.length,
    made: lines.filter((line) => line.supply === 'made').length,
    bought: lines.filter((line) => line.supply === 'bought').length,
    massKg: lines.reduce((sum, line) => sum + line.quantity * (line.mass ?? 0), 0),
    linesWithoutMass: lines.filter((line) => line.mass === null).length,
  };
}

/** The part number as shown: `to be made` or `to be chosen` where there is none yet. */
export function partNumberText(line: Pick<BomLine, 'partNumber' | 'supply'>): string {
  return line.partNumber ?? (line.supply === 'made' ? 'to be made' : 'to be chosen');
}
