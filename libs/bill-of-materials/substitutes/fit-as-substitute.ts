import { FitNotes } from './fit-notes.js';
import { fitGear, fitPinionShaft } from './gear-fit.js';
import { fitSizes } from './size-fit.js';
import { type Fit, type FitPlace, type SubstitutePart, type SubstituteSizes } from './substitute-part.js';

/**
 * Whether a part drops in for another, by common practice in the workshop (no standard lays it down):
 * - gears: same teeth, module, pressure angle, helix and hand, profile shift; bore equal, or smaller and bored out with
 *   the rim under the keyway still two modules; face at least as wide; material at least as strong;
 * - bearings: same bore, outer diameter, width and type, load ratings at least as high;
 * - keys, rings, seals: same sizes; shafts: same diameter, at least as long; housings: at least as large inside, wall at
 *   least as thick; lubricants: same grade; fasteners: same thread and length, strength class at least as high.
 *
 * Only a cleared part drops in. What one of the two does not state never refuses it, but is listed to be checked.
 * @param place what the place in a train asks for, where it is not what the original has
 */
export function fitAsSubstitute(
  original: SubstitutePart,
  candidate: SubstitutePart,
  place: FitPlace = {},
): Fit {
  const notes = new FitNotes();
  if (candidate.standing !== 'cleared') notes.misfit(`it is ${candidate.standing}`);
  if (isSame(original, candidate)) notes.misfit('it is the same part');
  if (hasSizes(original, 'gear') && hasSizes(candidate, 'gear')) fitGear(original, candidate, place, notes);
  else if (hasSizes(original, 'pinion-shaft') && hasSizes(candidate, 'pinion-shaft')) {
    fitPinionShaft(original, candidate, place, notes);
  } else fitSizes(original.sizes, candidate.sizes, notes);
  return notes.result();
}

function isSame({ number }: SubstitutePart, other: SubstitutePart): boolean {
  return number !== null && number.toLowerCase() === other.number?.toLowerCase();
}

function hasSizes<K extends SubstituteSizes['kind']>(
  part: SubstitutePart,
  kind: K,
): part is SubstitutePart & { sizes: Extract<SubstituteSizes, { kind: K }> } {
  return part.sizes.kind === kind;
}
