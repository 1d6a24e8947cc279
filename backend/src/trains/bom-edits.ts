export const EXTRA_LINE_UNITS = ['pcs', 'l', 'm'] as const;

/** A line that a person added: a part of the library, or something without a number yet. */
export interface ExtraLine {
  /** Stays with the line for good. */
  id: string;
  partNumber: string | null;
  description: string;
  /** At most three decimals. */
  quantity: number;
  unit: (typeof EXTRA_LINE_UNITS)[number];
  note: string;
}

/** What people changed on a train's bill of materials. Gears stand in the specification instead. */
export interface BomEdits {
  /** Part to take for the line of a key (`BomLine.key`). */
  swaps: Record<string, string>;
  extraLines: ExtraLine[];
}

export const NO_EDITS: BomEdits = { swaps: {}, extraLines: [] };
