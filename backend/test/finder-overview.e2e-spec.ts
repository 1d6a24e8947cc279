import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newGear } from '../src/testing/new-part.js';
import { startServer, type Client, type TestServer } from './harness.js';

interface Found {
  parts: { number: string; description: string }[];
  briefs: { id: string; code: string; title: string }[];
  trains: { code: string; title: string }[];
  suppliers: { code: string; name: string }[];
}
interface Overview {
  counts: { briefs: number; trains: number; parts: number; suppliers: number };
  briefs: { code: string }[];
  trains: { code: string }[];
  draftParts: { number: string; standing: string }[];
}

const REQUIREMENT = {
  ratio: { target: '37.5', tolerancePercent: '1' },
  stages: { min: 2, max: 2 },
  teeth: { pinion: { min: 17, max: 24 }, wheel: { min: 40, max: 150 } },
  modules: [1],
  objective: 'ratio-error',
};

let server: TestServer;
let librarian: Client;
let designer: Client;
let viewer: Client;
beforeAll(async () => {
  server = await startServer();
  librarian = await server.as('librarian');
  designer = await server.as('designer');
  viewer = await server.as('viewer');
  for (let index = 0; index < 12; index++) {
    const number = `KELP-${String(index).padStart(2, '0')}`;
    await librarian.post('/api/parts', newGear({ number, standing: index < 11 ? 'draft' : 'cleared' }));
  }
  await designer.post('/api/briefs', { title: 'Kelp-line winch', note: '', requirement: REQUIREMENT });
});
afterAll(() => server.close());

const find = async (text: string): Promise<Found> =>
  (await viewer.get<Found>(`/api/finder?text=${encodeURIComponent(text)}`)).body;

describe('the search of the header', () => {
  it('finds parts and briefs, at most eight of a kind', async () => {
    const found = await find('kelp');
    expect(found.parts).toHaveLength(8);
    expect(found.parts[0]?.number).toBe('KELP-00');
    expect(found.briefs).toEqual([expect.objectContaining({ title: 'Kelp-line winch' })]);
    expect(found.trains).toEqual([]);
  });

  it('finds suppliers by name or code for people who read prices, active ones first, and for nobody else', async () => {
    const purchaser = await server.as('purchaser');
    const codes: string[] = [];
    for (const name of ['Anchor Kelp Steel', 'Zinc Kelp Works']) {
      codes.push(
        (await purchaser.post<{ code: string }>('/api/suppliers', { name, currency: 'EUR' })).body.code,
      );
    }
    await purchaser.patch(`/api/suppliers/${codes[0]}`, { version: 1, standing: 'closed' });
    const { body } = await purchaser.get<Found>('/api/finder?text=kelp');
    expect(body.suppliers).toEqual([
      { code: codes[1], name: 'Zinc Kelp Works' },
      { code: codes[0], name: 'Anchor Kelp Steel' },
    ]);
    const byCode = await purchaser.get<Found>(`/api/finder?text=${codes[0]?.toLowerCase()}`);
    expect(byCode.body.suppliers.map(({ code }) => code)).toEqual([codes[0]]);
    expect((await find('kelp')).suppliers).toEqual([]);
    expect((await purchaser.get<Overview>('/api/overview')).body.counts.suppliers).toBe(1);
    expect((await viewer.get<Overview>('/api/overview')).body.counts.suppliers).toBe(0);
  });

  it('finds nothing for blanks, and takes any sign as it is', async () => {
    const nothing = { parts: [], briefs: [], trains: [], suppliers: [] };
    for (const text of [
      '   ',
      '%',
      '_',
      '"',
      "';--",
      '\u0000\u0001abc',
      '\u0000',
      '\ud83d\ude00\ud83d\ude00\ud83d\ude00',
    ]) {
      expect(await find(text), JSON.stringify(text)).toEqual(nothing);
    }
  });

  it.each(['', `?text=${'x'.repeat(201)}`])(
    'refuses no text and one that is too long (case %#)',
    async (query) => {
      expect((await viewer.get(`/api/finder${query}`)).status).toBe(400);
    },
  );

  it('is for signed-in people', async () => {
    expect((await server.anonymous().get('/api/finder?text=kelp')).status).toBe(401);
  });
});

describe('the overview', () => {
  it('shows a librarian the drafts to clear, the last changed first', async () => {
    await librarian.patch('/api/parts/KELP-03', { version: 1, note: 'Bore measured' });
    const { body } = await librarian.get<Overview>('/api/overview');
    expect(body.counts).toEqual({ parts: 12, briefs: 1, trains: 0, suppliers: 1 });
    expect(body.draftParts).toHaveLength(10);
    expect(body.draftParts[0]?.number).toBe('KELP-03');
    expect(new Set(body.draftParts.map(({ standing }) => standing))).toEqual(new Set(['draft']));
    expect(body.briefs).toEqual([]);
  });

  it('shows a designer their own briefs and no drafts, a viewer nothing but the counts', async () => {
    const mine = (await designer.get<Overview>('/api/overview')).body;
    expect(mine.briefs).toHaveLength(1);
    expect(mine.draftParts).toEqual([]);
    const looking = (await viewer.get<Overview>('/api/overview')).body;
    expect(looking).toEqual({
      counts: { ...mine.counts, suppliers: 0 },
      briefs: [],
      trains: [],
      draftParts: [],
    });
  });
});
