import { boreFor, gearMass, hubFor } from '../data/gear-blank.js';
import { type Random } from '../data/random.js';
import { type ScalePart } from './scale-part.js';

interface Material {
  name: string;
  word: string;
  /** kg/m³ */
  density: number;
  heatTreatment: string | null;
  hardness: string | null;
}

const MATERIALS: readonly Material[] = [
  { name: 'C45', word: 'steel', density: 7850, heatTreatment: null, hardness: null },
  { name: '42CrMo4', word: 'tempered steel', density: 7850, heatTreatment: 'quenched and tempered', hardness: '280 HB' },
  { name: '16MnCr5', word: 'hardened steel', density: 7850, heatTreatment: 'case-hardened', hardness: '58–62 HRC' },
  { name: 'CuZn39Pb3', word: 'brass', density: 8470, heatTreatment: null, hardness: null },
  { name: 'POM', word: 'acetal', density: 1410, heatTreatment: null, hardness: null },
]; // prettier-ignore

/** Modules of ISO 54, mm (from memory). */
const MODULES = [0.5, 0.6, 0.8, 1, 1.25, 1.5, 2, 2.5, 3, 4, 5, 6];
const HELIX_ANGLES = [0, 0, 0, 15, 20];
/** Face width in modules. */
const WIDTHS = [8, 10, 12];
const SHIFTS = [0, 0, 0, 0.1, 0.2, 0.3];

/** A gear with a bore, or a pinion cut on its shaft. */
export function scaleGear(random: Random, mark: string): ScalePart {
  const material = random.pick(MATERIALS);
  const module = random.pick(MODULES);
  const helixAngleDeg = random.pick(HELIX_ANGLES);
  const hand = helixAngleDeg === 0 ? null : random.pick(['left', 'right'] as const);
  const onShaft = random.chance(0.05);
  const teeth = onShaft ? random.whole(12, 24) : random.whole(12, 150);
  const faceWidth = Number((random.pick(WIDTHS) * module).toFixed(2));
  const toothed = {
    teeth,
    module,
    pressureAngleDeg: 20,
    helixAngleDeg,
    hand,
    profileShift: teeth < 20 ? random.pick(SHIFTS) : 0,
    faceWidth,
    heatTreatment: material.heatTreatment,
    hardness: material.hardness,
  };
  const form = helixAngleDeg === 0 ? 'Spur' : 'Helical';
  const handWord = hand === null ? '' : `, ${hand} hand ${helixAngleDeg}°`;
  const what = `${teeth} teeth, module ${module}${handWord}, ${material.word}, pattern ${mark}`;
  const blank = { teeth, module, helixAngleDeg, faceWidth };
  const bore = boreFor(blank);
  if (onShaft) {
    const shaftLength = random.whole(6, 30) * 10;
    return {
      kind: 'pinion-shaft',
      description: `${form} pinion on its shaft, ${what}`,
      material: material.name,
      mass: gearMass(blank, 0, null, material.density),
      attributes: { ...toothed, shaftDiameter: bore, shaftLength },
    };
  }
  const hub = random.chance(0.6) ? hubFor(blank, bore) : null;
  return {
    kind: 'gear',
    description: `${form} gear, ${what}`,
    material: material.name,
    mass: gearMass(blank, bore, hub, material.density),
    attributes: { ...toothed, bore, hubDiameter: hub?.diameter ?? null, hubLength: hub?.length ?? null },
  };
}
