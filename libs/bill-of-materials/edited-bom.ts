import { type BomLine, type KitItem } from './bom-line.js';
import { kitItems } from './build-bom.js';
import { FLAG } from './flags.js';
import { type KitRequest } from './kit.js';
import { type PartFinder, type PartNeed, type PartRef } from './part-finder.js';
import { standingFlags } from './part-lines.js';
import { rollUp } from './roll-up.js';
import { fitAsSubstitute } from './substitutes/fit-as-substitute.js';
import { placePart } from './substitutes/place-part.js';
import { type SubstitutePart } from './substitutes/substitute-part.js';

/** A part that a person chose for a line. */
export interface ChosenPart {
  ref: PartRef;
  fit: SubstitutePart;
}

/** A line that a person added. */
export interface AddedLine {
  id: string;
  /** As it was chosen; null: something without a number yet. */
  partNumber: string | null;
  /** The library's part of that number; null when there is none. */
  part: PartRef | null;
  description: string;
  quantity: number;
  unit: BomLine['unit'];
  note: string;
}

/** What people changed beside the gears, with the parts looked up. */
export interface KitEdits {
  /** By the key of the line. */
  chosen: ReadonlyMap<string, ChosenPart>;
  added: readonly AddedLine[];
}

export interface EditedBom {
  lines: BomLine[];
  /** Keys with a chosen part that no line of the kit has any more. */
  idleKeys: string[];
}

/**
 * The bill of materials by the kit rules, with the parts that people chose for lines and the lines they added. A chosen
 * part stays on its line whatever becomes of it: withdrawn, or of other sizes than the place now asks for, it is
 * flagged. Added lines follow the kit's lines of their kind and are never merged with them.
 * @throws InputError as `buildBom`
 */
export function buildEditedBom(request: KitRequest, library: PartFinder, edits: KitEdits): EditedBom {
  const own = rollUp(kitItems(request, library));
  const swapped = own.filter(
    ({ key, kind }) => edits.chosen.has(key) && kind !== 'gear' && kind !== 'pinion-shaft',
  );
  const items =
    swapped.length === 0 ? kitItems(request, library) : kitItems(request, choosing(library, swapped, edits));
  const met = new Set(swapped.map(({ key }) => key));
  return {
    lines: rollUp([...items, ...edits.added.map(addedItem)]),
    idleKeys: [...edits.chosen.keys()].filter((key) => !met.has(key)),
  };
}

/** A library that answers the needs of swapped lines with the parts chosen for them. */
function choosing(library: PartFinder, swapped: readonly BomLine[], { chosen }: KitEdits): PartFinder {
  const answers = new Map<string, PartRef>();
  for (const { key, partNumber, description, needs = [] } of swapped) {
    const part = chosen.get(key);
    if (!part) continue;
    for (const need of needs) {
      const instead = { lineKey: key, partNumber, description, misfits: misfitsOf(need, part) };
      answers.set(JSON.stringify(need), { ...part.ref, instead });
    }
  }
  return { find: (need) => answers.get(JSON.stringify(need)) ?? library.find(need) };
}

/** Its standing has a flag of its own. */
function misfitsOf(need: PartNeed, { fit }: ChosenPart): string[] {
  return fitAsSubstitute(placePart(need), { ...fit, standing: 'cleared' }).misfits;
}

function addedItem({ id, partNumber, part, description, quantity, unit, note }: AddedLine): KitItem {
  const typed = part && description !== '' && description !== part.description ? [description] : [];
  return {
    key: `added: ${id}`,
    extraLineId: id,
    kind: part?.kind ?? 'other',
    partNumber: part?.number ?? partNumber,
    description: part?.description ?? description,
    quantity,
    unit,
    material: part?.material ?? null,
    supply: part?.supply ?? 'bought',
    supplier: part?.supplier ?? null,
    mass: part ? massOf(part) : null,
    source: ['Added line'],
    note: [...typed, note].filter(Boolean).join('. '),
    flags: part ? standingFlags(part) : [FLAG.notInLibrary],
  };
}

/** kg for one unit: a lubricant is weighed by the pack and counted in litres. */
function massOf({ kind, mass, packVolume }: PartRef): number | null {
  if (kind !== 'lubricant') return mass;
  return mass !== null && packVolume ? mass / packVolume : null;
}
