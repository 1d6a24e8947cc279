/**
 * The option search as plain nested loops over the same pairs: every sequence of stages in the standard order,
 * ratio window by floats, the best K by cost, then ratio error, kept by insertion.
 */
export function plainLoops(pool, stages, { low, high, target }, size) {
  const { ratio, distance, length } = pool;
  const best = [];
  const offer = (cost, value, rows) => {
    const error = Math.abs(value / target - 1);
    const last = best[size - 1];
    if (last && (cost > last.cost || (cost === last.cost && error >= last.error))) return;
    let at = best.length;
    while (at > 0 && (best[at - 1].cost > cost || (best[at - 1].cost === cost && best[at - 1].error > error)))
      at--;
    best.splice(at, 0, { cost, error, rows });
    if (best.length > size) best.pop();
  };
  for (let i = 0; i < length; i++) {
    for (let j = 0; j <= i; j++) {
      const two = ratio[i] * ratio[j];
      if (stages === 2) {
        if (two >= low && two <= high) offer(distance[i] + distance[j], two, [i, j]);
        continue;
      }
      for (let k = 0; k <= j; k++) {
        const three = two * ratio[k];
        if (three >= low && three <= high) offer(distance[i] + distance[j] + distance[k], three, [i, j, k]);
      }
    }
  }
  return best;
}
