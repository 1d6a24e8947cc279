import { type BestList } from './best-list.js';
import { searchByCost } from './cost-search.js';
import { searchByRatioError } from './ratio-search.js';
import { type SearchSpace } from './search-space.js';
import { type WorkWatch } from './work-watch.js';

/** Adds the best trains of one stage count to the list; exact unless it is ended early by the watch. */
export function solve(space: SearchSpace, best: BestList, watch: WorkWatch): void {
  if (space.objective === 'ratio-error') searchByRatioError(space, best, watch);
  else searchByCost(space, best, watch);
}
