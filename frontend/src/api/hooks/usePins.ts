import { mutate } from 'swr';
import { answer, api } from '../client';
import type { Brief, TrainOption } from '../types';
import { briefKey, keepBrief } from './useBrief';

/** The tick shows at once; a refusal takes it back. */
async function changePins(brief: Brief, pins: Brief['pins'], call: Promise<Brief>): Promise<Brief> {
  await mutate(briefKey(brief.id), call, {
    optimisticData: { ...brief, pins },
    rollbackOnError: true,
    revalidate: false,
  });
  return keepBrief(await call);
}

/** Keeps an option for comparison. @throws Problem when the server refuses */
export function pinOption(brief: Brief, option: TrainOption, searchId: string): Promise<Brief> {
  const params = { path: { id: brief.id, optionKey: option.key } };
  const call = answer(api.PUT('/api/briefs/{id}/pins/{optionKey}', { params, body: { searchId } }));
  const pin = { key: option.key, searchId, option, pinnedAt: new Date().toISOString(), by: '' };
  return changePins(brief, [...brief.pins, pin], call);
}

/** Lets a pinned option go; the search that found it keeps it. @throws Problem when the server refuses */
export function unpinOption(brief: Brief, optionKey: string): Promise<Brief> {
  const params = { path: { id: brief.id, optionKey } };
  const call = answer(api.DELETE('/api/briefs/{id}/pins/{optionKey}', { params }));
  return changePins(
    brief,
    brief.pins.filter(({ key }) => key !== optionKey),
    call,
  );
}
