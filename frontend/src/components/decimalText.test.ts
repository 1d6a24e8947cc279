import { describe, expect, it } from 'vitest';
import { readDecimal } from './decimalText';

describe('readDecimal', () => {
  it.each([
    ['37.5', '37.5', 37.5],
    ['37,5', '37.5', 37.5],
    [' 1 400 ', '1400', 1400],
    ['.5', '0.5', 0.5],
    ['7.', '7', 7],
    ['+3', '3', 3],
    ['\u22120,25', '-0.25', -0.25],
    ['0,125', '0.125', 0.125],
    ['6.931000', '6.931000', 6.931],
  ])('reads “%s” as %s', (typed, text, value) => {
    expect(readDecimal(typed)).toEqual({ kind: 'number', text, value });
  });

  it.each(['', '   '])('takes “%s” for blank', (typed) => {
    expect(readDecimal(typed)).toEqual({ kind: 'blank' });
  });

  it.each(['abc', '1.2.3', '1,2,3', '1,400.5', '1e9', 'NaN', 'Infinity', '--2', '9'.repeat(40)])(
    'does not read “%s”',
    (typed) => {
      expect(readDecimal(typed).kind).toBe('problem');
    },
  );

  it('refuses to guess whether a comma parts thousands', () => {
    const reading = readDecimal('1,400');
    expect(reading).toMatchObject({ kind: 'problem' });
    expect(reading.kind === 'problem' && reading.message).toContain('1400');
  });
});
