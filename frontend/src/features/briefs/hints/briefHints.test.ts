import { describe, expect, it } from 'vitest';
import type { Requirement } from '../../../api/types';
import { NEW_BRIEF, type BriefForm } from '../form/briefForm';
import { requirementFromForm } from '../form/requirementFromForm';
import { briefHints } from './briefHints';

const WINCH: BriefForm = {
  ...NEW_BRIEF,
  title: 'Winch',
  ratioTarget: '37.5',
  pinionMin: '20',
  pinionMax: '24',
  wheelMin: '40',
  wheelMax: '150',
  stagesMin: '2',
};

function hintsFor(changes: Partial<BriefForm>) {
  const { requirement } = requirementFromForm({ ...WINCH, ...changes });
  return briefHints(requirement as Requirement);
}

const messages = (changes: Partial<BriefForm>) => hintsFor(changes).map(({ message }) => message);

describe('briefHints', () => {
  it('has nothing to say about a brief that can be met', () => {
    expect(hintsFor({})).toEqual([]);
  });

  it('names the wheel that one stage would need', () => {
    // 12 × 37.5 = 450
    const hints = hintsFor({ stagesMin: '1', stagesMax: '1', pinionMin: '12' });
    expect(hints[0]).toEqual({
      field: 'wheelMax',
      kind: 'crossed',
      message:
        'Ratio 37.5 in one stage needs a wheel of 450 teeth with a 12-tooth pinion; wheel teeth end at 150.',
    });
  });

  it('only remarks on a stage count that fails while another can serve', () => {
    const hints = hintsFor({ stagesMin: '1', stagesMax: '2' });
    expect(hints.map(({ field, kind }) => [field, kind])).toEqual([['wheelMax', 'note']]);
  });

  it('holds the stage ratio limit against the ratio: 5 × 5 is less than 37.5', () => {
    const [hint] = hintsFor({ stagesMax: '2', stageRatioMax: '5' });
    expect(hint).toMatchObject({ field: 'stageRatioMax', kind: 'crossed' });
    expect(hint?.message).toContain('the stage ratio ends at 5');
  });

  it('tells a ratio that is too small for the stages', () => {
    // The least of three stages is (40/24)³ = 4.63.
    const [hint] = hintsFor({ ratioTarget: '3', stagesMin: '3', stagesMax: '3' });
    expect(hint).toMatchObject({ field: 'wheelMin', kind: 'crossed' });
  });

  it('puts undercut at the full-depth 20° rack limit of 17.1 teeth, so 17 are undercut and 18 are not', () => {
    // Published: 17.0973 teeth (Shigley, Norton, Mott; from memory), see the project's check values.
    const refused = messages({ pinionMin: '17', shiftPolicy: 'none', undercut: 'refuse' });
    expect(refused).toEqual([
      'Pinion from 17 teeth: undercut below 18 (20°), and refused, so pinions begin at 18.',
    ]);
    expect(messages({ pinionMin: '18', shiftPolicy: 'none', undercut: 'refuse' })).toEqual([]);
  });

  it('finds no pinion left when undercut is refused for all of them', () => {
    const [hint] = hintsFor({ pinionMin: '12', pinionMax: '16', shiftPolicy: 'none', undercut: 'refuse' });
    expect(hint).toMatchObject({ field: 'pinionMin', kind: 'crossed' });
    expect(hint?.message).toContain('no pinion up to 16 is left');
  });

  it('says what an allowance leaves of the contact ratio', () => {
    const hints = hintsFor({ centreDistanceAllowance: '1,2' });
    const hint = hints.find(({ field }) => field === 'centreDistanceAllowance');
    expect(hint?.kind).toBe('crossed');
    expect(hint?.message).toMatch(
      /^Allowance 1\.2 m leaves a contact ratio of [01]\.\d{3} even between 24 and 150 teeth/,
    );
  });

  it('knows that a spur pair at 20° never reaches a contact ratio of 2', () => {
    // The limit for infinite teeth is 1.98 (textbook limit value; from memory).
    const hint = hintsFor({ leastContactRatio: '2' }).find(({ field }) => field === 'leastContactRatio');
    expect(hint?.kind).toBe('crossed');
  });

  it('counts the stages that turn the output the wished way', () => {
    expect(
      hintsFor({ direction: 'same', stagesMin: '1', stagesMax: '1', ratioTarget: '5' })[0],
    ).toMatchObject({
      field: 'direction',
      kind: 'crossed',
    });
    expect(messages({ direction: 'opposite' })).toEqual([
      'An output turning against the input needs an odd number of stages, so only three stages can serve.',
    ]);
  });

  it('refuses a box lower than a wheel that every train needs', () => {
    // Two or three stages of 37.5: 20 teeth × ³√(37.5 × 0.99) = 66.7, so 67 teeth, tip diameter 69 mm at m 1.
    const hint = hintsFor({ envelopeHeight: '60', envelopeWall: '4' })[0];
    expect(hint).toMatchObject({ field: 'envelopeHeight', kind: 'crossed' });
    expect(hint?.message).toBe('Height 60 mm: a wheel of 67 teeth at m 1 and two walls of 4 mm needs 77 mm.');
  });

  it('refuses a box narrower than its face widths', () => {
    const hint = hintsFor({ envelopeWidth: '18' })[0];
    expect(hint).toMatchObject({ field: 'envelopeWidth', kind: 'crossed' });
  });

  it('remarks on a module outside ISO 54 and on several modules', () => {
    expect(messages({ modules: [1, 1.3] })).toEqual([
      'Module 1.3 mm is not in ISO 54; expect a special cutter.',
      'Strength is not rated yet, so every stage takes the smallest module, m 1.',
    ]);
  });

  it.each([
    ['ratioTarget', '0'],
    ['ratioTarget', '-5'],
    ['pinionMin', '30'],
    ['stagesMax', '1'],
    ['helixAngleDeg', '60'],
  ] as const)('passes on what the planner refuses about %s = %s, at its field', (field, value) => {
    const hints = hintsFor({ [field]: value });
    expect(hints.length).toBeGreaterThan(0);
    expect(hints.every(({ kind }) => kind === 'crossed')).toBe(true);
  });
});
