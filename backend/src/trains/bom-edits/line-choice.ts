import { type BomLine, fitAsSubstitute, placePart } from '@stageyard/libs/bill-of-materials';
import { type Part } from '../../parts/entities/part.entity.js';
import { unitOf } from '../../parts/part-unit.js';
import { toFitPart } from '../../substitutes/fit-part.js';
import { type AdoptedSpec, gearsOf, placeName, type PlacedGear } from '../adopted-spec.js';
import { type BomEdits, NO_EDITS } from '../bom-edits.js';
import { type Train } from '../entities/train.entity.js';
import { refusePart } from '../gear-choice.js';

/** What choices change: a copy of a train's own, which is changed until it is booked. */
export interface BomDraft {
  spec: AdoptedSpec;
  bomEdits: BomEdits;
}

export function draftOf({ spec, bomEdits }: Pick<Train, 'spec' | 'bomEdits'>): BomDraft {
  return structuredClone({ spec, bomEdits: bomEdits ?? NO_EDITS });
}

export function isGearLine({ kind }: Pick<BomLine, 'kind'>): boolean {
  return kind === 'gear' || kind === 'pinion-shaft';
}

/** The gears of the train that a line stands for; its sources name them. */
export function gearPlaces(line: Pick<BomLine, 'source'>, spec: AdoptedSpec): PlacedGear[] {
  return gearsOf(spec).filter((placed) => {
    const name = placeName(placed);
    return line.source.some((source) => source === name || source.startsWith(`${name},`));
  });
}

/**
 * Why a part cannot be taken for a line; null when it can. A gear must have the very data of its places; any other part
 * must be cleared, of the kind, and meet what the places ask for. Where it is not the kit's own in other ways, that is
 * the person's choice and is shown.
 * @param number as it was asked for
 */
export function refuseChoice(
  spec: AdoptedSpec,
  line: BomLine,
  number: string,
  part: Part | undefined,
): string | null {
  if (!part) return `There is no part “${number.slice(0, 60)}”. Check the number, or look it up in Parts.`;
  if (part.standing !== 'cleared') return `${part.number} is ${part.standing}. Choose a cleared part.`;
  if (line.extraLineId !== undefined) return refuseUnit(part, line.unit);
  if (isGearLine(line)) {
    const refusals = gearPlaces(line, spec).map((placed) =>
      refusePart('partNumber', part.number, part, spec, placed),
    );
    return refusals.find((refusal) => refusal !== null)?.message ?? null;
  }
  if (part.kind !== line.kind)
    return `${part.number} is a ${part.kind}, not a ${line.kind}. Choose a ${line.kind}.`;
  const misfits = (line.needs ?? []).flatMap(
    (need) => fitAsSubstitute(placePart(need), toFitPart(part)).misfits,
  );
  if (misfits.length === 0) return null;
  return `${part.number} does not fit there: ${[...new Set(misfits)].join('; ')}. Choose one that fits.`;
}

/** Quantities of a line are in its unit: another would make them mean something else. */
export function refuseUnit({ number, kind }: Part, unit: BomLine['unit']): string | null {
  const own = unitOf(kind);
  return own === unit
    ? null
    : `${number} is counted in ${own}; the line is in ${unit}. Change the unit to ${own}.`;
}

/** Takes a part for a line; null puts the kit’s own back. @param part as `refuseChoice` accepts it */
export function chooseForLine(draft: BomDraft, line: BomLine, part: Part | null): void {
  const number = part?.number ?? null;
  if (line.extraLineId !== undefined) {
    const added = draft.bomEdits.extraLines.find(({ id }) => id === line.extraLineId);
    if (added) added.partNumber = number;
  } else if (isGearLine(line)) {
    for (const { gear } of gearPlaces(line, draft.spec)) gear.partNumber = number;
  } else if (number === null || number === kitsOwn(line)) delete draft.bomEdits.swaps[line.key];
  else draft.bomEdits.swaps[line.key] = number;
}

/** The part that the kit rules take for the line by themselves. */
function kitsOwn({ replaces, partNumber }: BomLine): string | null {
  return replaces ? replaces.partNumber : partNumber;
}
