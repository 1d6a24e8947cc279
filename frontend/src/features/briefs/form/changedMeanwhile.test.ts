import { expect, it } from 'vitest';
import { NEW_BRIEF } from './briefForm';
import { changesMeanwhile } from './changedMeanwhile';

it('tells what was saved meanwhile, and where both changed the same field', () => {
  const began = { ...NEW_BRIEF, ratioTarget: '37.5', note: '' };
  const saved = { ...began, ratioTarget: '40', modules: [1, 1.25], pinionMin: '18' };
  const typed = { ...began, ratioTarget: '36', note: 'mine', pinionMin: '18' };
  const changes = changesMeanwhile(began, saved, typed);
  expect(changes.map(({ field, contested }) => [field, contested])).toEqual([
    ['ratioTarget', true],
    ['pinionMin', false],
    ['modules', false],
  ]);
  expect(changes[0]).toMatchObject({ label: 'Ratio', before: '37.5', theirs: '40', mine: '36' });
});
