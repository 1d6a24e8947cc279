import { readSheet } from 'read-excel-file/node';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type BriefDto } from '../src/briefs/dto/brief.dto.js';
import { type SearchDto } from '../src/option-searches/dto/search.dto.js';
import { type SearchSummaryDto } from '../src/option-searches/dto/search-summary.dto.js';
import { newBrief, newRequirement, slowRequirement } from '../src/testing/new-brief.js';
import { type BomDto } from '../src/trains/dto/bom.dto.js';
import { type TrainDto } from '../src/trains/dto/train.dto.js';
import { type Client, startServer, type TestServer } from './harness.js';

let server: TestServer;
let designer: Client;
let brief: BriefDto;
let search: SearchDto;
let train: TrainDto;

beforeAll(async () => {
  server = await startServer();
  designer = await server.as('designer');
});
afterAll(() => server.close());

const pinPath = (id: string, key: string) => `/api/briefs/${id}/pins/${encodeURIComponent(key)}`;

describe('from a brief to a bill of materials', () => {
  it('writes a brief', async () => {
    const requirement = newRequirement({
      ratio: { target: '37.5', tolerancePercent: '1' },
      stages: { min: 1, max: 3 },
      duty: { inputSpeed: 1400, outputTorque: 8 },
    });
    const answer = await designer.post<BriefDto>(
      '/api/briefs',
      newBrief({ title: 'Kelp-line winch', requirement }),
    );
    expect(answer.status).toBe(201);
    brief = answer.body;
    expect(brief).toMatchObject({
      title: 'Kelp-line winch',
      owner: 'Test designer',
      standing: 'open',
      version: 1,
    });
  });

  it('searches, and the stream tells state after state until it is done', async () => {
    const started = await designer.post<SearchDto>(`/api/briefs/${brief.id}/searches`);
    expect(started.status).toBe(201);
    const states: string[] = [];
    for await (const { event, data } of designer.events(`/api/searches/${started.body.id}/events`)) {
      if (event === 'state') states.push((data as SearchSummaryDto).state);
    }
    expect(states.at(-1)).toBe('done');
    expect(states.every((state) => ['queued', 'running', 'done'].includes(state))).toBe(true);
    const done = await designer.get<SearchDto>(`/api/searches/${started.body.id}`);
    search = done.body;
    expect(search.outcome?.options.length).toBeGreaterThan(0);
    expect(search.outcome?.whyNot.some(({ stages }) => stages === 1)).toBe(true);
  });

  it('gives a page that comes back later the end at once', async () => {
    const heard: unknown[] = [];
    for await (const event of designer.events(`/api/searches/${search.id}/events`)) heard.push(event);
    expect(heard).toEqual([
      { event: 'state', data: expect.objectContaining({ id: search.id, state: 'done' }) as unknown },
    ]);
  });

  it('pins options and takes a pin off', async () => {
    const keys = (search.outcome?.options ?? []).slice(0, 2).map(({ key }) => key);
    for (const key of keys) {
      const pinned = await designer.put<BriefDto>(pinPath(brief.id, key), { searchId: search.id });
      expect(pinned.status).toBe(200);
      brief = pinned.body;
    }
    expect(brief.pins.map(({ key }) => key)).toEqual(keys);
    const fewer = await designer.delete<BriefDto>(pinPath(brief.id, keys[1] ?? ''));
    expect(fewer.body.pins.map(({ key }) => key)).toEqual(keys.slice(0, 1));
  });

  it('adopts the pin as a train', async () => {
    const [pin] = brief.pins;
    const answer = await designer.post<TrainDto>('/api/trains', {
      briefId: brief.id,
      searchId: pin?.searchId,
      optionKey: pin?.key,
    });
    expect(answer.status).toBe(201);
    train = answer.body;
    expect(train).toMatchObject({
      code: 'T-0001',
      revision: 'A',
      state: 'working',
      title: 'Kelp-line winch',
    });
    const speeds = train.figures.shafts.map(({ speed }) => speed ?? 0);
    expect(speeds[0]).toBe(1400);
    expect(speeds.at(-1)).toBeCloseTo(1400 / train.figures.ratio.value, 9);
    const list = await designer.get<{ items: { code: string }[] }>('/api/trains?mine=true&sort=-updatedAt');
    expect(list.body.items.map(({ code }) => code)).toEqual(['T-0001']);
  });

  it('lists what to make and buy, for everybody who may look', async () => {
    const viewer = await server.as('viewer');
    const { body } = await viewer.get<BomDto>(`/api/trains/${train.code}/bom`);
    const gears = body.lines.filter(({ kind }) => kind === 'gear' || kind === 'pinion-shaft');
    // A pinion cut on its shaft names the shaft too: `Stage 3 pinion, shaft 2`.
    const places = gears.flatMap(({ source }) => source).map((source) => source.split(',', 1)[0]);
    const wanted = train.spec.stages.flatMap((_, stage) => [
      `Stage ${stage + 1} pinion`,
      `Stage ${stage + 1} wheel`,
    ]);
    expect(places.sort()).toEqual(wanted.sort());
    const bearings = body.lines.filter(({ kind }) => kind === 'bearing');
    const bearingCount = bearings.reduce((sum, { quantity }) => sum + quantity, 0);
    expect(bearingCount).toBe(2 * train.spec.shafts.length);
    expect(bearings.every(({ flags }) => flags.includes('size not checked'))).toBe(true);
  });

  it('lets a purchaser download the workbook', async () => {
    const purchaser = await server.as('purchaser');
    const answer = await purchaser.get(`/api/trains/${train.code}/bom.xlsx`);
    expect(answer.status).toBe(200);
    expect(answer.headers.get('content-disposition')).toBe('attachment; filename="T-0001-A-bom.xlsx"');
    const { body } = await purchaser.get<BomDto>(`/api/trains/${train.code}/bom`);
    const rows = await readSheet(answer.bytes, 'BOM');
    expect(rows.filter((row) => typeof row[0] === 'number')).toHaveLength(body.lines.length);
  });

  it('records who did what', async () => {
    const viewer = await server.as('viewer');
    const ofBrief = await viewer.get<{ items: { action: string; by: string }[] }>(
      `/api/briefs/${brief.id}/changes`,
    );
    expect(ofBrief.body.items.map(({ action }) => action)).toEqual([
      'unpinned',
      'pinned',
      'pinned',
      'search done',
      'search started',
      'added',
    ]);
    expect(ofBrief.body.items.every(({ by }) => by === 'Test designer')).toBe(true);
    const ofTrain = await viewer.get<{ items: { action: string }[] }>(`/api/trains/${train.code}/changes`);
    expect(ofTrain.body.items.map(({ action }) => action)).toEqual(['adopted']);
  });
});

describe('who may do what', () => {
  it('lets a viewer look and nothing else', async () => {
    const viewer = await server.as('viewer');
    for (const path of [
      '/api/briefs',
      `/api/briefs/${brief.id}`,
      `/api/briefs/${brief.id}/searches`,
      `/api/searches/${search.id}`,
      '/api/trains',
      `/api/trains/${train.code}`,
    ]) {
      expect((await viewer.get(path)).status, path).toBe(200);
    }
    const key = search.outcome?.options[0]?.key ?? '';
    const refused = [
      await viewer.get(`/api/trains/${train.code}/bom.xlsx`),
      await viewer.post('/api/briefs', newBrief()),
      await viewer.patch(`/api/briefs/${brief.id}`, { version: 1, title: 'Mine now' }),
      await viewer.post(`/api/briefs/${brief.id}/searches`),
      await viewer.post(`/api/searches/${search.id}/stop`),
      await viewer.put(pinPath(brief.id, key), { searchId: search.id }),
      await viewer.delete(pinPath(brief.id, key)),
      await viewer.post('/api/trains', { briefId: brief.id, searchId: search.id, optionKey: key }),
      await viewer.patch(`/api/trains/${train.code}`, { version: 1, title: 'Mine now' }),
    ];
    expect(refused.map(({ status }) => status)).toEqual(refused.map(() => 403));
  });

  it('lets nobody in who is not signed in', async () => {
    const nobody = server.anonymous();
    expect((await nobody.get('/api/briefs')).status).toBe(401);
    expect((await nobody.get(`/api/searches/${search.id}/events`)).status).toBe(401);
    expect((await nobody.get(`/api/trains/${train.code}/bom.xlsx`)).status).toBe(401);
  });
});

describe('edits that meet', () => {
  it('answers 409 with the present brief and the present train', async () => {
    const { body: fresh } = await designer.get<BriefDto>(`/api/briefs/${brief.id}`);
    const first = await designer.patch<BriefDto>(`/api/briefs/${brief.id}`, {
      version: fresh.version,
      note: 'first',
    });
    expect(first.status).toBe(200);
    const late = await designer.patch<{ code: string; current: BriefDto }>(`/api/briefs/${brief.id}`, {
      version: fresh.version,
      note: 'late',
    });
    expect(late.status).toBe(409);
    expect(late.body).toMatchObject({
      code: 'changed-meanwhile',
      current: { note: 'first', version: fresh.version + 1 },
    });
    const patch = { version: 1, note: 'once' };
    expect((await designer.patch(`/api/trains/${train.code}`, patch)).status).toBe(200);
    const again = await designer.patch(`/api/trains/${train.code}`, patch);
    expect(again.status).toBe(409);
    expect(again.body).toMatchObject({ current: { code: train.code, note: 'once', version: 2 } });
  });

  it('runs one search a person, names it, and stops it for anybody who edits', async () => {
    const slow = newBrief({ title: 'A very wide search', requirement: slowRequirement() });
    const { body: wide } = await designer.post<BriefDto>('/api/briefs', slow);
    const { body: running } = await designer.post<SearchDto>(`/api/briefs/${wide.id}/searches`);
    const second = await designer.post<{ message: string }>(`/api/briefs/${brief.id}/searches`);
    expect(second.status).toBe(409);
    expect(second.body).toMatchObject({ code: 'search-running', searchId: running.id, briefId: wide.id });
    expect(second.body.message).toContain('A very wide search');
    const colleague = await server.asAnother('designer');
    const events = colleague.events(`/api/searches/${running.id}/events`);
    const progress: { settled: number }[] = [];
    let last = '';
    for await (const { event, data } of events) {
      if (event === 'progress') progress.push(data as { settled: number });
      if (event === 'state') last = (data as SearchSummaryDto).state;
      if (progress.length === 2) {
        expect((await colleague.post(`/api/searches/${running.id}/stop`)).status).toBe(202);
      }
    }
    expect(last).toBe('stopped');
    const after = await designer.post(`/api/briefs/${brief.id}/searches`);
    expect(after.status).toBe(201);
    for await (const event of designer.events(`/api/searches/${(after.body as SearchDto).id}/events`))
      void event;
  });
});
