import { describe, expect, it } from 'vitest';
import { Problem } from '../../../api/problem';
import { newMovement, newStockItem } from '../../../testing/stock';
import { EMPTY_ROUND, unsettled, waiting, type Count } from './countTypes';
import { added, finished, isSurprising, refused, sentAgain, taken, without } from './roundChanges';

function newCount(given: Partial<Count> = {}): Count {
  return {
    key: 'one',
    number: 'KW-00017',
    description: 'Spur gear',
    unit: 'pcs',
    place: 'Rack A',
    counted: 39,
    expected: 40,
    seenMovementId: 7,
    at: '2026-11-02T08:00:00.000Z',
    state: 'waiting',
    refusal: null,
    change: null,
    now: null,
    ...given,
  };
}

const roundOf = (...counts: Count[]) => counts.reduce(added, { ...EMPTY_ROUND, place: 'Rack A' });

describe('a count that is far from the books', () => {
  it.each([
    // A fifth of 40 is 8.
    [48, 40, false],
    [49, 40, true],
    [32, 40, false],
    [31, 40, true],
    [0, 1, true],
    // Nothing there by the books, or not known: there is nothing to be far from.
    [12, 0, false],
    [12, null, false],
  ])('%d counted, %s by the books: %s', (counted, expected, surprising) => {
    expect(isSurprising(counted, expected)).toBe(surprising);
  });
});

describe('a round of counts', () => {
  it('keeps the order in which they were typed, and sends only what waits', () => {
    const round = roundOf(newCount(), newCount({ key: 'two', state: 'sent' }), newCount({ key: 'three' }));
    expect(waiting(round).map(({ key }) => key)).toEqual(['one', 'three']);
  });

  it('lets a later count of the same shelf have seen the one that was just booked', () => {
    const round = roundOf(
      newCount(),
      newCount({ key: 'same', number: 'kw-00017', place: 'RACK A' }),
      newCount({ key: 'other place', place: 'Rack B' }),
      newCount({ key: 'other part', number: 'KW-00018' }),
    );
    const after = taken(round, 'one', newMovement({ id: 8, change: -1 }));
    expect(after.counts.map(({ seenMovementId }) => seenMovementId)).toEqual([7, 8, 7, 7]);
    expect(after.counts[0]).toMatchObject({ state: 'sent', change: -1 });
  });

  it('keeps a refused count with the reason and what stands there now, until the person settles it', () => {
    const places = [{ place: 'rack a', quantity: 36, lastMovementId: 9, countedAt: null }];
    const stale = new Problem(
      409,
      'changed-meanwhile',
      'Somebody took 4.',
      [],
      null,
      newStockItem({ places }),
    );
    const round = refused(roundOf(newCount()), 'one', stale);
    expect(round.counts[0]).toMatchObject({
      state: 'refused',
      refusal: 'Somebody took 4.',
      now: { quantity: 36, movementId: 9 },
    });
    expect(unsettled(round)).toHaveLength(1);
    expect(finished(round).counts).toHaveLength(1);
    expect(without(round, 'one').counts).toEqual([]);
    // Sent again it is another request, which has seen what stands there now.
    expect(sentAgain(round, 'one', 'new').counts[0]).toMatchObject({
      key: 'new',
      state: 'waiting',
      counted: 39,
      expected: 36,
      seenMovementId: 9,
    });
  });

  it('clears only what the server has', () => {
    const round = roundOf(newCount({ state: 'sent' }), newCount({ key: 'two' }));
    expect(finished(round).counts.map(({ key }) => key)).toEqual(['two']);
  });
});
