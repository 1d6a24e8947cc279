import { type BestList, type FoundTrain } from './best-list.js';
import { OptionFigures } from './option-figures.js';
import { type OptionRequest } from './option-request.js';
import { StagePairs } from './stage-pairs.js';
import { type SearchControl, type SearchOutcome, type WhyNot } from './train-option.js';
import { TrainSearch } from './train-search.js';
import { validateOptionRequest } from './validate-request.js';
import { explainStages } from './why-not.js';
import { SearchEnded, WorkWatch } from './work-watch.js';

/**
 * The best trains for a request, exact and the same on every run. `complete: true` means that nothing in the
 * space outranks the options returned (with `bestOf: 'each-count'`, within their stage count); after a stop or the
 * time limit it is false and the best so far are given.
 * Order: the objective as whole nm or mg, then ratio error (exact), sum of distances, fewer stages, teeth.
 * Orders of the same stages are one option for `centre-distance` and `ratio-error` without an envelope, else
 * separate options. Without a load every stage has the smallest module listed.
 * Masses are those of solid discs at the reference diameter, 7,850 kg/m³.
 * @throws InputError listing every field at fault
 */
export function searchOptions(request: OptionRequest, control: SearchControl = {}): SearchOutcome {
  const checked = validateOptionRequest(request);
  const watch = new WorkWatch(control);
  const stagePairs = new StagePairs(checked, watch);
  watch.beginPhase('stage pairs', checked.stages.min, 0);
  const search = unlessEnded(() => new TrainSearch(checked, stagePairs));
  if (!search) return outcome([], false, [], watch);

  const lists = [search.emptyList()];
  watch.found = () => lists.reduce((sum, { trains }) => sum + trains.length, 0);
  const ended = !unlessEnded(() => {
    for (let stages = checked.stages.min; stages <= checked.stages.max; stages++) {
      if (checked.bestOf === 'each-count' && stages > checked.stages.min) lists.unshift(search.emptyList());
      search.run(stages, lists[0] as BestList, watch);
    }
    return true;
  });
  const best = ranked(lists);
  const figures = new OptionFigures(checked, stagePairs, search.pool);
  const options = best.map((train) => figures.option(train));
  const combinations = watch.settled;
  const whyNot: WhyNot[] = [];
  if (!ended) {
    unlessEnded(() => {
      for (let stages = checked.stages.min; stages <= checked.stages.max; stages++) {
        if (best.some((train) => train.pairs.length === stages)) continue;
        watch.beginPhase('why not', stages, 0);
        whyNot.push(...explainStages(stages, search, stagePairs, watch));
      }
      return true;
    });
  }
  watch.settled = combinations;
  return outcome(options, !ended, whyNot, watch);
}

/** The trains of all lists in one order. */
function ranked(lists: BestList[]): FoundTrain[] {
  return lists.flatMap(({ trains }) => trains).sort((a, b) => (lists[0] as BestList).compare(a, b));
}

function outcome(
  options: SearchOutcome['options'],
  complete: boolean,
  whyNot: WhyNot[],
  watch: WorkWatch,
): SearchOutcome {
  const search = { complete, combinations: watch.settled, elapsedMs: watch.elapsedMs() };
  return { options, search, whyNot };
}

/** The result, or null when the watch ended the work. */
function unlessEnded<T>(work: () => T): T | null {
  try {
    return work();
  } catch (error) {
    if (error instanceof SearchEnded) return null;
    throw error;
  }
}
