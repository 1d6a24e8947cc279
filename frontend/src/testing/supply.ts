import type { OptionSupply } from '../api/types';

/** Cost and stock of an option for tests; give what matters to the test. */
export function newSupply(given: Partial<OptionSupply> = {}): OptionSupply {
  return {
    key: '18/110m1+19/116m1',
    gears: 4,
    fromStock: 4,
    onShelf: 2,
    toMake: 0,
    costs: [{ currency: 'EUR', minor: 10000 }],
    priced: 4,
    unpriced: 0,
    longestLeadTimeDays: 14,
    ...given,
  };
}
