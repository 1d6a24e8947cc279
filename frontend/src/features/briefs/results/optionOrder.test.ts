import { describe, expect, it } from 'vitest';
import type { TrainOption } from '../../../api/types';
import { optionOf } from '../../../testing/options';
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
