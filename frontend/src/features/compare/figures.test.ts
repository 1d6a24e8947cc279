import { describe, expect, it } from 'vitest';
import { optionOf } from '../../testing/options';
import { newSupply } from '../../testing/supply';
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

describe('cost and stock side by side', () => {
  const EUR = (minor: number) => [{ currency: 'EUR', minor }];
  const figure = (label: RegExp, a: Parameters<typeof newSupply>[0], b: Parameters<typeof newSupply>[0]) => {
    const byOption = new Map([
      [two.key, newSupply(a)],
      [three.key, newSupply(b)],
    ]);
    return comparedFigures([two, three], { quantity: 25, byOption }).find((each) => label.test(each.label));
  };

  it('marks the lower of two whole sums', () => {
    const cost = figure(/^Cost of the gears for 25/, { costs: EUR(41_250) }, { costs: EUR(40_000) });
    expect(cost?.cells).toEqual([
      { words: '412.50 EUR', better: false },
      { words: '400.00 EUR', better: true },
    ]);
  });

  it('marks nothing where one sum is only a part, or in another currency', () => {
    const part = figure(/^Cost/, { costs: EUR(41_250) }, { costs: EUR(400), priced: 1, unpriced: 3 });
    expect(part?.cells.map(({ better: marked }) => marked)).toEqual([false, false]);
    expect(part?.cells[1]?.words).toBe('4.00 EUR, 1 of 4 priced');
    const other = figure(/^Cost/, { costs: EUR(41_250) }, { costs: [{ currency: 'USD', minor: 400 }] });
    expect(other?.cells.map(({ better: marked }) => marked)).toEqual([false, false]);
  });

  it('says how much lies on the shelf', () => {
    const stock = figure(/shelf/, { gears: 4, onShelf: 4 }, { gears: 6, onShelf: 4, toMake: 1 });
    expect(stock?.cells).toEqual([
      { words: 'all 4 on the shelf', better: true },
      { words: '4 of 6 on the shelf, 1 to make', better: false },
    ]);
  });

  it('leaves the rows out without a build quantity', () => {
    expect(comparedFigures([two, three]).some(({ label }) => label.startsWith('Cost'))).toBe(false);
  });
});
