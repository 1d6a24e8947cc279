import useSWR, { mutate, type SWRResponse } from 'swr';
import { answer, api } from '../client';
import type { Brief, BriefInput, BriefPatch } from '../types';
import { readAgain } from './readAgain';

export const briefKey = (id: string) => ['/api/briefs/{id}', id] as const;

/** One brief with its pins and latest search; not read again on focus, so that a form never changes underfoot. */
export function useBrief(id: string | null): SWRResponse<Brief, unknown> {
  return useSWR<Brief, unknown, ReturnType<typeof briefKey> | null>(
    id === null ? null : briefKey(id),
    ([, briefId]) => answer(api.GET('/api/briefs/{id}', { params: { path: { id: briefId } } })),
    { revalidateOnFocus: false, revalidateOnReconnect: false },
  );
}

/** Puts a brief the server has just sent in front of every screen that shows it, and has the lists read again. */
export async function keepBrief(brief: Brief): Promise<Brief> {
  await mutate(briefKey(brief.id), brief, { revalidate: false });
  readAgain('/api/briefs', '/api/overview');
  return brief;
}

/** Reads a brief again, after something about it changed elsewhere. */
export async function refreshBrief(id: string): Promise<void> {
  await mutate(briefKey(id));
}

/** @throws Problem 400 naming the fields */
export async function createBrief(input: BriefInput): Promise<Brief> {
  return keepBrief(await answer(api.POST('/api/briefs', { body: input })));
}

/** @throws Problem 400 naming the fields, 409 `changed-meanwhile` with the brief as it stands now */
export async function saveBrief(id: string, patch: BriefPatch): Promise<Brief> {
  return keepBrief(await answer(api.PATCH('/api/briefs/{id}', { params: { path: { id } }, body: patch })));
}
