import { type GearNeed, type PartNeed, type PinionShaftNeed } from '../part-finder.js';
import {
  type FitPlace,
  type SubstitutePart,
  type SubstituteSizes,
  type SubstituteTeeth,
} from './substitute-part.js';

/** What a place in a train asks for, as a part that states nothing else: every part that meets it fits. */
export function placePart(need: PartNeed): SubstitutePart {
  return { number: null, standing: 'cleared', material: null, sizes: sizesOf(need) };
}

/**
 * What the places of one line ask for beyond the original part.
 * @param needs of the line; each must be met
 * @param room how much wider than counted with a gear may be, mm
 */
export function placeOf(needs: readonly PartNeed[], room: number): FitPlace {
  const toothed = needs.filter((need) => need.kind === 'gear' || need.kind === 'pinion-shaft');
  if (toothed.length === 0) return {};
  const bores = toothed.flatMap((need) => (need.kind === 'gear' ? [need.bore] : []));
  return {
    leastFaceWidth: Math.max(...toothed.map(({ faceWidth }) => faceWidth)),
    mostFaceWidth: Math.min(...toothed.map(({ faceWidth }) => faceWidth)) + room,
    ...(bores.length > 0 ? { shaftDiameter: Math.min(...bores) } : {}),
  };
}

function sizesOf(need: PartNeed): SubstituteSizes {
  switch (need.kind) {
    case 'gear':
      return { ...teethOf(need), kind: 'gear', bore: need.bore, hubDiameter: null, hubLength: null };
    case 'pinion-shaft': {
      const { shaftDiameter, shaftLength } = need;
      return { ...teethOf(need), kind: 'pinion-shaft', shaftDiameter, shaftLength };
    }
    case 'bearing':
      return {
        ...{ kind: need.kind, bore: need.bore, outerDiameter: null, width: null, type: null },
        ...{ dynamicLoadRating: null, staticLoadRating: null },
      };
    case 'retaining-ring':
      return { ...need, grooveDiameter: null };
    case 'seal':
      return { ...need, outerDiameter: null, width: null };
    case 'shaft':
      return { kind: need.kind, diameter: need.diameter, length: need.length };
    case 'lubricant':
      return { ...need, packVolume: null };
    case 'key':
    case 'housing':
      return need;
  }
}

function teethOf(need: GearNeed | PinionShaftNeed): SubstituteTeeth {
  const { teeth, module, pressureAngleDeg, helixAngleDeg, hand, profileShift, faceWidth } = need;
  const unknown = { heatTreatment: null, hardened: false, strength: null, softerThanSteel: false };
  return { teeth, module, pressureAngleDeg, helixAngleDeg, hand, profileShift, faceWidth, ...unknown };
}
