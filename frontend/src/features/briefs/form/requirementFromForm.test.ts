import { describe, expect, it } from 'vitest';
import { formFromBrief, NEW_BRIEF, type BriefForm } from './briefForm';
import { requirementFromForm } from './requirementFromForm';

const filled: BriefForm = {
  ...NEW_BRIEF,
  title: 'Kelp-line winch',
  ratioTarget: '37,5',
  tolerancePercent: '0,5',
};

function requirementOf(form: BriefForm) {
  const reading = requirementFromForm(form);
  if (reading.requirement === null) throw new Error(reading.issues.map(({ message }) => message).join(' '));
  return reading.requirement;
}

const issuesOf = (form: BriefForm) => requirementFromForm(form).issues;

describe('requirementFromForm', () => {
  it('reads a decimal comma and keeps every digit of the ratio as text', () => {
    const { ratio } = requirementOf({ ...filled, ratioTarget: ' 6,931000 ' });
    expect(ratio).toEqual({ target: '6.931000', tolerancePercent: '0.5' });
  });

  it('leaves out what was left blank: no box, no upper stage ratio, no speed', () => {
    const requirement = requirementOf({ ...filled, stageRatioMin: '' });
    expect(requirement.envelope).toBeUndefined();
    expect(requirement.stageRatio).toEqual({ min: '1' });
    expect(requirement.duty).toEqual({ applicationFactor: 1.25 });
    expect(requirement).not.toHaveProperty('buildQuantity');
  });

  it('limits only the sides of the box that were given', () => {
    const { envelope } = requirementOf({ ...filled, envelopeHeight: '90', envelopeWall: '4,5' });
    expect(envelope).toEqual({ height: 90, wall: 4.5 });
  });

  it('names every field that cannot be read, and invents nothing in its place', () => {
    const issues = issuesOf({ ...filled, ratioTarget: 'abc', pinionMin: '', stagesMax: '2.5', modules: [] });
    expect(issues.map(({ field }) => field).sort()).toEqual([
      'modules',
      'pinionMin',
      'ratioTarget',
      'stagesMax',
    ]);
    expect(issues.find(({ field }) => field === 'pinionMin')?.message).toContain('missing');
    expect(issues.find(({ field }) => field === 'stagesMax')?.message).toContain('whole');
  });

  it('refuses a comma that can be read two ways rather than guess', () => {
    const [issue] = issuesOf({ ...filled, inputSpeed: '1,400' });
    expect(issue?.field).toBe('inputSpeed');
    expect(issue?.message).toMatch(/1400.*1\.4/);
  });

  it('takes only whole trains as a build quantity, and says a bad one once', () => {
    expect(requirementOf({ ...filled, buildQuantity: '25' }).buildQuantity).toBe(25);
    const issues = issuesOf({ ...filled, buildQuantity: '2.5' });
    expect(issues).toEqual([{ field: 'buildQuantity', message: 'Build quantity must be a whole number.' }]);
    expect(issuesOf({ ...filled, buildQuantity: 'some' }).map(({ field }) => field)).toEqual([
      'buildQuantity',
    ]);
  });

  it('asks for a title', () => {
    expect(issuesOf({ ...filled, title: '   ' }).map(({ field }) => field)).toEqual(['title']);
  });

  it('gives back the same form from what it made', () => {
    const form: BriefForm = {
      ...filled,
      ratioTarget: '37.5',
      tolerancePercent: '0.5',
      modules: [1, 1.25],
      stageRatioMax: '8',
      envelopeLength: '220',
      envelopeWidth: '90',
      envelopeHeight: '140',
      envelopeWall: '6',
      direction: 'same',
      shiftPolicy: 'none',
      inputSpeed: '1400',
      outputTorque: '45',
      applicationFactor: '1.5',
      buildQuantity: '25',
      note: 'For the raft.',
    };
    const brief = { title: form.title, note: form.note, requirement: requirementOf(form) };
    expect(formFromBrief(brief)).toEqual(form);
  });
});
