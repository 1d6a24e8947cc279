import { type INestApplicationContext } from '@nestjs/common';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { BriefsService } from '../briefs/briefs.service.js';
import { type BriefInputDto } from '../briefs/dto/brief-input.dto.js';
import { type SearchDto } from '../option-searches/dto/search.dto.js';
import { OptionSearchesService } from '../option-searches/option-searches.service.js';
import { type TrainDto } from '../trains/dto/train.dto.js';
import { TrainsService } from '../trains/trains.service.js';
import { newBrief } from './new-brief.js';

/** Waits until a search has ended. */
export async function searchEnded(app: INestApplicationContext, id: string): Promise<SearchDto> {
  for (;;) {
    const search = await app.get(OptionSearchesService).get(id);
    if (search.finishedAt !== null) return search;
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
}

/** A brief with a search that has ended. */
export async function newSearchedBrief(
  app: INestApplicationContext,
  actor: SignedInUser,
  changes: Partial<BriefInputDto> = {},
): Promise<SearchDto> {
  const brief = await app.get(BriefsService).create(newBrief(changes), actor);
  const { id } = await app.get(OptionSearchesService).start(brief.id, actor);
  return searchEnded(app, id);
}

/** A train of the best option of a new brief. */
export async function newTrain(
  app: INestApplicationContext,
  actor: SignedInUser,
  changes: Partial<BriefInputDto> = {},
): Promise<TrainDto> {
  const { id: searchId, briefId, outcome } = await newSearchedBrief(app, actor, changes);
  const optionKey = outcome?.options[0]?.key;
  if (optionKey === undefined) throw new Error('The search found no option.');
  return app.get(TrainsService).adopt({ briefId, searchId, optionKey }, actor);
}
