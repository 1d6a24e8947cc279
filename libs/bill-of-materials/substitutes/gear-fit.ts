import { leastRim, rimUnderKeyway, rootDiameter } from '../mounted-gear.js';
import { type FitNotes, figure, SAME } from './fit-notes.js';
import { compareStrength } from './strength-fit.js';
import {
  type FitPlace,
  type SizesOf,
  type SubstituteGear,
  type SubstitutePart,
  type SubstituteTeeth,
} from './substitute-part.js';

type Toothed = SubstitutePart & { sizes: SubstituteTeeth };

/** Teeth, face width, material, and the bore on its shaft. */
export function fitGear(
  original: SubstitutePart & { sizes: SubstituteGear },
  candidate: SubstitutePart & { sizes: SubstituteGear },
  place: FitPlace,
  notes: FitNotes,
): void {
  fitTeeth(original, candidate, place, notes);
  fitBore(place.shaftDiameter ?? original.sizes.bore, candidate.sizes, notes);
  const length = ({ hubLength, faceWidth }: SubstituteGear) => hubLength ?? faceWidth;
  const [wanted, has] = [length(original.sizes), length(candidate.sizes)];
  if (has < wanted - SAME) {
    notes.check(
      `the bore is ${figure(has, 'mm')} long, ${figure(wanted - has, 'mm')} shorter: see that the key fits`,
    );
  }
}

/** As a gear, with the shaft that it is cut on. */
export function fitPinionShaft(
  original: SubstitutePart & { sizes: SizesOf<'pinion-shaft'> },
  candidate: SubstitutePart & { sizes: SizesOf<'pinion-shaft'> },
  place: FitPlace,
  notes: FitNotes,
): void {
  fitTeeth(original, candidate, place, notes);
  notes.equal('shaft diameter', original.sizes.shaftDiameter, candidate.sizes.shaftDiameter);
  notes.atLeast('shaft length', original.sizes.shaftLength, candidate.sizes.shaftLength);
}

function fitTeeth(original: Toothed, candidate: Toothed, place: FitPlace, notes: FitNotes): void {
  const [wanted, has] = [original.sizes, candidate.sizes];
  notes.equal('teeth', wanted.teeth, has.teeth, '');
  notes.equal('module', wanted.module, has.module);
  notes.equal('pressure angle', wanted.pressureAngleDeg, has.pressureAngleDeg, '°');
  notes.equal('helix angle', wanted.helixAngleDeg, has.helixAngleDeg, '°');
  if (has.helixAngleDeg !== 0) notes.sameWords('hand', wanted.hand, has.hand);
  fitShift(wanted.profileShift, has.profileShift, notes);
  const least = place.leastFaceWidth ?? wanted.faceWidth;
  notes.atLeast('face width', least, has.faceWidth);
  const { mostFaceWidth: most } = place;
  if (most !== undefined && has.faceWidth > most + SAME) {
    notes.misfit(`face width ${figure(has.faceWidth, 'mm')}; there is room for ${figure(most, 'mm')}`);
  }
  compareStrength(original, candidate, notes);
}

/** A shift that is not stated counts as 0, and the maker is to be asked. */
function fitShift(wanted: number | null, has: number | null, notes: FitNotes): void {
  notes.equal('profile shift', wanted ?? 0, has ?? 0, '');
  if (wanted === null && has === null) notes.check('profile shift of both is not stated, counted as 0');
  else if (has === null) notes.check('profile shift is not stated, counted as 0');
  else if (wanted === null) notes.check('profile shift of the original is not stated, counted as 0');
}

/** Equal, or smaller while the rim under the keyway still holds after boring out; never larger. */
function fitBore(wanted: number, has: SubstituteGear, notes: FitNotes): void {
  if (has.bore > wanted + SAME) {
    notes.misfit(`bore ${figure(has.bore, 'mm')}, larger than ${figure(wanted, 'mm')}`);
    return;
  }
  if (has.bore > wanted - SAME) return;
  const gear = {
    ...has,
    stage: 1,
    role: 'wheel' as const,
    profileShift: has.profileShift ?? 0,
    ...(has.rootDiameter === undefined ? {} : { figures: { rootDiameter: has.rootDiameter } }),
  };
  const bored = `bore ${figure(has.bore, 'mm')}, to be bored out to ${figure(wanted, 'mm')}`;
  const rim = rimUnderKeyway(gear, wanted);
  if (wanted >= rootDiameter(gear) || rim < leastRim(gear)) {
    const left = `${figure(Math.max(0, rim), 'mm')} of rim under the keyway would be left`;
    notes.misfit(`${bored}: ${left}, at least ${figure(leastRim(gear), 'mm')} is needed`);
    return;
  }
  if (has.hubDiameter !== null && has.hubDiameter <= wanted + SAME) {
    notes.misfit(`${bored}: its hub is ${figure(has.hubDiameter, 'mm')} across`);
    return;
  }
  notes.differs(bored);
  if (has.hardened) notes.check('hardened: ask whether the bore can still be machined');
}
