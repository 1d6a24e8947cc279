import { setTimeout as pause } from 'node:timers/promises';
import { type INestApplicationContext } from '@nestjs/common';
import { BriefsService } from '@stageyard/backend/briefs/briefs.service';
import { OptionSearchesService } from '@stageyard/backend/option-searches/option-searches.service';
import { TrainsService } from '@stageyard/backend/trains/trains.service';
import { type Actors } from './actors.js';
import { type BriefRow, DEMO_BRIEFS } from './data/briefs.js';

const POLL_MS = 50;

/** Books the briefs as the designer, searches those that lead to a train, and adopts their best option. */
export async function bookWork(
  app: INestApplicationContext,
  actors: Actors,
): Promise<{ briefs: number; trains: number }> {
  let trains = 0;
  for (const row of DEMO_BRIEFS) {
    const { title, note, requirement } = row;
    const brief = await app.get(BriefsService).create({ title, note, requirement }, actors.designer);
    if (row.adoptAs === null) continue;
    await adoptBest(app, actors, brief.id, row.adoptAs);
    trains += 1;
  }
  return { briefs: DEMO_BRIEFS.length, trains };
}

async function adoptBest(
  app: INestApplicationContext,
  { designer }: Actors,
  briefId: string,
  title: NonNullable<BriefRow['adoptAs']>,
): Promise<void> {
  const searches = app.get(OptionSearchesService);
  let search = await searches.start(briefId, designer);
  while (search.state === 'queued' || search.state === 'running') {
    await pause(POLL_MS);
    search = await searches.get(search.id);
  }
  const best = search.outcome?.options[0];
  if (best === undefined) {
    throw new Error(
      `The demo brief for “${title}” has no option: ${search.message ?? 'its limits leave nothing'}.`,
    );
  }
  await app.get(TrainsService).adopt({ briefId, searchId: search.id, optionKey: best.key, title }, designer);
}
