import { describe, expect, it } from 'vitest';
import { statedHardness } from './hardness.js';

// ISO 18265 (from memory, as in ASTM E140 for steel): 50 HRC = 513 HV, 58 = 653, 60 = 697, 62 = 746; 95 HBW = 100 HV.
describe('statedHardness', () => {
  it.each<[string, number]>([
    ['58–62 HRC', 653],
    ['58-62HRC', 653],
    ['60 HRC', 697],
    // Halfway between 58 and 60 HRC: (653 + 697)/2.
    ['59 HRC', 675],
    ['HRC: 62 HRC', 746],
    ['280 HV 10', 280],
    ['min. 280 HV', 280],
    ['320 to 280 HV', 280],
    // 190/0.95.
    ['190 HBW', 200],
    ['190–230 HB', 200],
    ['52,5 HRC', 513 + ((595 - 513) * 2.5) / 5],
  ])('reads %s as %d HV', (text, hv) => {
    expect(statedHardness(text)).toBeCloseTo(hv, 6);
  });

  it.each([null, '', 'hard', '60', '12 HRC', '70 HRC'])('does not guess at %s', (text) => {
    expect(statedHardness(text)).toBeNull();
  });
});
