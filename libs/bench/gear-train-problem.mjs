import { searchOptions } from '../dist/train-planner/index.js';
import { inMs, printTable, shortest } from './timing.mjs';

/** Least squared error of the 1/6.931 problem, by exhaustion (gear train design problem of the literature). */
const LEAST_SQUARED_ERROR = 2.70085715e-12;

/** The gear train design problem: 1/6.931 from four gears of 12–60 teeth, solved exactly. */
export function benchGearTrainProblem() {
  const request = {
    ratio: { target: '6.931', tolerancePercent: '1' },
    stages: { min: 2, max: 2 },
    teeth: { pinion: { min: 12, max: 60 }, wheel: { min: 12, max: 60 } },
    modules: [1],
    leastContactRatio: 0,
    objective: 'ratio-error',
    limit: 10,
  };
  const { ms, result } = shortest(() => searchOptions(request));
  const squared = (option) =>
    (1 / 6.931 - Number(option.ratio.denominator) / Number(option.ratio.numerator)) ** 2;
  const [best] = result.options;
  const right = Math.abs(squared(best) - LEAST_SQUARED_ERROR) < 1e-20 && result.search.complete;
  console.log(
    `1/6.931 from teeth 12–60, two stages: ${inMs(ms)}, ${result.search.combinations.toLocaleString('en-GB')} ` +
      `trains settled, the least error ${right ? 'as published' : 'NOT as published'}`,
  );
  printTable([
    ['train', 'squared error of the inverse'],
    ...result.options.slice(0, 4).map((option) => [option.key, squared(option).toExponential(8)]),
  ]);
  return right;
}
