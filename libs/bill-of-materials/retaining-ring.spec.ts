import { describe, expect, it } from 'vitest';
import { bearingBoreFor, isBearingBore, retainingRingBelow, retainingRingForShaft } from './index.js';

describe('retainingRingForShaft', () => {
  it.each([
    // DIN 471: shaft d1, thickness s (memory), groove diameter d2 (seen in dealers' tables), groove width m (memory).
    [3, 0.4, 2.8, 0.5],
    [6, 0.7, 5.7, 0.8],
    [8, 0.8, 7.6, 0.9],
    [10, 1, 9.6, 1.1],
    [11, 1, 10.5, 1.1],
    [15, 1, 14.3, 1.1],
    [17, 1, 16.2, 1.1],
    [20, 1.2, 19, 1.3],
    [25, 1.2, 23.9, 1.3],
    [30, 1.5, 28.6, 1.6],
    [35, 1.5, 33, 1.6],
    [40, 1.75, 37.5, 1.85],
    [45, 1.75, 42.5, 1.85],
    // All of these from memory of the standard.
    [50, 2, 47, 2.15],
    [60, 2, 57, 2.15],
    [80, 2.5, 76.5, 2.65],
  ])('shaft %d mm takes a ring %d thick in a groove of %d mm', (d1, s, d2, m) => {
    expect(retainingRingForShaft(d1)).toEqual({
      shaftDiameter: d1,
      thickness: s,
      grooveDiameter: d2,
      grooveWidth: m,
    });
  });

  it('goes by the nominal shaft size only: no size in between is rounded', () => {
    for (const diameter of [2, 12.5, 23, 27, 31, 33, 81, Number.NaN]) {
      expect(retainingRingForShaft(diameter)).toBeNull();
    }
    expect(retainingRingBelow(23)?.shaftDiameter).toBe(22);
    expect(retainingRingBelow(3)).toBeNull();
  });

  it('cuts deeper the larger the shaft, and never more than a fifteenth on each side beyond 5 mm', () => {
    let depth = 0;
    for (let d = 3; d <= 80; d += 1) {
      const ring = retainingRingForShaft(d);
      if (!ring) continue;
      const cut = (ring.shaftDiameter - ring.grooveDiameter) / 2;
      expect(cut).toBeGreaterThanOrEqual(depth - 1e-9);
      expect(cut).toBeLessThan(d / 15);
      expect(ring.grooveWidth).toBeGreaterThan(ring.thickness);
      depth = cut;
    }
  });
});

describe('bearing bores', () => {
  it('gives the next bore of ISO 15 (memory)', () => {
    expect([10.5, 12, 13, 16, 18, 21].map(bearingBoreFor)).toEqual([12, 12, 15, 17, 20, 25]);
    expect(bearingBoreFor(201)).toBeNull();
    expect(isBearingBore(17)).toBe(true);
    expect(isBearingBore(18)).toBe(false);
  });
});
