import { type FitNotes, figure, SAME } from './fit-notes.js';
import { type SizesOf, type SubstituteSizes } from './substitute-part.js';

type Plain = Exclude<SubstituteSizes['kind'], 'gear' | 'pinion-shaft' | 'other'>;
type Rule<K extends Plain> = (wanted: SizesOf<K>, has: SizesOf<K>, notes: FitNotes) => void;

const RULES: { [K in Plain]: Rule<K> } = {
  shaft: (wanted, has, notes) => {
    notes.equal('diameter', wanted.diameter, has.diameter);
    notes.atLeast('length', wanted.length, has.length);
  },
  bearing: (wanted, has, notes) => {
    notes.equal('bore', wanted.bore, has.bore);
    notes.equal('outer diameter', wanted.outerDiameter, has.outerDiameter);
    notes.equal('width', wanted.width, has.width);
    notes.sameWords('type', wanted.type, has.type);
    rating('dynamic load rating C', wanted.dynamicLoadRating, has.dynamicLoadRating, notes);
    rating('static load rating C0', wanted.staticLoadRating, has.staticLoadRating, notes);
  },
  key: (wanted, has, notes) => {
    notes.equal('width', wanted.width, has.width);
    notes.equal('height', wanted.height, has.height);
    notes.equal('length', wanted.length, has.length);
  },
  'retaining-ring': (wanted, has, notes) => {
    notes.equal('shaft diameter', wanted.shaftDiameter, has.shaftDiameter);
    notes.equal('thickness', wanted.thickness, has.thickness);
    notes.equal('groove diameter', wanted.grooveDiameter, has.grooveDiameter);
  },
  seal: (wanted, has, notes) => {
    notes.equal('shaft diameter', wanted.shaftDiameter, has.shaftDiameter);
    notes.equal('outer diameter', wanted.outerDiameter, has.outerDiameter);
    notes.equal('width', wanted.width, has.width);
  },
  housing: (wanted, has, notes) => {
    // The wall may be thicker; what counts is the room inside it.
    for (const side of ['length', 'width', 'height'] as const) {
      notes.atLeast(`${side} inside`, wanted[side] - 2 * wanted.wall, has[side] - 2 * has.wall);
    }
    notes.atLeast('wall', wanted.wall, has.wall);
  },
  lubricant: (wanted, has, notes) => {
    notes.sameWords('viscosity grade', wanted.viscosityGrade, has.viscosityGrade);
    const [pack, other] = [wanted.packVolume, has.packVolume];
    if (pack !== null && other !== null && Math.abs(pack - other) > SAME) {
      notes.differs(`packs of ${figure(other, 'l')}, not ${figure(pack, 'l')}`);
    }
  },
  fastener: (wanted, has, notes) => {
    notes.sameWords('thread', wanted.thread, has.thread);
    notes.equal('length', wanted.length, has.length);
    strengthClass(wanted.strengthClass, has.strengthClass, notes);
  },
};

/** Parts without teeth, by their sizes. */
export function fitSizes(wanted: SubstituteSizes, has: SubstituteSizes, notes: FitNotes): void {
  if (wanted.kind !== has.kind) {
    notes.misfit(`it is a ${has.kind}, not a ${wanted.kind}`);
    return;
  }
  if (wanted.kind === 'gear' || wanted.kind === 'pinion-shaft') return;
  if (wanted.kind === 'other') {
    notes.misfit('nothing is known of its sizes');
    return;
  }
  // The table pairs each kind with its own sizes, which TypeScript cannot follow through the lookup.
  const rule = RULES[wanted.kind] as (wanted: SubstituteSizes, has: SubstituteSizes, notes: FitNotes) => void;
  rule(wanted, has, notes);
}

/** Load ratings that the original does not state ask nothing of the other. */
function rating(name: string, wanted: number | null, has: number | null, notes: FitNotes): void {
  if (wanted === null && has === null) notes.check(`${name} of both is not stated`);
  else if (wanted === null)
    notes.check(`${name} of the original is not stated; this one has ${figure(has, 'kN')}`);
  else notes.atLeast(name, wanted, has, 'kN');
}

/** `8.8` of ISO 898-1: tensile strength in hundreds of N/mm², and the share of it at which it yields. */
const CLASS = /^(\d{1,2})\.(\d)$/;

/**
 * Classes of ISO 898-1 compare by tensile and by yield strength, both at least as high; others (nuts, stainless grades)
 * by their words.
 */
function strengthClass(wanted: string, has: string, notes: FitNotes): void {
  const [needs, holds] = [CLASS.exec(wanted.trim()), CLASS.exec(has.trim())];
  if (!needs || !holds) return notes.sameWords('strength class', wanted, has);
  const strength = ([, tensile, share]: RegExpExecArray) => ({
    tensile: Number(tensile),
    yield: Number(tensile) * Number(share),
  });
  const [least, own] = [strength(needs), strength(holds)];
  if (own.tensile < least.tensile || own.yield < least.yield) {
    notes.misfit(`strength class ${has}, lower than ${wanted}`);
  } else if (has.trim() !== wanted.trim()) notes.differs(`strength class ${has}, higher than ${wanted}`);
}
