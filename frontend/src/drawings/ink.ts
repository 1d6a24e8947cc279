/** Line kinds of the drawing office, as SVG attributes; colours follow the light or dark scheme. */
const tone = (name: string) => `var(--sy-palette-drawing-${name})`;

export const INK = {
  outline: tone('outline'),
  centre: tone('centre'),
  dimension: tone('dimension'),
  faint: tone('faint'),
  pinion: tone('pinion'),
  wheel: tone('wheel'),
  sheet: tone('sheet'),
  text: tone('text'),
} as const;

/** Long dash, gap, dot, gap: centre lines and pitch circles (ISO 128 type 04). */
export const DASH_DOT = '10 2.5 1.5 2.5';
export const DASH_DOT_FINE = '5 1.6 1 1.6';
/** Long dash, two dots: an envelope that is not part of the thing drawn (ISO 128 type 05). */
export const DASH_TWO_DOTS = '12 2.5 1.5 2.5 1.5 2.5';

export interface Point {
  x: number;
  y: number;
}

/** SVG path of a polyline through points in px; two decimals are a hundredth of a pixel. */
export function pathOf(points: readonly Point[], closed = false): string {
  const body = points
    .map(({ x, y }, at) => `${at === 0 ? 'M' : 'L'}${x.toFixed(2)} ${y.toFixed(2)}`)
    .join('');
  return closed ? `${body}Z` : body;
}
