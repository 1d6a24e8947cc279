import { fieldError } from './errors.js';

export type QuantityKind =
  'length' | 'angle' | 'arcmin' | 'torque' | 'speed' | 'power' | 'stress' | 'mass' | 'module' | 'percent';

const PER_RADIAN = 180 / Math.PI;
// Exact by definition: inch 25.4 mm, pound 0.45359237 kg, pound-force 4.4482216152605 N.
const POUND_FORCE = 4.4482216152605;
const POUND_FOOT = POUND_FORCE * 0.3048;

/**
 * Unit spellings (compared after `plainUnit`) and their size in the kind's base unit, which stands first.
 * Units that differ from another by case alone (mW and MW) are left out rather than guessed.
 */
const UNITS: Record<QuantityKind, { base: string; factors: Record<string, number> }> = {
  length: {
    base: 'mm',
    factors: { mm: 1, cm: 10, m: 1000, µm: 1e-3, um: 1e-3, in: 25.4, '"': 25.4, ft: 304.8 },
  },
  angle: {
    base: '°',
    factors: { '°': 1, deg: 1, rad: PER_RADIAN, '′': 1 / 60, "'": 1 / 60, arcmin: 1 / 60 },
  },
  arcmin: {
    base: '′',
    factors: { '′': 1, "'": 1, arcmin: 1, '°': 60, deg: 60, rad: 60 * PER_RADIAN },
  },
  torque: {
    base: 'N·m',
    factors: { nm: 1, nmm: 1e-3, ncm: 1e-2, cnm: 1e-2, knm: 1e3, lbfft: POUND_FOOT, lbfin: POUND_FOOT / 12 },
  },
  speed: {
    base: 'rpm',
    factors: { rpm: 1, '1/min': 1, 'r/min': 1, 'min-1': 1, '1/s': 60, 'rad/s': 30 / Math.PI },
  },
  power: { base: 'kW', factors: { kw: 1, w: 1e-3, hp: 0.55 * POUND_FOOT } },
  stress: {
    base: 'MPa',
    factors: { mpa: 1, 'n/mm2': 1, gpa: 1e3, kpa: 1e-3, bar: 0.1, psi: POUND_FORCE / 645.16 },
  },
  mass: { base: 'kg', factors: { kg: 1, g: 1e-3, t: 1e3, lb: 0.45359237 } },
  module: { base: 'mm', factors: { mm: 1, m: 1 } },
  percent: { base: '%', factors: { '%': 1, '‰': 0.1, ppm: 1e-4 } },
};

const FIGURE = /^([+-]?)([1-9]\d{0,2}(?:,\d{3})+(?!\d)|\d*)(\.\d*)?(e[+-]?\d{1,3})?\s*(.*)$/i;
const MODULE_WORDS = /^m\s*([\d.]+)\s*(?:\(.*\))?$/i;
const PITCH_WORDS = /^(?:dp\s*([\d.]+)|([\d.]+)\s*dp)$/i;

/**
 * Reads a figure with its unit and gives it in the base unit: mm, °, ′, N·m, rpm, kW, MPa, kg, module in mm, %.
 * A figure without a unit is taken in the base unit. Point as decimal mark, comma between thousands.
 * Modules may also be written `m 2`, `DP 12` or `12 DP`.
 * @param field path named in the refusal
 * @throws InputError when the text is no figure, the unit does not belong to the kind, or the size is out of range
 */
export function parseQuantity(text: string, kind: QuantityKind, field = 'value'): number {
  const { base, factors } = UNITS[kind];
  const shown = text.length > 40 ? `${text.slice(0, 40)}…` : text;
  const clean = text.length > 80 ? '' : text.trim().replaceAll('\u2212', '-');
  const moduleFigure = kind === 'module' ? parseModuleWords(clean) : undefined;
  if (moduleFigure !== undefined) return moduleFigure;
  const match = FIGURE.exec(clean);
  const digits = match ? (match[2] ?? '') + (match[3] ?? '') : '';
  if (!match || !/\d/.test(digits)) {
    throw fieldError(field, shown, `“${shown}” is not a figure. Write it like ${example(kind)}.`);
  }
  const [, sign = '', , , exponent = '', unitText = ''] = match;
  const unit = plainUnit(unitText, kind);
  const factor = unit === '' ? 1 : Object.hasOwn(factors, unit) ? factors[unit] : undefined;
  if (factor === undefined) {
    const message = `“${unitText}” is no unit for this figure. Write it in ${base}, like ${example(kind)}.`;
    throw fieldError(field, shown, message, base);
  }
  const value = Number(sign + digits.replaceAll(',', '') + exponent) * factor;
  if (!Number.isFinite(value)) throw fieldError(field, shown, `“${shown}” is too large.`);
  return value === 0 ? 0 : value;
}

/** `m 1.25 (DP 20.32)`, `DP 12`, `12 DP`; undefined for anything else. */
function parseModuleWords(text: string): number | undefined {
  const pitch = PITCH_WORDS.exec(text);
  const moduleText = MODULE_WORDS.exec(text)?.[1];
  const value = pitch ? 25.4 / Number(pitch[1] ?? pitch[2]) : Number(moduleText ?? NaN);
  return Number.isFinite(value) ? value : undefined;
}

/** One spelling for each unit: lower case where case carries no meaning, products written without a sign. */
function plainUnit(unitText: string, kind: QuantityKind): string {
  const text = unitText.trim().replace('μ', 'µ').replace('²', '2').replace('⁻¹', '-1');
  if (kind === 'torque') return text.replace(/[·*.\s⋅-]/g, '').toLowerCase();
  return text.replace(/\s/g, '').toLowerCase();
}

function example(kind: QuantityKind): string {
  const examples: Record<QuantityKind, string> = {
    length: '56.5 mm',
    angle: '20°',
    arcmin: '12′',
    torque: '45 N·m',
    speed: '1,400 rpm',
    power: '0.75 kW',
    stress: '425 MPa',
    mass: '1.2 kg',
    module: '1.25',
    percent: '1 %',
  };
  return examples[kind];
}
