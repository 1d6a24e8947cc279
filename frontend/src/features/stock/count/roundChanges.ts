import type { Problem } from '../../../api/problem';
import type { Movement, StockItem } from '../../../api/types';
import type { Count, CountRound } from './countTypes';

/** A count of more than this share off the books is asked about before it is taken. */
const SURPRISING = 0.2;

/** Whether a count is so far from the books that it is worth counting again. */
export function isSurprising(counted: number, expected: number | null): boolean {
  return expected !== null && expected > 0 && Math.abs(counted - expected) > SURPRISING * expected;
}

export function added(round: CountRound, count: Count): CountRound {
  return { ...round, counts: [...round.counts, count] };
}

export function without(round: CountRound, key: string): CountRound {
  return { ...round, counts: round.counts.filter((count) => count.key !== key) };
}

/** Takes the settled ones off the list; what is not sent stays. */
export function finished(round: CountRound): CountRound {
  return { ...round, counts: round.counts.filter(({ state }) => state !== 'sent') };
}

/** The server has the count. Later counts of the same shelf have then seen it. */
export function taken(round: CountRound, key: string, movement: Movement): CountRound {
  const at = round.counts.findIndex((count) => count.key === key);
  const counts = round.counts.map((count, index): Count => {
    if (index === at) {
      const { number, description, unit, place, change } = movement;
      return { ...count, number, description, unit, place, change, state: 'sent', refusal: null, now: null };
    }
    const follows = index > at && count.state === 'waiting' && isSameShelf(count, movement);
    return follows ? { ...count, seenMovementId: movement.id } : count;
  });
  return { ...round, counts };
}

/** The server refused the count: it stays, with why, until the person settles it. */
export function refused(round: CountRound, key: string, problem: Problem): CountRound {
  return changed(round, key, (count) => ({
    ...count,
    state: 'refused',
    refusal: problem.message,
    now: problem.changedMeanwhile ? shelfNow(problem.current, count.place) : null,
  }));
}

/** Sends the same figure again, by a person who looked at what stands there now. */
export function sentAgain(round: CountRound, key: string, newKey: string): CountRound {
  return changed(round, key, (count) => ({
    ...count,
    key: newKey,
    state: 'waiting',
    refusal: null,
    expected: count.now?.quantity ?? count.expected,
    seenMovementId: count.now?.movementId ?? count.seenMovementId,
    now: null,
  }));
}

function changed(round: CountRound, key: string, change: (count: Count) => Count): CountRound {
  return { ...round, counts: round.counts.map((count) => (count.key === key ? change(count) : count)) };
}

function isSameShelf(
  count: Pick<Count, 'number' | 'place'>,
  other: { number: string; place: string },
): boolean {
  const same = (one: string, two: string) => one.toLowerCase() === two.toLowerCase();
  return same(count.number, other.number) && same(count.place, other.place);
}

function shelfNow(current: unknown, place: string): Count['now'] {
  const places = (current as Partial<StockItem> | undefined)?.places;
  if (!Array.isArray(places)) return null;
  const level = places.find((each) => each.place.toLowerCase() === place.toLowerCase());
  return { quantity: level?.quantity ?? 0, movementId: level?.lastMovementId ?? 0 };
}
