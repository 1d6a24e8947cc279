import { SUPPLIER } from './supplier-names.js';

/** One family of stock gears: same maker, material and form, over several modules and tooth counts. */
export interface GearFamily {
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

/** The first families of the library; later ones follow, so that part numbers stay. */
const FIRST_FAMILIES: GearFamily[] = [
  {
    word: 'Spur gear, steel',
    material: 'C45',
    density: 7850,
    heatTreatment: null,
    hardness: null,
    supplier: SUPPLIER.marrow,
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
    supplier: SUPPLIER.tidewrack,
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
    supplier: SUPPLIER.tidewrack,
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
    supplier: SUPPLIER.marrow,
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
    supplier: SUPPLIER.larkspit,
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
    supplier: SUPPLIER.larkspit,
    modules: [0.5, 1, 1.5, 2],
    teeth: [...SMALL.filter((z) => z % 3 === 0), ...EVERY_SECOND.filter((z) => z <= 80)],
    widthFactor: 10,
    helixAngleDeg: 0,
    hubbed: true,
  },
];

/** What the library gained since: other materials of the same teeth, so that many gears have a substitute. */
const LATER_FAMILIES: GearFamily[] = [
  {
    word: 'Spur gear, quenched and tempered steel',
    material: '42CrMo4',
    density: 7850,
    heatTreatment: 'quenched and tempered',
    hardness: '280–320 HB',
    supplier: SUPPLIER.tidewrack,
    modules: [1, 1.5, 2, 2.5, 3, 4],
    teeth: [...SMALL.filter((z) => z >= 15), ...EVERY_SECOND],
    widthFactor: 10,
    helixAngleDeg: 0,
    hubbed: true,
  },
  {
    word: 'Helical gear, steel',
    material: 'C45',
    density: 7850,
    heatTreatment: null,
    hardness: null,
    supplier: SUPPLIER.marrow,
    modules: [1, 1.25, 2.5],
    teeth: [17, 19, 21, 24, 28, 32, 36, 45, 55, 65, 72, 90],
    widthFactor: 12,
    helixAngleDeg: 15,
    hubbed: false,
  },
  {
    word: 'Spur gear, stainless steel',
    material: 'X17CrNi16-2',
    density: 7700,
    heatTreatment: null,
    hardness: null,
    supplier: SUPPLIER.marrow,
    modules: [1, 1.5, 2, 2.5],
    teeth: [...SMALL.filter((z) => z >= 14), ...EVERY_SECOND.filter((z) => z <= 100)],
    widthFactor: 10,
    helixAngleDeg: 0,
    hubbed: true,
  },
  {
    word: 'Spur gear, cast polyamide',
    material: 'PA 6 G',
    density: 1150,
    heatTreatment: null,
    hardness: null,
    supplier: SUPPLIER.larkspit,
    modules: [1.5, 2, 3, 4],
    teeth: [...SMALL.filter((z) => z % 3 === 0), ...EVERY_SECOND.filter((z) => z <= 80)],
    widthFactor: 12,
    helixAngleDeg: 0,
    hubbed: false,
  },
  {
    word: 'Spur gear, ground steel',
    material: '16MnCr5',
    density: 7850,
    heatTreatment: 'case-hardened',
    hardness: '58–62 HRC',
    supplier: SUPPLIER.asanagi,
    modules: [0.5, 0.8, 1],
    teeth: range(14, 60).filter((z) => z % 2 === 0),
    widthFactor: 8,
    helixAngleDeg: 0,
    hubbed: false,
  },
  {
    word: 'Spur gear, cast iron',
    material: 'EN-GJL-250',
    density: 7200,
    heatTreatment: null,
    hardness: null,
    supplier: SUPPLIER.lazuli,
    modules: [2.5, 3, 4, 5],
    teeth: WHEELS.filter((z) => z >= 40 && z <= 100),
    widthFactor: 10,
    helixAngleDeg: 0,
    hubbed: true,
  },
];

export const GEAR_FAMILIES = { first: FIRST_FAMILIES, later: LATER_FAMILIES } as const;
