import { describe, expect, it } from 'vitest';
import { fieldForPath } from './fieldNames';

describe('fieldForPath', () => {
  it.each([
    ['requirement.teeth.pinion.min', 'pinionMin'],
    ['ratio.target', 'ratioTarget'],
    ['requirement.modules.2', 'modules'],
    ['modules[0]', 'modules'],
    ['requirement.envelope', 'envelopeLength'],
    ['requirement.duty.inputSpeed', 'inputSpeed'],
    ['title', 'title'],
  ])('leads %s to its field', (path, field) => {
    expect(fieldForPath(path)).toBe(field);
  });

  it('knows no field for a path that is not on the form', () => {
    expect(fieldForPath('version')).toBeNull();
    expect(fieldForPath('')).toBeNull();
  });
});
