import { describe, expect, it } from 'vitest';
import { keyLengthForHub, keyVolume, parallelKeyForBore } from './index.js';

// DIN 6885-1 (seen): bore over, up to and including, b × h, t1, t2.
const PUBLISHED = [
  [6, 8, 2, 2, 1.2, 1.0],
  [8, 10, 3, 3, 1.8, 1.4],
  [10, 12, 4, 4, 2.5, 1.8],
  [12, 17, 5, 5, 3.0, 2.3],
  [17, 22, 6, 6, 3.5, 2.8],
  [22, 30, 8, 7, 4.0, 3.3],
  [30, 38, 10, 8, 5.0, 3.3],
  [38, 44, 12, 8, 5.0, 3.3],
  [44, 50, 14, 9, 5.5, 3.8],
  [50, 58, 16, 10, 6.0, 4.3],
  [58, 65, 18, 11, 7.0, 4.4],
  [65, 75, 20, 12, 7.5, 4.9],
] as const;

describe('parallelKeyForBore', () => {
  it.each(PUBLISHED)('bores over %d up to %d mm take %d × %d', (over, upTo, b, h, t1, t2) => {
    const expected = { width: b, height: h, shaftDepth: t1, hubDepth: t2 };
    expect(parallelKeyForBore(over + 0.01)).toMatchObject(expected);
    expect(parallelKeyForBore(upTo)).toMatchObject(expected);
  });

  it('leaves the keyways a little deeper together than the key is high', () => {
    // A key rests on the bottom of the shaft's keyway with clearance at the top: t1 + t2 > h.
    for (let bore = 6; bore <= 130; bore += 1) {
      const key = parallelKeyForBore(bore);
      if (!key) throw new Error(`a key for ${bore} mm is in the table`);
      const play = key.shaftDepth + key.hubDepth - key.height;
      expect(play).toBeGreaterThan(0.1);
      expect(play).toBeLessThan(0.5);
    }
  });

  it.each([5.9, 0, -3, 130.1, Number.NaN, Number.POSITIVE_INFINITY])('has none for %s mm', (bore) => {
    expect(parallelKeyForBore(bore)).toBeNull();
  });
});

describe('key length', () => {
  // Length ranges of DIN 6885-1 (seen): 2 × 2 from 6 to 20, 8 × 7 from 18 to 90, 14 × 9 from 36 to 160 mm.
  it.each([
    [8, 15, 14, true],
    [8, 5, 6, false],
    [8, 100, 20, true],
    [25, 20, 20, true],
    [25, 17, 18, false],
    [25, 200, 90, true],
    [50, 40, 40, true],
    [50, 30, 36, false],
    [50, 500, 160, true],
  ])('bore %d, hub %d mm takes %d mm', (bore, hub, length, fits) => {
    const key = parallelKeyForBore(bore);
    if (!key) throw new Error('the bore is in the table');
    expect(keyLengthForHub(key, hub)).toEqual({ length, fits });
  });

  it('counts the round ends of form A', () => {
    // A square with a half circle at each end: 20 × 6 plan, less the corners, times the height.
    const plan = 14 * 6 + Math.PI * 9;
    expect(keyVolume(6, 6, 20)).toBeCloseTo(plan * 6, 9);
  });
});
