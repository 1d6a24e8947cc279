import { describe, expect, it } from 'vitest';
import { type AdoptedGear, type AdoptedSpec } from './adopted-spec.js';
import { type StockGear, trainFigures } from './train-figures.js';

const gear = (teeth: number, partNumber: string | null = null): AdoptedGear => {
  return { teeth, profileShift: 0, faceWidth: 20, partNumber };
};

/** Module 2, 20/40: a = m (z1 + z2)/2 = 60 mm, roots 35 mm and 75 mm. */
const spec = (changes: Partial<AdoptedSpec> = {}): AdoptedSpec => ({
  pressureAngleDeg: 20,
  helixAngleDeg: 0,
  leastContactRatio: 1.2,
  stages: [{ module: 2, centreDistance: 60, pinion: gear(20, 'KW-00001'), wheel: gear(40) }],
  shafts: [
    { diameter: 12, basis: 'bore' },
    { diameter: 20, basis: 'typed' },
  ],
  ...changes,
});

const stock = (changes: Partial<StockGear> = {}) =>
  new Map([['KW-00001', { number: 'KW-00001', bore: 12, standing: 'cleared' as const, ...changes }]]);

const codes = (train: AdoptedSpec, library = stock()) =>
  trainFigures(train, library)
    .findings.filter(({ code }) => /^(part|bore|shaft)-/.test(code))
    .map(({ code, severity }) => [code, severity]);

describe('what shafts and chosen parts give rise to', () => {
  it('is nothing when the part is cleared and its bore is the shaft', () => {
    expect(codes(spec())).toEqual([]);
  });

  it('names a part that is gone, a draft, or withdrawn', () => {
    expect(codes(spec(), new Map())).toEqual([['part-not-cleared', 'marginal']]);
    expect(codes(spec(), stock({ standing: 'draft' }))).toEqual([['part-not-cleared', 'marginal']]);
    expect(codes(spec(), stock({ standing: 'withdrawn' }))).toEqual([['part-not-cleared', 'marginal']]);
  });

  it('names a bore that is not the shaft', () => {
    expect(codes(spec(), stock({ bore: 10 }))).toEqual([['bore-differs', 'marginal']]);
  });

  it('names a shaft whose diameter is only the starting figure, and one that reaches into the teeth', () => {
    const shafts: AdoptedSpec['shafts'] = [
      { diameter: 12, basis: 'start' },
      { diameter: 76, basis: 'typed' },
    ];
    expect(codes(spec({ shafts }))).toEqual([
      ['shaft-not-sized', 'note'],
      ['shaft-over-root', 'fail'],
    ]);
  });

  it('holds every shaft against its torque, where one is known', () => {
    // d ≥ (16·1000·K_A T/(π τ))^⅓ with K_A 1, T 45 N·m, τ 25 MPa: 20.93 mm, so 21 mm at the output.
    const checks = trainFigures(spec({ outputTorque: 45, applicationFactor: 1 }), stock()).checks;
    const shafts = checks.filter(({ code }) => code === 'shaft-diameter');
    expect(shafts.at(-1)).toMatchObject({ value: 20, limit: 21, verdict: 'fails' });
    // The input carries 45/2/0.98 N·m: 16.72 mm, so 17 mm.
    expect(shafts[0]).toMatchObject({ value: 12, limit: 17, verdict: 'fails' });
    expect(trainFigures(spec(), stock()).checks.some(({ code }) => code === 'shaft-diameter')).toBe(false);
  });
});
