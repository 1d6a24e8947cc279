import { describe, expect, it } from 'vitest';
import type { TrainOption } from '../../../api/types';
import { optionOf } from '../../../testing/options';
import { newSupply } from '../../../testing/supply';
import { nextOrder, orderedOptions, readOrder, readStages, writeOrder } from './optionOrder';

const keys = (options: readonly TrainOption[]) => options.map(({ key }) => key);
const heavy = optionOf(
  [
    [18, 110],
    [19, 116],
  ],
  { key: 'heavy', mass: 1.24, errorPercent: -0.5 },
);
const light = optionOf(
  [
    [17, 57],
    [18, 58],
    [18, 62],
  ],
  { key: 'light', mass: 0.84, errorPercent: 0.4 },
);
const exact = optionOf(
  [
    [20, 125],
    [20, 120],
  ],
  { key: 'exact', mass: 1.4, errorPercent: 0 },
);
const found = [heavy, light, exact];

describe('orderedOptions', () => {
  it('keeps the order of the search until one is chosen', () => {
    expect(keys(orderedOptions(found, [], null))).toEqual(['heavy', 'light', 'exact']);
  });

  it('sorts both ways and leaves the search as it was', () => {
    expect(keys(orderedOptions(found, [], { by: 'mass', down: false }))).toEqual(['light', 'heavy', 'exact']);
    expect(keys(orderedOptions(found, [], { by: 'mass', down: true }))).toEqual(['exact', 'heavy', 'light']);
    expect(keys(found)).toEqual(['heavy', 'light', 'exact']);
  });

  it('sorts the error by its size, whatever its sign', () => {
    expect(keys(orderedOptions(found, [], { by: 'error', down: false }))).toEqual([
      'exact',
      'light',
      'heavy',
    ]);
  });

  it('shows only the stage counts asked for', () => {
    expect(keys(orderedOptions(found, [3], null))).toEqual(['light']);
  });
});

describe('the order in the address', () => {
  it('reads back what it wrote and ignores nonsense', () => {
    for (const order of [null, { by: 'mass', down: true }, { by: 'error', down: false }] as const) {
      expect(readOrder(writeOrder(order))).toEqual(order);
    }
    expect(readOrder('price')).toBeNull();
    expect(readOrder('-toString')).toBeNull();
    expect(readStages('3,9,x,2')).toEqual([3, 2]);
  });

  it('turns on each press of a head and goes back to the search on the third', () => {
    const first = nextOrder(null, 'mass');
    const second = nextOrder(first, 'mass');
    expect([first, second, nextOrder(second, 'mass')]).toEqual([
      { by: 'mass', down: false },
      { by: 'mass', down: true },
      null,
    ]);
  });

  it('puts the greatest contact ratio first, because more is better', () => {
    expect(nextOrder(null, 'contact')).toEqual({ by: 'contact', down: true });
  });
});

describe('the order by cost and stock', () => {
  const EUR = (minor: number) => [{ currency: 'EUR', minor }];
  const supply = new Map([
    ['heavy', newSupply({ key: 'heavy', costs: EUR(90_000), onShelf: 4, gears: 4 })],
    // Cheap only because half of it is not priced.
    ['light', newSupply({ key: 'light', costs: EUR(10_000), unpriced: 2, onShelf: 3, gears: 6, toMake: 2 })],
    ['exact', newSupply({ key: 'exact', costs: EUR(70_000), onShelf: 2, gears: 4 })],
  ]);

  it('never puts a part of a sum before a whole one, whichever way', () => {
    expect(keys(orderedOptions(found, [], { by: 'cost', down: false }, supply))).toEqual([
      'exact',
      'heavy',
      'light',
    ]);
    expect(keys(orderedOptions(found, [], { by: 'cost', down: true }, supply))).toEqual([
      'heavy',
      'exact',
      'light',
    ]);
  });

  it('puts the best covered first, and of two alike the one with less to make', () => {
    expect(keys(orderedOptions(found, [], { by: 'stock', down: true }, supply))).toEqual([
      'heavy',
      'exact',
      'light',
    ]);
    expect(nextOrder(null, 'stock')).toEqual({ by: 'stock', down: true });
  });

  it('leaves them as found until the figures are there, and puts an option without any last', () => {
    expect(keys(orderedOptions(found, [], { by: 'cost', down: false }))).toEqual(['heavy', 'light', 'exact']);
    const some = new Map([...supply].filter(([key]) => key !== 'heavy'));
    expect(keys(orderedOptions(found, [], { by: 'cost', down: true }, some)).at(-1)).toBe('heavy');
  });

  it('is held in the address like any other', () => {
    expect(readOrder('-stock')).toEqual({ by: 'stock', down: true });
    expect(readOrder('cost')).toEqual({ by: 'cost', down: false });
    expect(readOrder('price')).toBeNull();
  });
});
