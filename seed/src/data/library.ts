import { GEAR_FAMILIES } from './gear-families.js';
import { type GearRow, gearsOf } from './gears.js';
import { laterOtherParts } from './later-parts.js';
import { firstOtherParts, type OtherRow } from './other-parts.js';

export type LibraryRow = GearRow | OtherRow;

/** Every demo part in the order of its number: what came later stands behind, so that numbers stay as they are. */
export function demoLibrary(): LibraryRow[] {
  return [
    ...gearsOf(GEAR_FAMILIES.first),
    ...firstOtherParts(),
    ...gearsOf(GEAR_FAMILIES.later),
    ...laterOtherParts(),
  ];
}
