import { answer, api } from '../client';
import type { Brief } from '../types';
import { keepBrief } from './useBrief';

/** Keeps an option for comparison. */
export async function pinOption(briefId: string, optionKey: string, searchId: string): Promise<Brief> {
  const params = { path: { id: briefId, optionKey } };
  return keepBrief(
    await answer(api.PUT('/api/briefs/{id}/pins/{optionKey}', { params, body: { searchId } })),
  );
}

/** Lets a pinned option go; the search that found it keeps it. */
export async function unpinOption(briefId: string, optionKey: string): Promise<Brief> {
  const params = { path: { id: briefId, optionKey } };
  return keepBrief(await answer(api.DELETE('/api/briefs/{id}/pins/{optionKey}', { params })));
}
