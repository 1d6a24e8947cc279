import { describe, expect, it } from 'vitest';
import { ProblemError } from '../common/errors.js';
import { newRequirement } from '../testing/new-brief.js';
import { checkRequirement, findsTheSame, optionRequestOf } from './requirement.js';

function fieldsRefused(input: object): string[] {
  try {
    checkRequirement(input);
  } catch (error) {
    if (error instanceof ProblemError && error.statusCode === 400) {
      return error.errors?.map((issue) => issue.field) ?? [];
    }
    throw error;
  }
  return [];
}

describe('a requirement', () => {
  it('is kept with the target as text and every default filled in', () => {
    const kept = checkRequirement(newRequirement({ ratio: { target: 37.5, tolerancePercent: 1 } }));
    expect(kept.ratio).toEqual({ target: '37.5', tolerancePercent: '1' });
    expect(kept).toMatchObject({ pressureAngleDeg: 20, shiftPolicy: 'none', leastContactRatio: 1.2 });
  });

  it('keeps what was written of a long decimal', () => {
    const target = '6.93100000000000000000000000001';
    expect(
      checkRequirement(newRequirement({ ratio: { target, tolerancePercent: '0.01' } })).ratio.target,
    ).toBe(target);
  });

  it('keeps the duty apart from what is searched', () => {
    const kept = checkRequirement(newRequirement({ duty: { inputSpeed: 1400, outputTorque: 45 } }));
    expect(kept.duty).toEqual({ inputSpeed: 1400, outputTorque: 45 });
    expect(optionRequestOf(kept)).not.toHaveProperty('duty');
  });

  it('keeps the build quantity apart from what is searched, and an emptied one not at all', () => {
    const kept = checkRequirement(newRequirement({ buildQuantity: 25 }));
    expect(kept.buildQuantity).toBe(25);
    expect(optionRequestOf(kept)).not.toHaveProperty('buildQuantity');
    expect(checkRequirement({ ...newRequirement(), buildQuantity: null })).not.toHaveProperty(
      'buildQuantity',
    );
  });

  it('finds the same whatever the build quantity, and nothing else may differ', () => {
    const kept = checkRequirement(newRequirement({ buildQuantity: 25 }));
    expect(findsTheSame(kept, checkRequirement(newRequirement()))).toBe(true);
    expect(findsTheSame(kept, checkRequirement(newRequirement({ modules: [2] })))).toBe(false);
    expect(findsTheSame(kept, checkRequirement(newRequirement({ duty: { inputSpeed: 1400 } })))).toBe(false);
  });

  it('drops fields of the duty that a form has emptied', () => {
    const emptied = { inputSpeed: 1400, outputTorque: null };
    expect(checkRequirement({ ...newRequirement(), duty: emptied }).duty).toEqual({ inputSpeed: 1400 });
  });

  it.each([
    ['ratio 0', { ratio: { target: '0', tolerancePercent: '1' } }, 'ratio.target'],
    ['a negative ratio', { ratio: { target: '-4', tolerancePercent: '1' } }, 'ratio.target'],
    ['a ratio of NaN', { ratio: { target: 'NaN', tolerancePercent: '1' } }, 'ratio.target'],
    ['a ratio of 1e9', { ratio: { target: '1e9', tolerancePercent: '1' } }, 'ratio.target'],
    ['a negative tolerance', { ratio: { target: '12', tolerancePercent: '-1' } }, 'ratio.tolerancePercent'],
    [
      'the pinion range reversed',
      { teeth: { pinion: { min: 24, max: 17 }, wheel: { min: 20, max: 96 } } },
      'teeth.pinion.max',
    ],
    ['no modules', { modules: [] }, 'modules'],
    ['a load, which is not rated yet', { load: { outputTorque: 4 } }, 'load'],
    ['another arrangement', { arrangement: 'folded' }, 'arrangement'],
    ['a speed of 0', { duty: { inputSpeed: 0 } }, 'duty.inputSpeed'],
    ['a torque beyond all gearboxes', { duty: { outputTorque: 2e6 } }, 'duty.outputTorque'],
    ['an application factor below 1', { duty: { applicationFactor: 0.5 } }, 'duty.applicationFactor'],
    ['a torque in words', { duty: { outputTorque: 'much' } }, 'duty.outputTorque'],
    ['an unknown duty', { duty: { temper: 3 } }, 'duty.temper'],
    ['a build quantity of 0', { buildQuantity: 0 }, 'buildQuantity'],
    ['a build quantity of one and a half', { buildQuantity: 1.5 }, 'buildQuantity'],
    ['a build quantity of 1e9', { buildQuantity: 1e9 }, 'buildQuantity'],
    ['a build quantity in words', { buildQuantity: 'many' }, 'buildQuantity'],
    ['a duty that is a list', { duty: [] }, 'duty'],
  ])('refuses %s', (_, changes, field) => {
    expect(fieldsRefused({ ...newRequirement(), ...changes })).toEqual([`requirement.${field}`]);
  });

  it('names every field at fault at once', () => {
    const bad = { ...newRequirement({ modules: [] }), objective: 'beauty', duty: { inputSpeed: -1 } };
    expect(fieldsRefused(bad).sort()).toEqual([
      'requirement.duty.inputSpeed',
      'requirement.modules',
      'requirement.objective',
    ]);
  });
});
