/** Runs `work` until `budgetMs` is used (at least `least` times) and gives the shortest time in ms and the last result. */
export function shortest(work, { budgetMs = 1000, least = 3 } = {}) {
  let best = Infinity;
  let result;
  const end = performance.now() + budgetMs;
  for (let run = 0; run < least || performance.now() < end; run++) {
    const start = performance.now();
    result = work();
    best = Math.min(best, performance.now() - start);
  }
  return { ms: best, result };
}

/** A small table in plain text; the first row is the head. */
export function printTable(rows) {
  const widths = rows[0].map((_cell, column) => Math.max(...rows.map((row) => String(row[column]).length)));
  for (const [index, row] of rows.entries()) {
    console.log(
      row
        .map((cell, column) => String(cell).padEnd(widths[column]))
        .join('  ')
        .trimEnd(),
    );
    if (index === 0) console.log(widths.map((width) => '-'.repeat(width)).join('  '));
  }
  console.log('');
}

export function inMs(ms) {
  return ms < 10 ? `${ms.toFixed(3)} ms` : `${ms.toFixed(1)} ms`;
}

export function times(ratio) {
  return `${ratio < 10 ? ratio.toFixed(2) : Math.round(ratio).toLocaleString('en-GB')} ×`;
}
