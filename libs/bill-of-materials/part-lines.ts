import { type KitItem } from './bom-line.js';
import { FLAG } from './flags.js';
import { type PartRef } from './part-finder.js';

/** What a line says before the library is asked; `wanted` is a part number somebody chose. */
export interface Wanted {
  kind: KitItem['kind'];
  wanted?: string | null;
  description: string;
  quantity: number;
  unit?: KitItem['unit'];
  material: string | null;
  supply: 'made' | 'bought';
  /** kg for one unit of quantity, where it can be computed. */
  mass: number | null;
  source: string;
  note?: string;
  flags?: string[];
}

/**
 * One item of the kit: the library's part where there is one, else the need itself, flagged. A need never vanishes.
 */
export function kitItem(need: Wanted, part: PartRef | null): KitItem {
  const flags = [...(need.flags ?? [])];
  const base = { kind: need.kind, quantity: need.quantity, unit: need.unit ?? ('pcs' as const) };
  const where = { source: [need.source], note: need.note ?? '' };
  if (!part) {
    flags.push(FLAG.notInLibrary);
    if (need.supply === 'made' && need.material === null) flags.push(FLAG.materialNotChosen);
    return {
      ...base,
      partNumber: need.wanted ?? null,
      description: need.description,
      material: need.material,
      supply: need.supply,
      supplier: null,
      mass: need.mass,
      ...where,
      flags,
    };
  }
  return {
    ...base,
    partNumber: part.number,
    description: part.description,
    material: part.material,
    supply: part.supply,
    supplier: part.supplier,
    mass: part.mass ?? need.mass,
    ...where,
    flags: [...flags, ...standingFlags(part)],
  };
}

function standingFlags(part: PartRef): string[] {
  if (part.standing === 'draft') return [FLAG.draftPart];
  return part.standing === 'withdrawn' ? [FLAG.withdrawnPart] : [];
}
