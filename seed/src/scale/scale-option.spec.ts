import { describe, expect, it } from 'vitest';
import { scaleOption, ScaleOptionError } from './scale-option.js';

describe('the option --scale', () => {
  it.each([
    [[], null],
    [['--scale', '1'], 1],
    [['--scale', '250000'], 250_000],
    [['--scale=1000000'], 1_000_000],
  ])('reads %j as %s', (args, expected) => {
    expect(scaleOption(args)).toBe(expected);
  });

  it.each([
    [['--scale']],
    [['--scale=']],
    [['--scale', '0']],
    [['--scale', '-5']],
    [['--scale', '1000001']],
    [['--scale', '1e5']],
    [['--scale', '2.5']],
    [['--scale', 'many']],
    [['--scale', '5', '6']],
    [['--size', '5']],
  ])('refuses %j in a plain sentence', (args) => {
    expect(() => scaleOption(args)).toThrow(ScaleOptionError);
    expect(() => scaleOption(args)).toThrow(/--scale .*\.$/);
  });
});
