const MINUS = '\u2212';
/** Shown where a figure is missing or not a finite number, so that no NaN reaches a screen or a sheet. */
const MISSING = '\u2013';

type Figure = number | null | undefined;

/**
 * A number with a fixed count of decimals and a real minus sign; never `−0.00`.
 * @param decimals 0–20
 */
export function formatNumber(value: Figure, decimals: number): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return MISSING;
  const text = Math.abs(value).toFixed(decimals);
  return value < 0 && Number(text) !== 0 ? MINUS + text : text;
}

/** Millimetres to 0.01 mm: `56.50 mm`. */
export function formatLength(mm: Figure): string {
  return withUnit(formatNumber(mm, 2), ' mm');
}

/** Degrees to 0.001°: `22.891°`. */
export function formatAngle(degrees: Figure): string {
  return withUnit(formatNumber(degrees, 3), '°');
}

/** Minutes of arc to 0.1′: `12.4′`. */
export function formatArcmin(arcmin: Figure): string {
  return withUnit(formatNumber(arcmin, 1), '′');
}

/** Signed per cent to 0.001 %: `+0.267 %`, `−0.133 %`, `0.000 %`. */
export function formatErrorPercent(percent: Figure): string {
  const text = formatNumber(percent, 3);
  const plus = typeof percent === 'number' && percent > 0 && Number(text) > 0 ? '+' : '';
  return withUnit(plus + text, ' %');
}

/** Three decimals: `1.635`. */
export function formatContactRatio(value: Figure): string {
  return formatNumber(value, 3);
}

/** Kilograms; below 1 kg to the gram, below 100 kg to 10 g, else to 100 g: `0.035 kg`, `12.40 kg`, `240.5 kg`. */
export function formatMass(kg: Figure): string {
  const size = Math.abs(kg ?? 0);
  return withUnit(formatNumber(kg, size < 1 ? 3 : size < 100 ? 2 : 1), ' kg');
}

/** Newton metres to 0.01 N·m: `45.00 N·m`. */
export function formatTorque(newtonMetres: Figure): string {
  return withUnit(formatNumber(newtonMetres, 2), ' N·m');
}

/** Revolutions per minute to 0.1 rpm, thousands grouped: `1,400.0 rpm`. */
export function formatSpeed(rpm: Figure): string {
  return withUnit(formatNumber(rpm, 1).replace(/\B(?=(\d{3})+\.)/g, ','), ' rpm');
}

/** Kilowatts to 1 W: `0.172 kW`. */
export function formatPower(kilowatts: Figure): string {
  return withUnit(formatNumber(kilowatts, 3), ' kW');
}

/** Diametral pitch (teeth per inch of reference diameter) of a module in mm. Holds both ways: 25.4 / module. */
export function moduleToDiametralPitch(moduleMm: number): number {
  return 25.4 / moduleMm;
}

/** Module in mm of a diametral pitch per inch. */
export function diametralPitchToModule(perInch: number): number {
  return 25.4 / perInch;
}

/** Module with its diametral pitch beside it: `m 1.25 (DP 20.32)`. */
export function formatModule(moduleMm: Figure): string {
  if (moduleMm === null || moduleMm === undefined || !Number.isFinite(moduleMm) || moduleMm <= 0)
    return MISSING;
  const pitch = trimmed(moduleToDiametralPitch(moduleMm), 3);
  return `m ${trimmed(moduleMm, 4)} (DP ${pitch})`;
}

/** A number with at most `decimals` decimals and no trailing zeros: `1.25`, `3`. */
export function formatTrimmed(value: Figure, decimals: number): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return MISSING;
  return trimmed(value, decimals);
}

function trimmed(value: number, decimals: number): string {
  const text = formatNumber(value, decimals);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

function withUnit(text: string, unit: string): string {
  return text === MISSING ? text : text + unit;
}
