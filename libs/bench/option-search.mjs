import loadHighs from 'highs';
import { searchOptions, validateOptionRequest } from '../dist/train-planner/index.js';
import { StagePairs } from '../dist/train-planner/stage-pairs.js';
import { TrainSearch } from '../dist/train-planner/train-search.js';
import { WorkWatch } from '../dist/train-planner/work-watch.js';
import { chosenRows, highsModel } from './highs-model.mjs';
import { plainLoops, withinByFloats, withinExactly } from './plain-loops.mjs';
import { inMs, printTable, shortest, times } from './timing.mjs';

/** Pinions 12–24 with wheels 24–60: at most 500 pairs a stage. */
const SPACES = [
  { stages: 2, target: '9.37' },
  { stages: 3, target: '28.31' },
];

const HIGHS_SECONDS = 60;

/** The search against plain nested loops and against HiGHS on the same pairs; all must agree. */
export async function benchOptionSearch() {
  const highs = await loadHighs();
  let agree = true;
  for (const { stages, target } of SPACES) {
    const request = validateOptionRequest({
      ratio: { target, tolerancePercent: '1' },
      stages: { min: stages, max: stages },
      teeth: { pinion: { min: 12, max: 24 }, wheel: { min: 24, max: 60 } },
      modules: [1],
      objective: 'centre-distance',
    });
    const watch = new WorkWatch({});
    const search = new TrainSearch(request, new StagePairs(request, watch));
    const { pool, window } = search;
    const ours = (size) =>
      shortest(() => {
        const list = search.emptyList(size);
        search.run(stages, list, watch);
        return list.trains;
      });
    const [one, fifty] = [ours(1), ours(50)];
    const whole = shortest(() => searchOptions(request));
    const floats = withinByFloats(pool, window);
    const loops = shortest(() => plainLoops(pool, stages, window.target, floats, 50), { budgetMs: 1500 });
    const exact = withinExactly(pool, Number(target), 1);
    const exactLoops = shortest(() => plainLoops(pool, stages, window.target, exact, 50), { least: 1 });
    const same = (found) => found.every((train, index) => train.cost === fifty.result[index].cost);
    const sameFifty = same(loops.result) && same(exactLoops.result);

    const model = highsModel(pool, stages, window);
    const options = {
      mip_rel_gap: 0,
      mip_abs_gap: 0,
      mip_feasibility_tolerance: 1e-9,
      time_limit: HIGHS_SECONDS,
    };
    const peer = shortest(() => highs.solve(model, options), { budgetMs: 0, least: 1 });
    const rows = chosenRows(peer.result);
    const cost = rows.reduce((sum, row) => sum + pool.distance[row], 0);
    const solved = peer.result.Status === 'Optimal';
    const sameBest = solved && cost === one.result[0].cost;
    agree &&= sameFifty && (sameBest || !solved);

    console.log(
      `${stages} stages, ${target} : 1 within 1 %, ${pool.length} pairs a stage, least centre-distance sum ` +
        `${(one.result[0].cost / 1e6).toFixed(2)} mm`,
    );
    printTable([
      ['', 'time', 'option search is faster by', 'same answer'],
      ['option search, best 1', inMs(one.ms), '', ''],
      ['option search, best 50', inMs(fifty.ms), '', ''],
      ['whole request, best 50, pairs and figures included', inMs(whole.ms), '', ''],
      [
        'plain nested loops, floats, best 50',
        inMs(loops.ms),
        `${times(loops.ms / fifty.ms)} (goal 50 ×)`,
        same(loops.result) ? 'yes, all 50' : 'NO',
      ],
      [
        'plain nested loops, exact fractions, best 50',
        inMs(exactLoops.ms),
        `${times(exactLoops.ms / fifty.ms)} (goal 50 ×)`,
        same(exactLoops.result) ? 'yes, all 50' : 'NO',
      ],
      [
        `HiGHS, best 1 (${peer.result.Status})`,
        inMs(peer.ms),
        `${times(peer.ms / one.ms)} (goal 100 ×)`,
        sameBest ? 'yes' : solved ? 'NO' : `not proved in ${HIGHS_SECONDS} s`,
      ],
    ]);
  }
  console.log(
    'HiGHS model: one binary a stage and pair, one pair a stage, sum of log ratios inside the logs of the limits\n' +
      '(floats, feasibility tolerance 1e-9; gap 0). The optimum it names is compared as whole nanometres.\n',
  );
  return agree;
}
