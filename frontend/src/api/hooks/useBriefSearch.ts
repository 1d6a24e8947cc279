import { useEffect, useState } from 'react';
import useSWR, { mutate, type KeyedMutator } from 'swr';
import { answer, api } from '../client';
import type { Search } from '../types';
import { refreshBrief } from './useBrief';
import { isUnderWay, readProgress, withProgress } from './searchEvents';

/** While the event stream is down the search is asked after this often, ms. */
const ASK_AGAIN_EVERY = 3000;

const keyOf = (id: string) => ['/api/searches/{id}', id] as const;

/**
 * One search, live while it runs: events only touch the cached copy, so leaving the page or losing the connection
 * costs nothing; the state is read again on the way back.
 */
export function useBriefSearch(id: string | null) {
  const [connected, setConnected] = useState(true);
  const search = useSWR<Search, unknown, ReturnType<typeof keyOf> | null>(
    id === null ? null : keyOf(id),
    ([, searchId]) => answer(api.GET('/api/searches/{id}', { params: { path: { id: searchId } } })),
    {
      revalidateOnFocus: true,
      refreshInterval: (latest) => (isUnderWay(latest) && !connected ? ASK_AGAIN_EVERY : 0),
    },
  );
  const running = isUnderWay(search.data);
  const refresh: KeyedMutator<Search> = search.mutate;

  useEffect(() => {
    if (id === null || !running) return undefined;
    return followSearch(id, refresh, setConnected);
  }, [id, running, refresh]);

  return { ...search, connected };
}

/** Listens until the search ends or the caller leaves; returns what stops listening. */
function followSearch(
  id: string,
  refresh: KeyedMutator<Search>,
  setConnected: (connected: boolean) => void,
): () => void {
  const events = new EventSource(`/api/searches/${encodeURIComponent(id)}/events`);
  events.addEventListener('progress', (event: MessageEvent<string>) => {
    const progress = readProgress(event.data);
    if (!progress) return;
    void refresh((search) => (search ? withProgress(search, progress) : search), { revalidate: false });
  });
  events.addEventListener('state', () => void refresh());
  events.onopen = () => {
    setConnected(true);
    // Whatever was said while nobody listened.
    void refresh();
  };
  events.onerror = () => setConnected(false);
  return () => {
    events.close();
    setConnected(true);
  };
}

/** Starts a search for the brief as saved. @throws Problem 409 when one of yours is still running */
export async function startSearch(briefId: string): Promise<Search> {
  const search = await answer(api.POST('/api/briefs/{id}/searches', { params: { path: { id: briefId } } }));
  await mutate(keyOf(search.id), search, { revalidate: false });
  await refreshBrief(briefId);
  return search;
}

/** Asks a running search to end with the best found so far. */
export async function stopSearch(id: string): Promise<void> {
  await answer(api.POST('/api/searches/{id}/stop', { params: { path: { id } } }));
  await mutate(keyOf(id));
}
