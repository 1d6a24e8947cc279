import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { setTimeout as delay } from 'node:timers/promises';
import { InputError } from '@stageyard/libs/units';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { newRequirement, slowRequirement } from '../testing/new-brief.js';
import { type SearchProgress } from './search-task.js';
import { SearchCrashed, SearchPool } from './search-pool.js';
import { StopFlag } from './stop-flag.js';
import { workerEntry } from './worker-entry.js';

const pools: SearchPool[] = [];
const open = (entry: string, graceMs?: number) => {
  const pool = new SearchPool({ entry, threads: 1, ...(graceMs === undefined ? {} : { graceMs }) });
  pools.push(pool);
  return pool;
};

afterEach(async () => {
  await Promise.all(pools.splice(0).map((pool) => pool.onApplicationShutdown()));
});

describe('a pool of search threads', () => {
  const entry = workerEntry('option-search.worker');

  it('answers with what the planner finds', async () => {
    const outcome = await open(entry).run(newRequirement(), { timeLimitMs: 30_000 });
    expect(outcome.search.complete).toBe(true);
    expect(outcome.options).toHaveLength(5);
  });

  it('passes on a refusal with its fields', async () => {
    const refused = open(entry).run(newRequirement({ modules: [] }), { timeLimitMs: 1000 });
    await expect(refused).rejects.toBeInstanceOf(InputError);
    await expect(refused).rejects.toMatchObject({ errors: [{ field: 'modules' }] });
  });

  it('reports progress a few times a second and stops when the flag is raised', async () => {
    const reports: { at: number; progress: SearchProgress }[] = [];
    const stopFlag = new StopFlag();
    let began = 0;
    const running = open(entry).run(slowRequirement(), {
      timeLimitMs: 60_000,
      stopFlag,
      onStart: () => (began = performance.now()),
      onProgress: (progress) => reports.push({ at: performance.now(), progress }),
    });
    while (reports.length < 4) await delay(20);
    stopFlag.raise();
    const asked = performance.now();
    const outcome = await running;
    expect(outcome.search.complete).toBe(false);
    expect(performance.now() - asked).toBeLessThan(5000);
    const seconds = ((reports.at(-1)?.at ?? 0) - began) / 1000;
    expect(reports.length / Math.max(seconds, 0.6)).toBeLessThan(8);
    expect(reports.at(-1)?.progress.phase).not.toBe('');
  });

  it('ends with the best so far when the time is up', async () => {
    const outcome = await open(entry).run(slowRequirement(), { timeLimitMs: 300 });
    expect(outcome.search.complete).toBe(false);
  });

  it('takes a search that waits for a thread out of the queue when it is stopped', async () => {
    const pool = open(entry);
    const first = new StopFlag();
    const second = new StopFlag();
    const started: number[] = [];
    const run = (stopFlag: StopFlag, which: number) =>
      pool.run(slowRequirement(), { timeLimitMs: 60_000, stopFlag, onStart: () => started.push(which) });
    const running = run(first, 1);
    const waiting = run(second, 2);
    while (started.length === 0) await delay(20);
    second.raise();
    expect((await waiting).options).toEqual([]);
    expect(started).toEqual([1]);
    first.raise();
    await running;
  });
});

describe('a thread that does not do its work', () => {
  let folder: string;
  beforeAll(() => (folder = mkdtempSync(path.join(tmpdir(), 'stageyard-worker-'))));
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  const entryOf = (name: string, body: string) => {
    const file = path.join(folder, `${name}.mjs`);
    writeFileSync(file, `export default function run(task) { ${body} }\n`);
    return file;
  };
  const STARTED = "task.reports.postMessage({ kind: 'started' });";

  it('fails its search in plain words, and the pool goes on', async () => {
    const dies = `${STARTED} if (task.request.limit === 1) process.exit(3);
      return { ok: true, outcome: { options: [], search: { complete: true, combinations: 0, elapsedMs: 0 }, whyNot: [] } };`;
    const pool = open(entryOf('dies', dies));
    const broken = pool.run(newRequirement({ limit: 1 }), { timeLimitMs: 5000 });
    await expect(broken).rejects.toBeInstanceOf(SearchCrashed);
    await expect(broken).rejects.toThrow(/broke off .* Start it again/);
    const next = await pool.run(newRequirement(), { timeLimitMs: 5000 });
    expect(next.search.complete).toBe(true);
  });

  it('does not keep those that wait for it waiting', async () => {
    const dies = `${STARTED} if (task.request.limit === 1) setTimeout(() => process.exit(3), 100);
      return task.request.limit === 1 ? new Promise(() => {})
        : { ok: true, outcome: { options: [], search: { complete: true, combinations: 0, elapsedMs: 0 }, whyNot: [] } };`;
    const pool = open(entryOf('dies-late', dies));
    const broken = pool.run(newRequirement({ limit: 1 }), { timeLimitMs: 5000 });
    const waiting = pool.run(newRequirement(), { timeLimitMs: 5000 });
    await expect(broken).rejects.toBeInstanceOf(SearchCrashed);
    expect((await waiting).search.complete).toBe(true);
  });

  it('fails its search when it throws', async () => {
    const pool = open(entryOf('throws', `${STARTED} throw new TypeError('secret inside');`));
    const broken = pool.run(newRequirement(), { timeLimitMs: 5000 });
    await expect(broken).rejects.toThrow(/broke off/);
    await expect(broken).rejects.not.toThrow(/secret/);
  });

  it('is ended by force when it hears neither the flag nor the clock', async () => {
    const pool = open(entryOf('deaf', `${STARTED} for (;;);`), 100);
    const stopFlag = new StopFlag();
    const running = pool.run(newRequirement(), {
      timeLimitMs: 60_000,
      stopFlag,
      onStart: () => stopFlag.raise(),
    });
    await expect(running).rejects.toBeInstanceOf(SearchCrashed);
    await expect(pool.run(newRequirement(), { timeLimitMs: 50 })).rejects.toBeInstanceOf(SearchCrashed);
  });
});
