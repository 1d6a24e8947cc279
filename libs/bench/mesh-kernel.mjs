import { gearRadii, meshKernel } from '../dist/gear-geometry/index.js';
import { inMs, printTable, shortest, times } from './timing.mjs';

/**
 * The mesh kernel (undercut and fillets counted) against the bare closed form
 * (√(r_a1² − r_b1²) + √(r_a2² − r_b2²) − √(a² − (r_b1 + r_b2)²)) / p_b on the same gears, none undercut.
 */
export function benchMeshKernel() {
  const gears = [];
  for (let teeth = 18; teeth < 218; teeth++) gears.push(gearRadii({ teeth, module: 1 }));
  const basePitch = Math.PI * Math.cos((20 * Math.PI) / 180);
  const pairs = gears.length ** 2;

  const kernel = shortest(() => {
    let sum = 0;
    for (const pinion of gears) {
      for (const wheel of gears)
        sum += meshKernel(pinion, wheel, (pinion.teeth + wheel.teeth) / 2, basePitch);
    }
    return sum;
  });
  const bare = shortest(() => {
    let sum = 0;
    for (const pinion of gears) {
      for (const wheel of gears) {
        const a = (pinion.teeth + wheel.teeth) / 2;
        const bases = pinion.base + wheel.base;
        const e1 = Math.sqrt(pinion.tip * pinion.tip - pinion.base * pinion.base);
        const e2 = Math.sqrt(wheel.tip * wheel.tip - wheel.base * wheel.base);
        sum += (e1 + e2 - Math.sqrt(a * a - bases * bases)) / basePitch;
      }
    }
    return sum;
  });
  const same = Math.abs(kernel.result - bare.result) < 1e-6 * pairs;
  console.log(
    `Contact ratio of ${pairs.toLocaleString('en-GB')} pairs without undercut (same sum: ${same ? 'yes' : 'NO'})`,
  );
  printTable([
    ['', 'time', 'a pair', 'speed against the bare loop'],
    ['bare closed form', inMs(bare.ms), `${((bare.ms * 1e6) / pairs).toFixed(1)} ns`, '1'],
    [
      'mesh kernel',
      inMs(kernel.ms),
      `${((kernel.ms * 1e6) / pairs).toFixed(1)} ns`,
      `${times(bare.ms / kernel.ms)} (goal: at least 0.33 ×)`,
    ],
  ]);
  return same;
}
