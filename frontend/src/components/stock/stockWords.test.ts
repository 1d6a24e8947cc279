import { describe, expect, it } from 'vitest';
import { newMovement, newStockItem } from '../../testing/stock';
import { bookedWords, changeWords, placesWords, quantityWords, shortWords } from './stockWords';
import { levelAt, movementOf } from './movementForm';

describe('words about stock', () => {
  it.each([
    [3, '+3'],
    [-2, '−2'],
    [0, '±0'],
    [0.125, '+0.125'],
    [-1.5, '−1.5'],
  ])('a change of %d reads %s', (change, words) => expect(changeWords(change)).toBe(words));

  it('parts thousands and keeps millilitres', () => {
    expect(quantityWords(12500, 'pcs')).toBe('12,500 pcs');
    expect(quantityWords(0.125, 'l')).toBe('0.125 l');
  });

  it('names where it belongs, though none is left there', () => {
    const level = { lastMovementId: 1, countedAt: null };
    const empty = { ...level, place: 'Rack A', quantity: 0 };
    const filled = { ...level, place: 'Rack B', quantity: 3 };
    expect(placesWords(newStockItem({ places: [empty, filled] }))).toBe('Rack B: 3');
    expect(placesWords(newStockItem({ places: [empty] }))).toBe('Rack A: 0');
    expect(placesWords(newStockItem({ places: [] }))).toBe('–');
  });

  it('says what is missing only where something is', () => {
    expect(shortWords(newStockItem({ quantity: 3, leastStock: 5, low: true }))).toBe('2 pcs');
    expect(shortWords(newStockItem({ quantity: 5, leastStock: 5, low: false }))).toBe('–');
  });

  it('says what was booked and what is there now', () => {
    const issued = newMovement({ kind: 'issued', change: -3, counted: null, after: 9 });
    expect(bookedWords(issued)).toBe('KW-00017: 3 pcs issued at Rack A; 9 pcs there now.');
    expect(bookedWords(newMovement())).toBe('KW-00017: 39 pcs counted at Rack A.');
  });
});

describe('the request of a movement', () => {
  const form = { number: ' kw-00017 ', quantity: '39', place: ' rack  a ', reason: ' ' };

  it('says what a count saw: the latest movement there, 0 where there is none', () => {
    const item = newStockItem();
    expect(movementOf({ ...form, kind: 'counted' }, item, 'key')).toMatchObject({ seenMovementId: 7 });
    const elsewhere = movementOf({ ...form, kind: 'counted', place: 'Rack B' }, item, 'key');
    expect(elsewhere).toMatchObject({ seenMovementId: 0, place: 'Rack B', number: 'kw-00017' });
    expect(levelAt(item, 'Rack B')).toBeNull();
  });

  it('books a delivery whatever happened meanwhile', () => {
    const sent = movementOf({ ...form, kind: 'received' }, newStockItem(), 'key');
    expect(sent).not.toHaveProperty('seenMovementId');
  });
});
