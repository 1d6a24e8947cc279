import type { Search } from '../types';

export type SearchProgress = NonNullable<Search['progress']>;

export const isUnderWay = (search: Pick<Search, 'state'> | null | undefined): boolean =>
  search?.state === 'queued' || search?.state === 'running';

/** A progress event's data, or null when it is not what was agreed. */
export function readProgress(data: string): SearchProgress | null {
  let said: unknown;
  try {
    said = JSON.parse(data);
  } catch {
    return null;
  }
  if (typeof said !== 'object' || said === null) return null;
  const { phase, stages, settled, total, found } = said as Partial<Record<keyof SearchProgress, unknown>>;
  const counts = [stages, settled, total, found];
  if (typeof phase !== 'string' || !counts.every((count) => typeof count === 'number')) return null;
  return { phase, stages, settled, total, found } as SearchProgress;
}

/** The search with the progress in it. Late news about a search that has ended changes nothing. */
export function withProgress(search: Search, progress: SearchProgress): Search {
  return isUnderWay(search) ? { ...search, state: 'running', progress } : search;
}
