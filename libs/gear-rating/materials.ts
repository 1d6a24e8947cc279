import { HBW_PER_HV } from './hardness.js';

/** A straight line of ISO 6336-5: σ_lim = slope · hardness + base, N/mm², hardness in HV. */
interface StrengthLine {
  slope: number;
  base: number;
}

/** What a group of materials bears after one treatment. */
export interface MaterialField {
  /** Shown to people. */
  name: string;
  groups: readonly MaterialGroup[];
  treatments: readonly Treatment[];
  /** Contact and bending, σ_Hlim and σ_Flim. */
  contact: StrengthLine;
  bending: StrengthLine;
  /** Hardness that the lines hold for, HV. */
  leastHv: number;
  greatestHv: number;
  /** Counted where no hardness is stated, HV: what such material has at least when it is bought to its standard. */
  usualHv: Partial<Record<MaterialGroup, number>>;
  /** N/mm² */
  elasticModulus: number;
  poissonRatio: number;
  /** kg/m³ */
  density: number;
  origin: string;
}

export const MATERIAL_GROUPS = [
  'structural steel',
  'carbon steel',
  'alloy steel',
  'case-hardening steel',
  'nitriding steel',
  'grey iron',
  'nodular iron',
] as const;
export type MaterialGroup = (typeof MATERIAL_GROUPS)[number];

export const TREATMENTS = [
  'as delivered',
  'quenched and tempered',
  'induction-hardened',
  'case-hardened',
  'nitrided',
  'nitrocarburised',
] as const;
export type Treatment = (typeof TREATMENTS)[number];

const ORIGIN = 'ISO 6336-5, quality MQ, from memory; typical, confirm with the supplier';
const STEEL = { elasticModulus: 206_000, poissonRatio: 0.3, density: 7850, origin: ORIGIN };

/** A line of the standard that is stated over HBW, turned to HV. */
const overHbw = (slope: number, base: number): StrengthLine => ({ slope: slope * HBW_PER_HV, base });
const constant = (base: number): StrengthLine => ({ slope: 0, base });
const hv = (hbw: number) => hbw / HBW_PER_HV;

/**
 * Typical allowable stress numbers of gear materials in the fields of ISO 6336-5. Slopes and bases are recalled from
 * memory and rounded as the standard prints them; they serve to compare materials, and every figure is to be confirmed
 * with the supplier. Plastics, brass, bronze, aluminium, stainless and sintered steels are not rated here.
 */
export const MATERIAL_FIELDS: readonly MaterialField[] = [
  {
    name: 'normalised steel',
    groups: ['structural steel', 'carbon steel', 'case-hardening steel'],
    treatments: ['as delivered'],
    contact: overHbw(1.0, 190),
    bending: overHbw(0.455, 69),
    leastHv: hv(110),
    greatestHv: hv(210),
    usualHv: { 'structural steel': hv(120), 'carbon steel': hv(170), 'case-hardening steel': hv(140) },
    ...STEEL,
  },
  {
    name: 'through-hardened carbon steel',
    groups: ['carbon steel'],
    treatments: ['quenched and tempered'],
    contact: { slope: 0.925, base: 360 },
    bending: { slope: 0.24, base: 163 },
    leastHv: 135,
    greatestHv: 210,
    usualHv: { 'carbon steel': 190 },
    ...STEEL,
  },
  {
    name: 'through-hardened alloy steel',
    groups: ['alloy steel', 'nitriding steel'],
    // These are delivered hardened and tempered; where nothing is stated the softest of the field is counted.
    treatments: ['quenched and tempered', 'as delivered'],
    contact: { slope: 1.313, base: 373 },
    bending: { slope: 0.425, base: 187 },
    leastHv: 200,
    greatestHv: 360,
    usualHv: { 'alloy steel': 200, 'nitriding steel': 200 },
    ...STEEL,
  },
  {
    name: 'induction- or flame-hardened steel',
    groups: ['carbon steel', 'alloy steel'],
    treatments: ['induction-hardened'],
    contact: { slope: 0.541, base: 882 },
    bending: { slope: 0.138, base: 290 },
    leastHv: 500,
    greatestHv: 570,
    usualHv: { 'carbon steel': 520, 'alloy steel': 520 },
    ...STEEL,
  },
  {
    name: 'case-hardened steel',
    groups: ['case-hardening steel'],
    treatments: ['case-hardened'],
    contact: constant(1500),
    bending: constant(425),
    // The standard begins at 660 HV, drawings at 58 HRC, which converts to 653 HV.
    leastHv: 650,
    greatestHv: 800,
    usualHv: { 'case-hardening steel': 660 },
    ...STEEL,
  },
  {
    name: 'nitrided nitriding steel',
    groups: ['nitriding steel'],
    treatments: ['nitrided'],
    contact: constant(1250),
    bending: constant(420),
    leastHv: 650,
    greatestHv: 900,
    usualHv: { 'nitriding steel': 650 },
    ...STEEL,
  },
  {
    name: 'nitrided alloy steel',
    groups: ['alloy steel'],
    treatments: ['nitrided'],
    contact: constant(998),
    bending: constant(363),
    leastHv: 450,
    greatestHv: 650,
    usualHv: { 'alloy steel': 450 },
    ...STEEL,
  },
  {
    name: 'nitrocarburised steel',
    groups: ['carbon steel', 'alloy steel'],
    treatments: ['nitrocarburised'],
    contact: constant(650),
    bending: constant(224),
    leastHv: 300,
    greatestHv: 650,
    usualHv: { 'carbon steel': 300, 'alloy steel': 300 },
    ...STEEL,
    origin: 'ISO 6336-5, quality ML, from memory; typical, confirm with the supplier',
  },
  {
    name: 'grey cast iron',
    groups: ['grey iron'],
    treatments: ['as delivered'],
    contact: overHbw(1.033, 132),
    bending: overHbw(0.256, 8),
    leastHv: hv(150),
    greatestHv: hv(240),
    usualHv: { 'grey iron': hv(170) },
    elasticModulus: 118_000,
    poissonRatio: 0.3,
    density: 7200,
    origin: ORIGIN,
  },
  {
    name: 'nodular cast iron',
    groups: ['nodular iron'],
    treatments: ['as delivered'],
    contact: overHbw(1.434, 211),
    bending: overHbw(0.35, 119),
    leastHv: hv(175),
    greatestHv: hv(300),
    usualHv: { 'nodular iron': hv(180) },
    elasticModulus: 173_000,
    poissonRatio: 0.3,
    density: 7100,
    origin: ORIGIN,
  },
];
