import { expect, it } from 'vitest';
import { optionOf } from '../../../testing/options';
import { orderWords, stageOrders } from './stageOrders';

const first = optionOf([
  [18, 56],
  [18, 62],
]);
const turned = optionOf([
  [18, 62],
  [18, 56],
]);
const alone = optionOf([[20, 75]]);

it('counts the orders of the same stages in the order of the list', () => {
  const orders = stageOrders([first, alone, turned]);
  expect(orders.get(first.key)).toEqual({ place: 1, of: 2 });
  expect(orders.get(turned.key)).toEqual({ place: 2, of: 2 });
  expect(orders.has(alone.key)).toBe(false);
  expect(orderWords({ place: 2, of: 2 })).toBe('order 2 of 2');
});

it('holds the same teeth in another module, or with pinions swapped, to be other stages', () => {
  const coarser = {
    ...turned,
    key: 'coarser',
    stages: turned.stages.map((stage) => ({ ...stage, module: 2 })),
  };
  const swapped = optionOf([
    [18, 64],
    [20, 56],
  ]);
  const other = optionOf([
    [20, 64],
    [18, 56],
  ]);
  expect(stageOrders([first, coarser, swapped, other]).size).toBe(0);
});
