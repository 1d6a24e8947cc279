import { describe, expect, it } from 'vitest';
import { InputError, type FieldIssue } from '../units/index.js';
import { searchOptions, validateOptionRequest } from './index.js';
import { winchRequest } from './testing/sample-requests.js';

function issuesOf(change: Record<string, unknown>): FieldIssue[] {
  try {
    validateOptionRequest({ ...winchRequest(), ...change });
  } catch (error) {
    if (error instanceof InputError) return error.errors;
    throw error;
  }
  return [];
}

const teeth = (pinion: unknown, wheel: unknown = { min: 12, max: 150 }) => ({ teeth: { pinion, wheel } });
const ratio = (target: unknown, tolerancePercent: unknown = 1) => ({ ratio: { target, tolerancePercent } });

describe('bad input', () => {
  it.each<[string, Record<string, unknown>, string]>([
    ['ratio 0', ratio(0), 'ratio.target'],
    ['ratio below 0', ratio('-37.5'), 'ratio.target'],
    ['ratio NaN', ratio(NaN), 'ratio.target'],
    ['ratio 1e9', ratio(1e9), 'ratio.target'],
    ['ratio as a fraction', ratio('1/6.931'), 'ratio.target'],
    ['ratio of 100,000 characters', ratio('3'.repeat(100_000)), 'ratio.target'],
    ['no tolerance', { ratio: { target: '37.5' } }, 'ratio.tolerancePercent'],
    ['tolerance below 0', ratio('37.5', -0.1), 'ratio.tolerancePercent'],
    ['tolerance above 50 %', ratio('37.5', '50.0001'), 'ratio.tolerancePercent'],
    ['pinion range reversed', teeth({ min: 40, max: 12 }), 'teeth.pinion.max'],
    ['3 teeth', teeth({ min: 3, max: 12 }), 'teeth.pinion.min'],
    ['half a tooth', teeth({ min: 12, max: 20.5 }), 'teeth.pinion.max'],
    ['far too many teeth', teeth({ min: 12, max: 40 }, { min: 12, max: 1e6 }), 'teeth.wheel.max'],
    ['no modules', { modules: [] }, 'modules'],
    ['modules missing', { modules: undefined }, 'modules'],
    ['module 0', { modules: [1, 0] }, 'modules.1'],
    ['31 modules', { modules: new Array(31).fill(1) }, 'modules'],
    ['no stage', { stages: { min: 0, max: 2 } }, 'stages.min'],
    ['four stages', { stages: { min: 1, max: 4 } }, 'stages.max'],
    ['501 options', { limit: 501 }, 'limit'],
    ['an angle no cutter has', { pressureAngleDeg: 21 }, 'pressureAngleDeg'],
    ['helix 50°', { helixAngleDeg: 50 }, 'helixAngleDeg'],
    ['negative allowance', { centreDistanceAllowance: -0.1 }, 'centreDistanceAllowance'],
    ['stage ratios reversed', { stageRatio: { min: 4, max: 2 } }, 'stageRatio.max'],
    ['a box without length', { envelope: { length: 0, width: 1, height: 1 } }, 'envelope.length'],
    ['an objective of later', { objective: 'cost' }, 'objective'],
    ['a policy of later', { shiftPolicy: 'best-contact' }, 'shiftPolicy'],
    ['a load', { load: { outputTorque: 45 } }, 'load'],
    ['a grade', { centreDistanceGrade: 7 }, 'centreDistanceGrade'],
    ['folded', { arrangement: 'folded' }, 'arrangement'],
    ['stock only', { source: 'stock-only' }, 'source'],
    ['text of 100,000 characters', { direction: 'x'.repeat(100_000) }, 'direction'],
  ])('is refused by the name of its field: %s', (_name, change, field) => {
    const issues = issuesOf(change);
    expect(issues.map((issue) => issue.field)).toEqual([field]);
    expect(issues[0]?.message).toMatch(/^\p{Lu}.{10,}\.$/u);
    expect(JSON.stringify(issues).length).toBeLessThan(400);
  });

  it('lists every field at fault at once', () => {
    const fields = issuesOf({ ...ratio(0, 99), modules: [], limit: 0 }).map((issue) => issue.field);
    expect(fields).toEqual(['ratio.target', 'ratio.tolerancePercent', 'modules', 'limit']);
  });

  it.each([[null], [undefined], ['37.5'], [[]], [{}]])('is refused whole: %j', (input) => {
    expect(() => validateOptionRequest(input)).toThrow(InputError);
  });
});

describe('good input', () => {
  it('takes the defaults of the calculation endpoints', () => {
    expect(validateOptionRequest(winchRequest())).toMatchObject({
      pressureAngleDeg: 20,
      helixAngleDeg: 0,
      faceWidthFactor: 10,
      shiftPolicy: 'none',
      leastContactRatio: 1.2,
      centreDistanceAllowance: 0,
      undercut: 'allow',
      stageRatio: { min: 1 },
      arrangement: 'in-line',
      direction: 'any',
      source: 'any',
      limit: 50,
    });
  });

  it('stays good when validated again', () => {
    const checked = validateOptionRequest(
      winchRequest({ envelope: { length: 200 }, stageRatio: { max: '6' } }),
    );
    expect(validateOptionRequest(checked)).toEqual(checked);
  });

  it('takes nulls as left out, and a tolerance of 0 as an exact ratio', () => {
    const request = { ...winchRequest(), ...ratio('37.5', 0), load: null, envelope: null, stageRatio: null };
    expect(validateOptionRequest(request).envelope).toBeUndefined();
    const { options } = searchOptions(winchRequest(ratio('37.5', '0') as never));
    expect(options.length).toBeGreaterThan(0);
    expect(
      options.every(
        (option) => BigInt(option.ratio.numerator) * 2n === BigInt(option.ratio.denominator) * 75n,
      ),
    ).toBe(true);
  });

  it('holds the tolerance to the last digit, limits included', () => {
    const one = (target: string, tolerancePercent: string) =>
      searchOptions({
        ...winchRequest({
          stages: { min: 1, max: 1 },
          teeth: { pinion: { min: 20, max: 20 }, wheel: { min: 33, max: 33 } },
        }),
        ratio: { target, tolerancePercent },
      }).options.length;
    // 33/20 = 1.65 is exactly 10 % above 1.5.
    expect(one('1.5', '10')).toBe(1);
    expect(one('1.5', '9.99999999999999999999')).toBe(0);
    expect(one('1.50000000000000000001', '10')).toBe(1);
    expect(one('1.49999999999999999999', '10')).toBe(0);
  });
});
