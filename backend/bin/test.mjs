// npm test: sets up, runs every check and ends with one line that sums them: "N passed, N failed".
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { prepare } from './prepare.mjs';
import { ROOT, runNode } from './process.mjs';

const reports = mkdtempSync(path.join(tmpdir(), 'stageyard-test-'));
let summed = false;
process.on('exit', () => {
  rmSync(reports, { recursive: true, force: true });
  // The set-up failed, and said why: the last line says so too.
  if (!summed) console.log('0 passed, 1 failed');
});

const seconds = (since) => `${((performance.now() - since) / 1000).toFixed(0)} s`;

/** A check without counts of its own (lint, types) is one test. */
async function check(name, script, args, options) {
  const started = performance.now();
  const code = await runNode(script, args, { quiet: true, ...options });
  console.log(`${name}: ${code === 0 ? 'clean' : 'FAILED'} (${seconds(started)})`);
  return { name, passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1 };
}

/** Takes the counts from a runner's report; a runner that ends badly without a failed test still fails once. */
function counted(name, code, started, read) {
  let counts;
  try {
    counts = read();
  } catch {
    counts = { passed: 0, failed: 1 }; // no report: the runner itself fell over
  }
  const { passed } = counts;
  const failed = counts.failed === 0 && (code !== 0 || passed === 0) ? 1 : counts.failed;
  console.log(`${name}: ${passed} passed, ${failed} failed (${seconds(started)})`);
  return { name, passed, failed };
}

async function vitest(folder, ...args) {
  const name = [folder, ...args].join(' ');
  const started = performance.now();
  const report = path.join(reports, `${name.replaceAll(/\W+/g, '-')}.json`);
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  const code = await runNode('node_modules/vitest/vitest.mjs', ['run', ...args, ...reporters], {
    cwd: path.join(ROOT, folder),
  });
  return counted(name, code, started, () => {
    const { numPassedTests, numFailedTests, numPendingTests, numTodoTests, testResults } = JSON.parse(
      readFileSync(report, 'utf8'),
    );
    // A skipped test and a file that could not be loaded are both failures here.
    const broken = testResults.filter(
      ({ status, assertionResults }) =>
        status === 'failed' && !assertionResults.some((test) => test.status === 'failed'),
    );
    return {
      passed: numPassedTests,
      failed: numFailedTests + numPendingTests + numTodoTests + broken.length,
    };
  });
}

async function browser() {
  const started = performance.now();
  const report = path.join(reports, 'browser.json');
  const code = await runNode(
    'frontend/node_modules/@playwright/test/cli.js',
    ['test', '--reporter=list,json'],
    {
      cwd: path.join(ROOT, 'frontend'),
      env: { PLAYWRIGHT_JSON_OUTPUT_NAME: report },
    },
  );
  return counted('browser', code, started, () => {
    const { expected, unexpected, flaky, skipped } = JSON.parse(readFileSync(report, 'utf8')).stats;
    return { passed: expected, failed: unexpected + flaky + skipped };
  });
}

const begun = performance.now();
await prepare();
const tsc = (folder) =>
  check(`types ${folder}`, 'node_modules/typescript/bin/tsc', ['-p', `${folder}/tsconfig.json`, '--noEmit']);
const results = [];
const [lintResults, typeResults] = await Promise.all([
  (async () => [
    await check('lint', 'node_modules/eslint/bin/eslint.js', ['.', '--max-warnings', '0']),
    await check('format', 'node_modules/prettier/bin/prettier.cjs', ['--check', '.', '--log-level', 'warn']),
  ])(),
  (async () => [await tsc('libs'), await tsc('backend'), await tsc('seed'), await tsc('frontend')])(),
]);
results.push(...lintResults, ...typeResults);
results.push(await vitest('libs'));
results.push(await vitest('backend', '--project', 'unit'));
results.push(await vitest('backend', '--project', 'e2e'));
results.push(await vitest('seed'));
results.push(await vitest('frontend'));
results.push(await browser());

const passed = results.reduce((sum, result) => sum + result.passed, 0);
const failed = results.reduce((sum, result) => sum + result.failed, 0);
console.log(`\nAll checks took ${seconds(begun)}.`);
for (const { name, failed: count } of results) if (count > 0) console.log(`${name}: ${count} failed`);
console.log(`${passed} passed, ${failed} failed`);
summed = true;
process.exitCode = failed > 0 || passed === 0 ? 1 : 0;
