import { describe, expect, it } from 'vitest';
import { dark, light, type Colours } from './palette';

/** Relative luminance and contrast as WCAG 2.1 defines them (success criterion 1.4.3). */
function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const channel = parseInt(hex.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * (r ?? 0) + 0.7152 * (g ?? 0) + 0.0722 * (b ?? 0);
}

function contrast(a: string, b: string): number {
  const [high, low] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return ((high ?? 0) + 0.05) / ((low ?? 0) + 0.05);
}

const INKS = ['ink', 'pencil', 'green', 'brass', 'rust', 'plum', 'slate'] as const;
const GROUNDS = ['paper', 'sheet', 'raised', 'brassWash', 'hoverWash'] as const;

describe('contrast', () => {
  it('computes black on white as 21', () => {
    expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 5);
  });

  const schemes: [string, Colours][] = [
    ['light', light],
    ['dark', dark],
  ];
  it.each(schemes)('%s: every ink on every ground reaches 4.5 : 1', (_, colours) => {
    const low = INKS.flatMap((ink) =>
      GROUNDS.filter((ground) => contrast(colours[ink], colours[ground]) < 4.5).map(
        (ground) => `${ink} on ${ground}`,
      ),
    );
    expect(low).toEqual([]);
  });

  it.each(schemes)(
    '%s: text on a filled button reaches 4.5 : 1 on every colour a button has',
    (_, colours) => {
      const fills = [colours.green, colours.rust, colours.plum, colours.slate, colours.brass];
      expect(fills.filter((fill) => contrast(colours.onGreen, fill) < 4.5)).toEqual([]);
    },
  );

  it('keeps the colours the product names', () => {
    expect([
      light.paper,
      light.sheet,
      light.ink,
      light.green,
      light.brass,
      light.rust,
      light.plum,
      light.slate,
    ]).toEqual(['#F6F4EE', '#FFFFFF', '#20282B', '#0F4C43', '#86590B', '#A93A1E', '#5A4A86', '#4A6572']);
  });
});
