import { describe, expect, it } from 'vitest';
import { optionOf } from '../../testing/options';
import { comparedFigures } from './figures';

const two = optionOf(
  [
    [18, 110],
    [19, 116],
  ],
  { mass: 1.24, errorPercent: -0.507, contactRatio: 1.578, backlashArcmin: 11 },
);
const three = optionOf(
  [
    [17, 57],
    [18, 58],
    [18, 62],
  ],
  { mass: 0.84, errorPercent: 0.172, contactRatio: 1.528, backlashArcmin: 17 },
);

const better = (label: string, options = [two, three]) =>
  comparedFigures(options)
    .find((figure) => figure.label === label)
    ?.cells.map((cell) => cell.better);

describe('comparedFigures', () => {
  it.each([
    ['Mass of the gears', [false, true]],
    ['Ratio error', [false, true]],
    ['Least contact ratio', [true, false]],
    ['Backlash at the output', [true, false]],
    ['Stages', [true, false]],
    ['Largest wheel', [false, true]],
  ])('marks the better %s', (label, expected) => {
    expect(better(label)).toEqual(expected);
  });

  it('takes no side where it is a matter of choice', () => {
    expect(better('Teeth')).toEqual([false, false]);
    expect(better('Ratio')).toEqual([false, false]);
  });

  it('marks nobody when all read the same, even where digits behind the point differ', () => {
    const twin = { ...two, mass: two.mass + 1e-6 };
    expect(better('Mass of the gears', [two, twin])).toEqual([false, false]);
    expect(comparedFigures([two, twin]).every(({ same }) => same)).toBe(true);
  });

  it('marks all that share the best figure', () => {
    expect(better('Mass of the gears', [three, two, { ...three, mass: three.mass + 1e-6 }])).toEqual([
      true,
      false,
      true,
    ]);
  });

  it('marks nothing with one option alone', () => {
    expect(
      comparedFigures([two])
        .flatMap(({ cells }) => cells)
        .some((cell) => cell.better),
    ).toBe(false);
  });

  it('gives the error its sign and a real minus', () => {
    const error = comparedFigures([two, three]).find(({ label }) => label === 'Ratio error');
    expect(error?.cells.map(({ words }) => words)).toEqual(['\u22120.507', '+0.172']);
  });
});
