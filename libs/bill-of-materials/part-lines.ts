import { type KitItem } from './bom-line.js';
import { FLAG } from './flags.js';
import { type ChosenInstead, type PartNeed, type PartRef } from './part-finder.js';

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
  /** What the library was asked for. */
  need?: PartNeed;
}

/**
 * One item of the kit: the library's part where there is one, else the need itself, flagged. A need never vanishes.
 */
export function kitItem(need: Wanted, part: PartRef | null): KitItem {
  const flags = [...(need.flags ?? [])];
  const base = {
    ...{ kind: need.kind, quantity: need.quantity, unit: need.unit ?? ('pcs' as const) },
    ...(need.need ? { needs: [need.need] } : {}),
  };
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
    ...(part.instead ? chosenInstead(part.instead, where.note, [...flags, ...standingFlags(part)]) : {}),
  };
}

/** The line keeps its key and says which part it would have had. */
function chosenInstead(instead: ChosenInstead, note: string, flags: string[]) {
  const { lineKey, partNumber, description, misfits } = instead;
  const own = partNumber === null ? description : `${partNumber}, ${description}`;
  return {
    key: lineKey,
    note: [note, `Chosen in place of the kit’s own ${own}.`].filter(Boolean).join(' '),
    flags: [...flags, ...misfits.map((reason) => `does not fit its place: ${reason}`)],
    replaces: { partNumber, description },
  };
}

/** What a person must know of a part that is not cleared. */
export function standingFlags(part: Pick<PartRef, 'standing'>): string[] {
  if (part.standing === 'draft') return [FLAG.draftPart];
  return part.standing === 'withdrawn' ? [FLAG.withdrawnPart] : [];
}
