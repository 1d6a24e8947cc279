import { boreFor, gearMass, hubFor } from './gear-blank.js';

/** What the parts service needs to book one gear; attribute names are those of the part kind `gear`. */
export interface GearRow {
  kind: 'gear';
  description: string;
  standing: 'cleared' | 'draft' | 'withdrawn';
  material: string;
  mass: number;
  supply: 'bought';
  supplier: string;
  attributes: {
    teeth: number;
    module: number;
    pressureAngleDeg: number;
    helixAngleDeg: number;
    hand: 'left' | 'right' | null;
    profileShift: number | null;
    faceWidth: number;
    bore: number;
    hubDiameter: number | null;
    hubLength: number | null;
    heatTreatment: string | null;
    hardness: string | null;
  };
}

/** One family of stock gears: same maker, material and form, over several modules and tooth counts. */
interface Family {
  word: string;
  material: string;
  density: number;
  heatTreatment: string | null;
  hardness: string | null;
  supplier: string;
  modules: number[];
  teeth: number[];
  /** Face width in modules. */
  widthFactor: number;
  helixAngleDeg: number;
  hubbed: boolean;
}

const range = (from: number, to: number): number[] =>
  Array.from({ length: to - from + 1 }, (_, i) => from + i);

const SMALL = range(12, 30);
const WHEELS = [
  32, 34, 35, 36, 38, 40, 42, 44, 45, 48, 50, 52, 54, 55, 56, 57, 58, 60, 62, 64, 65, 66, 68, 70, 72, 75, 76,
  78, 80, 84, 85, 88, 90, 95, 96, 100, 104, 108, 110, 112, 114, 116, 118, 120, 125, 130, 135, 140,
];
const EVERY_SECOND = WHEELS.filter((_, i) => i % 2 === 0);

const MARROW = 'Marrow Sound Gear Works';
const TIDEWRACK = 'Tidewrack Transmission Supply';
const LARKSPIT = 'Larkspit Plastics & Brass';

const FAMILIES: Family[] = [
  {
    word: 'Spur gear, steel',
    material: 'C45',
    density: 7850,
    heatTreatment: null,
    hardness: null,
    supplier: MARROW,
    modules: [0.5, 0.8, 1, 1.25, 1.5, 2],
    teeth: [...SMALL, ...WHEELS],
    widthFactor: 10,
    helixAngleDeg: 0,
    hubbed: true,
  },
  {
    word: 'Spur gear, steel',
    material: 'C45',
    density: 7850,
    heatTreatment: null,
    hardness: null,
    supplier: TIDEWRACK,
    modules: [2.5, 3, 4, 5],
    teeth: [...SMALL.filter((z) => z <= 25), ...EVERY_SECOND.filter((z) => z <= 90)],
    widthFactor: 10,
    helixAngleDeg: 0,
    hubbed: true,
  },
  {
    word: 'Spur pinion, hardened steel',
    material: '16MnCr5',
    density: 7850,
    heatTreatment: 'case-hardened',
    hardness: '58–62 HRC',
    supplier: TIDEWRACK,
    modules: [1, 1.5, 2, 2.5, 3],
    teeth: range(15, 26),
    widthFactor: 10,
    helixAngleDeg: 0,
    hubbed: false,
  },
  {
    word: 'Helical gear, hardened steel',
    material: '16MnCr5',
    density: 7850,
    heatTreatment: 'case-hardened',
    hardness: '58–62 HRC',
    supplier: MARROW,
    modules: [1, 1.5, 2, 3],
    teeth: [16, 18, 20, 22, 25, 30, 40, 50, 60, 75, 80, 100],
    widthFactor: 12,
    helixAngleDeg: 15,
    hubbed: false,
  },
  {
    word: 'Spur gear, brass',
    material: 'CuZn39Pb3',
    density: 8470,
    heatTreatment: null,
    hardness: null,
    supplier: LARKSPIT,
    modules: [0.5, 0.8, 1],
    teeth: [...SMALL.filter((z) => z % 2 === 0), ...EVERY_SECOND.filter((z) => z <= 100)],
    widthFactor: 8,
    helixAngleDeg: 0,
    hubbed: true,
  },
  {
    word: 'Spur gear, acetal',
    material: 'POM',
    density: 1410,
    heatTreatment: null,
    hardness: null,
    supplier: LARKSPIT,
    modules: [0.5, 1, 1.5, 2],
    teeth: [...SMALL.filter((z) => z % 3 === 0), ...EVERY_SECOND.filter((z) => z <= 80)],
    widthFactor: 10,
    helixAngleDeg: 0,
    hubbed: true,
  },
];

function gearRow(
  family: Family,
  module: number,
  teeth: number,
  hand: 'left' | 'right' | null,
  index: number,
): GearRow {
  const faceWidth = Math.ceil(family.widthFactor * module);
  const blank = { teeth, module, helixAngleDeg: family.helixAngleDeg, faceWidth };
  const bore = boreFor(blank);
  const hub = family.hubbed ? hubFor(blank, bore) : null;
  const handWord = hand === null ? '' : `, ${hand} hand ${family.helixAngleDeg}°`;
  return {
    kind: 'gear',
    description: `${family.word}, ${teeth} teeth, module ${module}${handWord}`,
    // A real library is never all cleared: a few rows wait, a few are gone.
    standing: index % 97 === 50 ? 'draft' : index % 131 === 77 ? 'withdrawn' : 'cleared',
    material: family.material,
    mass: gearMass(blank, bore, hub, family.density),
    supply: 'bought',
    supplier: family.supplier,
    attributes: {
      teeth,
      module,
      pressureAngleDeg: 20,
      helixAngleDeg: family.helixAngleDeg,
      hand,
      profileShift: 0,
      faceWidth,
      bore,
      hubDiameter: hub?.diameter ?? null,
      hubLength: hub?.length ?? null,
      heatTreatment: family.heatTreatment,
      hardness: family.hardness,
    },
  };
}

/** All stock gears of the demo library, always in the same order. */
export function demoGears(): GearRow[] {
  const rows: GearRow[] = [];
  for (const family of FAMILIES) {
    const hands = family.helixAngleDeg === 0 ? ([null] as const) : (['right', 'left'] as const);
    for (const module of family.modules)
      for (const teeth of family.teeth)
        for (const hand of hands) rows.push(gearRow(family, module, teeth, hand, rows.length));
  }
  return rows;
}
