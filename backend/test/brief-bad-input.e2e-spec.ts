import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type BriefDto } from '../src/briefs/dto/brief.dto.js';
import { type SearchDto } from '../src/option-searches/dto/search.dto.js';
import { impossibleRequirement, newBrief, newRequirement } from '../src/testing/new-brief.js';
import { type Client, startServer, type TestServer } from './harness.js';

interface Refusal {
  message: string;
  errors?: { field: string; value: unknown; limit?: unknown; message: string }[];
}

let server: TestServer;
let designer: Client;

beforeAll(async () => {
  server = await startServer();
  designer = await server.as('designer');
});
afterAll(() => server.close());

const post = (body: unknown) => designer.post<Refusal>('/api/briefs', body);
const withRequirement = (changes: object) => ({
  ...newBrief(),
  requirement: { ...newRequirement(), ...changes },
});
const ratio = (target: unknown, tolerancePercent: unknown = '1') =>
  withRequirement({ ratio: { target, tolerancePercent } });

describe('a bad brief is refused with the field and a message, and nothing is written', () => {
  it.each<[string, unknown, string]>([
    ['ratio 0', ratio('0'), 'requirement.ratio.target'],
    ['ratio below 0', ratio('-37.5'), 'requirement.ratio.target'],
    ['ratio NaN', ratio('NaN'), 'requirement.ratio.target'],
    ['ratio 1e9', ratio('1e9'), 'requirement.ratio.target'],
    ['ratio null, as NaN arrives in JSON', ratio(null), 'requirement.ratio.target'],
    ['tolerance in words', ratio('37.5', 'tight'), 'requirement.ratio.tolerancePercent'],
    [
      'pinion range reversed',
      withRequirement({ teeth: { pinion: { min: 30, max: 12 }, wheel: { min: 20, max: 90 } } }),
      'requirement.teeth.pinion.max',
    ],
    [
      'half a tooth',
      withRequirement({ teeth: { pinion: { min: 12.5, max: 30 }, wheel: { min: 20, max: 90 } } }),
      'requirement.teeth.pinion.min',
    ],
    ['no modules', withRequirement({ modules: [] }), 'requirement.modules'],
    ['no requirement', { title: 'Empty' }, 'requirement'],
    ['a requirement that is text', { ...newBrief(), requirement: '37.5' }, 'requirement'],
    ['a requirement that is a list', { ...newBrief(), requirement: [] }, 'requirement'],
    ['a requirement that is null', { ...newBrief(), requirement: null }, 'requirement'],
    ['no title', { ...newBrief(), title: '   ' }, 'title'],
    ['a title of 100,000 characters', { ...newBrief(), title: 'x'.repeat(100_000) }, 'title'],
    ['a note of 100,000 characters', { ...newBrief(), note: 'x'.repeat(100_000) }, 'note'],
    ['a note that is a number', { ...newBrief(), note: 5 }, 'note'],
    ['an unknown field', { ...newBrief(), colour: 'green' }, 'colour'],
    ['an unknown field inside', withRequirement({ colour: 'green' }), 'requirement.colour'],
    [
      'an unknown field further inside',
      withRequirement({ envelope: { depth: 3 } }),
      'requirement.envelope.depth',
    ],
    ['a load, which is not rated yet', withRequirement({ load: { outputTorque: 45 } }), 'requirement.load'],
    ['folded', withRequirement({ arrangement: 'folded' }), 'requirement.arrangement'],
    ['best-contact', withRequirement({ shiftPolicy: 'best-contact' }), 'requirement.shiftPolicy'],
    ['stock only', withRequirement({ source: 'stock-only' }), 'requirement.source'],
  ])('%s', async (_, body, field) => {
    const before = await designer.get<{ total: number }>('/api/briefs');
    const answer = await post(body);
    expect(answer.status).toBe(400);
    expect(answer.body.errors?.map((error) => error.field)).toContain(field);
    expect(answer.body.errors?.every(({ message }) => message.length > 10)).toBe(true);
    expect(JSON.stringify(answer.body).length).toBeLessThan(3000);
    expect((await designer.get<{ total: number }>('/api/briefs')).body.total).toBe(before.body.total);
  });

  it('names the limit of a text that is too long', async () => {
    const { body } = await post({ ...newBrief(), title: 'x'.repeat(100_000) });
    expect(body.errors?.find(({ field }) => field === 'title')?.limit).toBe(200);
  });

  it('stands a body that is no JSON, and one that is too large', async () => {
    expect((await post('{"title": ')).status).toBe(400);
    expect((await post({ ...newBrief(), note: 'x'.repeat(1_200_000) })).status).toBe(413);
  });
});

describe('a brief that is odd but no mistake', () => {
  async function search(requirement: object): Promise<SearchDto> {
    const { body: brief } = await designer.post<BriefDto>('/api/briefs', { ...newBrief(), requirement });
    const { body: started } = await designer.post<SearchDto>(`/api/briefs/${brief.id}/searches`);
    for await (const event of designer.events(`/api/searches/${started.id}/events`)) void event;
    return (await designer.get<SearchDto>(`/api/searches/${started.id}`)).body;
  }

  it('that nobody can meet: done, no options, and why', async () => {
    const { state, outcome, message } = await search(impossibleRequirement());
    expect(state).toBe('done');
    expect(message).toBeNull();
    expect(outcome?.options).toEqual([]);
    expect(outcome?.whyNot.length).toBeGreaterThan(0);
  });

  it('with a box smaller than one gear: done, no options, and the box named', async () => {
    const { state, outcome } = await search(
      newRequirement({ envelope: { length: 5, width: 5, height: 5, wall: 1 } }),
    );
    expect(state).toBe('done');
    expect(outcome?.options).toEqual([]);
    expect(outcome?.whyNot.every(({ message }) => message.length > 10)).toBe(true);
  });

  it('with no tolerance at all: only the exact ratio counts', async () => {
    const { outcome } = await search(newRequirement({ ratio: { target: '12', tolerancePercent: '0' } }));
    expect(outcome?.options.every((option) => option.ratio.errorPercent === 0)).toBe(true);
    expect(outcome?.options.length).toBeGreaterThan(0);
  });
});

describe('unknown things', () => {
  it.each(['abc', '0', '-1', '1.5', '999999', '1%27%20OR%201=1', '9'.repeat(60)])(
    'id %s → 404',
    async (id) => {
      for (const path of [
        `/api/briefs/${id}`,
        `/api/briefs/${id}/changes`,
        `/api/briefs/${id}/searches`,
        `/api/searches/${id}`,
        `/api/searches/${id}/events`,
      ]) {
        expect((await designer.get(path)).status, path).toBe(404);
      }
      expect((await designer.post(`/api/briefs/${id}/searches`)).status).toBe(404);
      expect((await designer.post(`/api/searches/${id}/stop`)).status).toBe(404);
      expect((await designer.patch(`/api/briefs/${id}`, { version: 1 })).status).toBe(404);
    },
  );

  it('trains → 404', async () => {
    for (const code of ['T-9999', 't', '%00', 'T-0001%2F..']) {
      for (const tail of ['', '/bom', '/bom.xlsx', '/changes']) {
        expect((await designer.get(`/api/trains/${code}${tail}`)).status, code + tail).toBe(404);
      }
      expect((await designer.patch(`/api/trains/${code}`, { version: 1 })).status).toBe(404);
    }
  });

  it('lists refuse what they cannot do', async () => {
    for (const query of [
      'size=101',
      'page=0',
      'sort=spec',
      'mine=perhaps',
      'standing=lost',
      'colour=green',
    ]) {
      expect((await designer.get(`/api/briefs?${query}`)).status, query).toBe(400);
    }
    for (const query of ['size=x', 'sort=code,title,owner', 'revisionState=issued']) {
      expect((await designer.get(`/api/trains?${query}`)).status, query).toBe(400);
    }
  });
});
