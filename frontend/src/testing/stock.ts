import type { Movement, StockItem } from '../api/types';

/** A part on the shelf for tests; give what matters to the test. */
export function newStockItem(given: Partial<StockItem> = {}): StockItem {
  return {
    number: 'KW-00017',
    description: 'Spur gear, steel, 28 teeth',
    kind: 'gear',
    standing: 'cleared',
    unit: 'pcs',
    quantity: 40,
    leastStock: null,
    low: false,
    places: [{ place: 'Rack A', quantity: 40, lastMovementId: 7, countedAt: null }],
    version: 3,
    ...given,
  };
}

/** A count in the ledger for tests. */
export function newMovement(given: Partial<Movement> = {}): Movement {
  return {
    id: 8,
    number: 'KW-00017',
    description: 'Spur gear, steel, 28 teeth',
    unit: 'pcs',
    kind: 'counted',
    change: -1,
    counted: 39,
    after: 39,
    place: 'Rack A',
    reason: '',
    at: '2026-11-02T08:00:00.000Z',
    by: 'Levi Marsh',
    ...given,
  };
}
