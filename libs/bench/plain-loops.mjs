/**
 * The option search as plain nested loops over the same pairs: every train in the standard order of its stages,
 * the best K by cost, then ratio error, kept by insertion. `within(rows)` decides the ratio.
 */
export function plainLoops(pool, stages, target, within, size) {
  const { ratio, distance, length } = pool;
  const best = [];
  const offer = (cost, value, rows) => {
    const error = Math.abs(value / target - 1);
    const last = best[size - 1];
    if (last && (cost > last.cost || (cost === last.cost && error >= last.error))) return;
    let at = best.length;
    while (
      at > 0 &&
      (best[at - 1].cost > cost || (best[at - 1].cost === cost && best[at - 1].error > error))
    ) {
      at--;
    }
    best.splice(at, 0, { cost, error, rows });
    if (best.length > size) best.pop();
  };
  for (let i = 0; i < length; i++) {
    for (let j = 0; j <= i; j++) {
      if (stages === 2) {
        if (within(i, j, -1)) offer(distance[i] + distance[j], ratio[i] * ratio[j], [i, j]);
        continue;
      }
      for (let k = 0; k <= j; k++) {
        if (!within(i, j, k)) continue;
        offer(distance[i] + distance[j] + distance[k], ratio[i] * ratio[j] * ratio[k], [i, j, k]);
      }
    }
  }
  return best;
}

/** The ratio window by floats: fast, and wrong now and then for a ratio on its very limit. */
export function withinByFloats({ ratio }, { low, high }) {
  return (i, j, k) => {
    const value = ratio[i] * ratio[j] * (k < 0 ? 1 : ratio[k]);
    return value >= low && value <= high;
  };
}

/** The ratio window by whole numbers, as exact as the search: target and limits as fractions of 1e6. */
export function withinExactly({ pinion, wheel }, target, tolerancePercent) {
  const wheels = Array.from(wheel, BigInt);
  const pinions = Array.from(pinion, BigInt);
  const scaled = BigInt(Math.round(target * 1e6));
  const allowed = scaled * BigInt(tolerancePercent);
  return (i, j, k) => {
    const n = wheels[i] * wheels[j] * (k < 0 ? 1n : wheels[k]);
    const d = pinions[i] * pinions[j] * (k < 0 ? 1n : pinions[k]);
    const off = n * 1_000_000n - d * scaled;
    return (off < 0n ? -off : off) * 100n <= d * allowed;
  };
}
