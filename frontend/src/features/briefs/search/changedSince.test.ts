import { expect, it } from 'vitest';
import type { Requirement } from '../../../api/types';
import { NEW_BRIEF } from '../form/briefForm';
import { requirementFromForm } from '../form/requirementFromForm';
import { changedSince } from './changedSince';

const searched = requirementFromForm({ ...NEW_BRIEF, title: 'T', ratioTarget: '37.5' })
  .requirement as Requirement;

it('names the searched fields that changed since, and only those', () => {
  const now: Requirement = {
    ...searched,
    ratio: { target: '40', tolerancePercent: '1.0' },
    modules: [1, 2],
    duty: { applicationFactor: 2, inputSpeed: 900 },
  };
  expect(changedSince(searched, now)).toEqual(['Ratio', 'Modules']);
  expect(changedSince(searched, searched)).toEqual([]);
});
