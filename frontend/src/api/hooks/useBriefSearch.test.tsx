import { act, renderHook, waitFor } from '@testing-library/react';
import type { ReactNode } from 'react';
import { SWRConfig } from 'swr';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { newSearch } from '../../testing/briefs';
import { pretendServer } from '../../testing/server';
import { readProgress, withProgress } from './searchEvents';
import { useBriefSearch } from './useBriefSearch';

const PROGRESS = { phase: 'search', stages: 2, settled: 10, total: 100, found: 3 };

describe('progress events', () => {
  it('reads what was agreed and nothing else', () => {
    expect(readProgress(JSON.stringify(PROGRESS))).toEqual(PROGRESS);
    for (const bad of [
      '',
      '{',
      'null',
      '[]',
      '{"phase":"x"}',
      '{"phase":1,"stages":2,"settled":1,"total":1,"found":1}',
    ]) {
      expect(readProgress(bad)).toBeNull();
    }
  });

  it('never brings a search back to life that has ended', () => {
    const done = newSearch({ state: 'done' });
    expect(withProgress(done, PROGRESS)).toBe(done);
    expect(withProgress(newSearch({ state: 'queued' }), PROGRESS)).toMatchObject({
      state: 'running',
      progress: PROGRESS,
    });
  });
});

/** Stands in for the browser's event source, which the test environment lacks. */
class FakeEvents extends EventTarget {
  static opened: FakeEvents[] = [];
  onopen: (() => void) | null = null;
  onerror: (() => void) | null = null;
  closed = false;

  constructor(readonly url: string) {
    super();
    FakeEvents.opened.push(this);
  }

  close(): void {
    this.closed = true;
  }

  say(type: string, data: unknown): void {
    this.dispatchEvent(new MessageEvent(type, { data: JSON.stringify(data) }));
  }
}

function Fresh({ children }: { children: ReactNode }) {
  return <SWRConfig value={{ provider: () => new Map(), dedupingInterval: 0 }}>{children}</SWRConfig>;
}

describe('useBriefSearch', () => {
  beforeEach(() => {
    FakeEvents.opened = [];
    vi.stubGlobal('EventSource', FakeEvents);
  });

  const follow = async (answers: Parameters<typeof pretendServer>[0]) => {
    const server = pretendServer(answers);
    const hook = renderHook(() => useBriefSearch('11'), { wrapper: Fresh });
    await waitFor(() => expect(FakeEvents.opened).toHaveLength(1));
    return { ...server, hook, events: FakeEvents.opened[0] as FakeEvents };
  };

  it('follows the progress without asking the server again', async () => {
    const { hook, events, sent } = await follow({ 'GET /api/searches/11': { body: newSearch() } });
    expect(events.url).toBe('/api/searches/11/events');
    act(() => events.say('progress', PROGRESS));
    await waitFor(() => expect(hook.result.current.data?.progress).toEqual(PROGRESS));
    expect(sent).toHaveLength(1);
  });

  it('reads the outcome when the state changes, and stops listening', async () => {
    let state: 'running' | 'done' = 'running';
    const { hook, events } = await follow({ 'GET /api/searches/11': () => ({ body: newSearch({ state }) }) });
    state = 'done';
    act(() => events.say('state', { state }));
    await waitFor(() => expect(hook.result.current.data?.state).toBe('done'));
    await waitFor(() => expect(events.closed).toBe(true));
  });

  it('says when the connection is lost and reads the state again when it is back', async () => {
    const { hook, events, sent } = await follow({ 'GET /api/searches/11': { body: newSearch() } });
    act(() => events.onerror?.());
    expect(hook.result.current.connected).toBe(false);
    act(() => events.onopen?.());
    expect(hook.result.current.connected).toBe(true);
    await waitFor(() => expect(sent.length).toBeGreaterThan(1));
  });

  it('stops listening when the page is left', async () => {
    const { hook, events } = await follow({ 'GET /api/searches/11': { body: newSearch() } });
    hook.unmount();
    expect(events.closed).toBe(true);
  });
});
