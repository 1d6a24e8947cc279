import type { StockItem } from '../../../api/types';

/** One count on its way into the ledger. It is kept on the device until the server has it. */
export interface Count {
  /** The request's key: sent twice, it books once. */
  key: string;
  number: string;
  /** Blank when the part could not be looked up without a network. */
  description: string;
  unit: StockItem['unit'];
  place: string;
  counted: number;
  /** What the books said when it was typed; null when that was not known. */
  expected: number | null;
  /** The latest movement that was seen at the place; null when that was not known. */
  seenMovementId: number | null;
  /** When it was typed, ISO 8601. */
  at: string;
  state: 'waiting' | 'sent' | 'refused';
  /** What the server said to a refused one. */
  refusal: string | null;
  /** Of a sent one: how the count changed the books. */
  change: number | null;
  /** Of a refused one that saw an older shelf: what the books say now, and the movement that says so. */
  now: { quantity: number; movementId: number } | null;
}

/** What this person counts on this device. */
export interface CountRound {
  /** Remembered from one visit to the next; blank before the first. */
  place: string;
  /** In the order they were typed. */
  counts: readonly Count[];
}

export const EMPTY_ROUND: CountRound = { place: '', counts: [] };

/** Counts that the server does not have yet, in their order. */
export function waiting(round: CountRound): Count[] {
  return round.counts.filter(({ state }) => state === 'waiting');
}

/** Counts that would be lost with the device: not sent, or refused and not settled. */
export function unsettled(round: CountRound): Count[] {
  return round.counts.filter(({ state }) => state !== 'sent');
}
