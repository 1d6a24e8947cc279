import { isInThousandths } from '@stageyard/libs/bill-of-materials';
import type { PartKind } from './part-kinds.js';

/** What parts are counted in: pieces, or litres. */
export const PART_UNITS = ['pcs', 'l'] as const;
export type PartUnit = (typeof PART_UNITS)[number];

/** The unit in which parts of this kind lie on the shelf, are bought and stand on a bill of materials. */
export function unitOf(kind: PartKind): PartUnit {
  return kind === 'lubricant' ? 'l' : 'pcs';
}

/** Whether so much of a part can be: pieces are whole, litres are kept to the millilitre. */
export function isCountable(quantity: number, unit: PartUnit): boolean {
  return unit === 'pcs' ? Number.isInteger(quantity) : isInThousandths(quantity);
}
