import { Explanation, countOf } from './explanation.js';
import { RELAXATIONS } from './relaxations.js';
import { type StagePairs } from './stage-pairs.js';
import { type WhyNot } from './train-option.js';
import { type TrainSearch } from './train-search.js';
import { explainTogether } from './two-limits.js';
import { type WorkWatch } from './work-watch.js';

/** Steps of search that one limit, and all limits of one stage count, may take: a second or so, a few seconds. */
const STEPS_PER_LIMIT = 4_000_000;
const STEPS_PER_STAGE_COUNT = 16_000_000;

/**
 * Why a stage count has no train among the options. Every limit is loosened alone and the request solved again;
 * the figure reported is the least loosening that gives a train. Where none helps alone, one is loosened together
 * with the sizes that follow from it.
 */
export function explainStages(
  stages: number,
  search: TrainSearch,
  stagePairs: StagePairs,
  watch: WorkWatch,
): WhyNot[] {
  const outranked = explainOutranked(stages, search, watch);
  if (outranked) return [outranked];
  const explain = new Explanation(stages, search.request, stagePairs, watch);
  const found: WhyNot[] = [];
  let unsettled = false;
  const attempts = [
    () => explain.tolerance(),
    ...RELAXATIONS.map((relaxation) => () => explain.limit(relaxation)),
    () => explain.width(),
    () => explain.undercut(),
    () => explain.direction(),
  ];
  const last = watch.stepsTaken + STEPS_PER_STAGE_COUNT;
  for (const attempt of attempts) {
    const steps = Math.min(STEPS_PER_LIMIT, last - watch.stepsTaken);
    const reason = watch.withStepLimit(steps, attempt);
    if (reason === 'over-budget') unsettled = true;
    else if (reason) found.push(reason);
  }
  if (found.length > 0) return found;
  const together = watch.withStepLimit(STEPS_PER_STAGE_COUNT, () =>
    explainTogether(stages, search.request, stagePairs, watch),
  );
  if (together === 'over-budget') unsettled = true;
  else if (together) return [together];
  const message = unsettled
    ? `${countOf(stages)}: no option within these limits; how far one of them would have to give was too long to settle.`
    : `${countOf(stages)}: no option, and loosening one limit alone does not help. Loosen several.`;
  return [{ stages, limit: 'several', message, nearest: null }];
}

/** The stage count works, but its best train ranks behind the options returned. */
function explainOutranked(stages: number, search: TrainSearch, watch: WorkWatch): WhyNot | null {
  const best = search.emptyList(1);
  search.run(stages, best, watch, 'why not');
  const train = best.trains[0];
  if (!train) return null;
  const { objective, limit } = search.request;
  const error = `${(search.window.error(train.n, train.d) * 100).toFixed(3)} %`;
  const [figure, nearest] = {
    'centre-distance': [`sums to ${(train.distance / 1e6).toFixed(2)} mm`, train.distance / 1e6],
    mass: [`weighs ${(train.cost / 1e6).toFixed(3)} kg`, train.cost / 1e6],
    'ratio-error': [`is ${error} off the ratio`, search.window.error(train.n, train.d) * 100],
  }[objective] as [string, number];
  const verb = stages === 1 ? 'works' : 'work';
  const message = `${countOf(stages)} ${verb}, but none is among the best ${limit}: the best ${figure}.`;
  return { stages, limit: 'objective', message, nearest, relaxed: { stages: { min: stages, max: stages } } };
}
