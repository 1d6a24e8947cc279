/**
 * The same choice as a mixed-integer linear program in LP text: one binary for each stage and pair, one pair a
 * stage, the sum of logarithms of the ratios inside the logarithms of the limits, least sum of distances (mm).
 */
export function highsModel(pool, stages, { low, high }) {
  const terms = (coefficient) => {
    const parts = [];
    for (let stage = 0; stage < stages; stage++) {
      for (let row = 0; row < pool.length; row++) parts.push(`${signed(coefficient(row))} x${stage}_${row}`);
    }
    return wrapped(parts);
  };
  const logs = terms((row) => Math.log(pool.ratio[row]));
  const one = Array.from({ length: stages }, (_unused, stage) => {
    const parts = Array.from({ length: pool.length }, (_also, row) => `+ x${stage}_${row}`);
    return ` one${stage}: ${wrapped(parts)} = 1`;
  });
  const names = Array.from({ length: stages * pool.length }, (_unused, index) => {
    return `x${Math.floor(index / pool.length)}_${index % pool.length}`;
  });
  return [
    'Minimize',
    ` cost: ${terms((row) => pool.distance[row] / 1e6)}`,
    'Subject To',
    ...one,
    ` low: ${logs} >= ${Math.log(low)}`,
    ` high: ${logs} <= ${Math.log(high)}`,
    'Binary',
    ` ${wrapped(names)}`,
    'End',
  ].join('\n');
}

function signed(value) {
  return value < 0 ? `- ${-value}` : `+ ${value}`;
}

/** LP text has a limit on the length of a line. */
function wrapped(parts) {
  const lines = [];
  for (let start = 0; start < parts.length; start += 8) lines.push(parts.slice(start, start + 8).join(' '));
  return lines.join('\n  ');
}

/** Pairs that the solution chose, in the order of the stages. */
export function chosenRows(solution) {
  return Object.entries(solution.Columns)
    .filter(([, column]) => column.Primal > 0.5)
    .map(([name]) => name.slice(1).split('_').map(Number))
    .sort(([a], [b]) => a - b)
    .map(([, row]) => row);
}
