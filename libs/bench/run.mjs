import { benchGearTrainProblem } from './gear-train-problem.mjs';
import { benchMeshKernel } from './mesh-kernel.mjs';
import { benchOptionSearch } from './option-search.mjs';

/** Runs on the built libraries (`npm run bench` builds them). Compare the ratios, not the times: they depend on the machine. */
const results = [benchMeshKernel(), await benchOptionSearch(), benchGearTrainProblem()];
if (results.includes(false)) {
  console.log('A result differs from what it was compared with.');
  process.exitCode = 1;
}
