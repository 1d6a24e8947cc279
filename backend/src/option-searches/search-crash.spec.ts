import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { getRepositoryToken } from '@nestjs/typeorm';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { AuditService } from '../audit/audit.service.js';
import { Brief } from '../briefs/entities/brief.entity.js';
import { BriefsService } from '../briefs/briefs.service.js';
import { Clock } from '../common/clock.js';
import { WriteQueue } from '../database/write-queue.js';
import { newBrief } from '../testing/new-brief.js';
import { searchEnded } from '../testing/new-train.js';
import { addSignedIn } from '../testing/people.js';
import { openTempApp, type TempApp } from '../testing/temp-app.js';
import { SearchPool } from '../workers/search-pool.js';
import { OptionSearch } from './entities/option-search.entity.js';
import { OptionSearchesService } from './option-searches.service.js';
import { SearchRunner } from './search-runner.js';

let temp: TempApp;
let folder: string;
let pool: SearchPool;

beforeAll(async () => {
  temp = await openTempApp();
  folder = mkdtempSync(path.join(tmpdir(), 'stageyard-worker-'));
  const entry = path.join(folder, 'dies.mjs');
  writeFileSync(entry, `export default () => process.exit(3);\n`);
  pool = new SearchPool({ entry, threads: 1 });
});
afterAll(async () => {
  await pool.onApplicationShutdown();
  await temp.close();
  rmSync(folder, { recursive: true, force: true });
});

it('a thread that dies leaves a failed search with words to act on, and the server goes on', async () => {
  const { app } = temp;
  const [writes, audit, clock] = [app.get(WriteQueue), app.get(AuditService), app.get(Clock)];
  const runner = new SearchRunner(pool, writes, audit, clock);
  const searches = new OptionSearchesService(
    app.get(getRepositoryToken(OptionSearch)),
    app.get(getRepositoryToken(Brief)),
    writes,
    audit,
    runner,
    clock,
  );
  const person = await addSignedIn(app, 'designer');
  const brief = await app.get(BriefsService).create(newBrief(), person);
  const { id } = await searches.start(brief.id, person);
  const search = await searchEnded(app, id);
  expect(search).toMatchObject({ state: 'failed', outcome: null, optionCount: null, complete: null });
  expect(search.message).toMatch(/broke off before it finished. Start it again/);
  const { items } = await audit.changesOf('brief', brief.code, {});
  expect(items[0]).toMatchObject({ action: 'search failed', by: person.name });
  // The same person may search again at once, on the threads that work.
  const again = await app.get(OptionSearchesService).start(brief.id, person);
  expect((await searchEnded(app, again.id)).state).toBe('done');
});
