import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newGear } from '../src/testing/new-part.js';
import { startServer, type Client, type TestServer } from './harness.js';

interface Part {
  number: string;
  kind: string;
  description: string;
  standing: string;
  successorNumber: string | null;
  attributes: Record<string, unknown>;
  computed: Record<string, unknown> | null;
  version: number;
}
interface Page {
  items: Part[];
  total: number;
  page: number;
  size: number;
}
interface Refusal {
  statusCode: number;
  code: string;
  message: string;
  errors?: { field: string; value: unknown; limit?: number | string; message: string }[];
  requestId: string;
  current?: Part;
}

let server: TestServer;
let librarian: Client;
let viewer: Client;
beforeAll(async () => {
  server = await startServer();
  librarian = await server.as('librarian');
  viewer = await server.as('viewer');
});
afterAll(() => server.close());

async function add(changes: Parameters<typeof newGear>[0] = {}): Promise<Part> {
  const { status, body } = await librarian.post<Part>('/api/parts', newGear(changes));
  expect(status).toBe(201);
  return body;
}

const numbersOf = async (query: string): Promise<string[]> =>
  (await viewer.get<Page>(`/api/parts?${query}`)).body.items.map(({ number }) => number);

describe('one part', () => {
  it('is added as a draft with a running number, read by everybody, and shows its geometry', async () => {
    const added = await add({ attributes: { teeth: 24, module: 3 } });
    expect(added).toMatchObject({ standing: 'draft', version: 1 });
    expect(added.number).toMatch(/^KW-\d{5}$/);
    const { body } = await viewer.get<Part>(`/api/parts/${added.number.toLowerCase()}`);
    expect(body).toEqual(added);
    // Kohara, Gear Technical Reference, standard spur gears (from memory): m 3, z 24 has d 72 and d_a 78.
    expect(body.computed).toMatchObject({ referenceDiameter: 72, tipDiameter: 78, rootDiameter: 64.5 });
  });

  it('has no geometry when it has no teeth', async () => {
    const attributes = { bore: 20, outerDiameter: 47, width: 14, type: 'deep groove ball' };
    const bearing = { kind: 'bearing', description: 'Bearing 20 × 47 × 14', attributes };
    const { status, body } = await librarian.post<Part>('/api/parts', bearing);
    expect(status).toBe(201);
    expect(body.computed).toBeNull();
    expect(body.attributes).toEqual({ ...attributes, dynamicLoadRating: null, staticLoadRating: null });
  });

  it('answers 404 in plain words for an unknown number', async () => {
    const { status, body } = await viewer.get<Refusal>('/api/parts/KW-99999');
    expect(status).toBe(404);
    expect(body).toMatchObject({ code: 'not-found', statusCode: 404 });
    expect(body.message).toContain('KW-99999');
    const patched = await librarian.patch<Refusal>('/api/parts/KW-99999', { version: 1, note: 'x' });
    expect(patched.status).toBe(404);
    expect((await viewer.get<Refusal>('/api/parts/KW-99999/changes')).status).toBe(404);
  });

  it('is refused with a number that another part has, naming that part', async () => {
    const { number } = await add({ number: 'VENT-2', description: 'Vent drive wheel' });
    const { status, body } = await librarian.post<Refusal>('/api/parts', newGear({ number: 'vent-2' }));
    expect(status).toBe(409);
    expect(body.code).toBe('number-taken');
    expect(body.message).toContain(number);
    expect(body.message).toContain('Vent drive wheel');
    expect(body.errors?.[0]?.field).toBe('number');
  });

  it.each(['has space', '-1', 'a/b', 'ж-1', 'facets', 'x'.repeat(41)])(
    'is refused the number “%s”, and the rule is said',
    async (number) => {
      const { status, body } = await librarian.post<Refusal>('/api/parts', newGear({ number }));
      expect(status).toBe(400);
      expect(body.errors?.map(({ field }) => field)).toEqual(['number']);
    },
  );

  it('names every attribute at fault, its value and the limit', async () => {
    const { status, body } = await librarian.post<Refusal>(
      '/api/parts',
      newGear({ attributes: { teeth: 3, bore: -1, spokes: 5 } }),
    );
    expect(status).toBe(400);
    const issues = new Map(body.errors?.map((issue) => [issue.field, issue]));
    expect([...issues.keys()].sort()).toEqual(['attributes.bore', 'attributes.spokes', 'attributes.teeth']);
    expect(issues.get('attributes.teeth')).toMatchObject({ value: 3, limit: 4 });
    expect(issues.get('attributes.bore')).toMatchObject({ value: -1, limit: 0 });
  });

  it('is refused teeth that nobody can cut, in the words of the geometry', async () => {
    // R of the formula (published check values): a tooth of z 12 is pointed from x 0.820 on.
    const pointed = newGear({ attributes: { teeth: 12, profileShift: 0.9 } });
    const { status, body } = await librarian.post<Refusal>('/api/parts', pointed);
    expect(status).toBe(400);
    expect(body.errors?.[0]?.field).toBe('attributes.profileShift');
    expect(body.errors?.[0]?.message).toContain('pointed');
  });

  it.each([
    ['description', newGear({ description: 'x'.repeat(100_000) }), 200],
    ['note', newGear({ note: 'x'.repeat(100_000) }), 10_000],
    ['attributes.heatTreatment', newGear({ attributes: { heatTreatment: 'x'.repeat(100_000) } }), 100],
  ])('is refused a text of 100,000 characters as %s, naming the limit', async (field, input, limit) => {
    const { status, body } = await librarian.post<Refusal>('/api/parts', input);
    expect(status).toBe(400);
    expect(body.errors).toEqual([expect.objectContaining({ field, limit })]);
    expect(JSON.stringify(body).length).toBeLessThan(1000);
  });

  it.each([
    ['text that is no number', { mass: '0.5' }, 'mass'],
    ['an unknown kind', { kind: 'sprocket' }, 'kind'],
    ['a blank description', { description: '   ' }, 'description'],
    ['a line break in the description', { description: 'one\ntwo' }, 'description'],
    ['withdrawn from the start', { standing: 'withdrawn' }, 'standing'],
    ['an unknown field', { price: 3 }, 'price'],
    ['attributes that are a list', { attributes: [1] }, 'attributes'],
  ])('is refused %s', async (_, changes, field) => {
    const { status, body } = await librarian.post<Refusal>('/api/parts', { ...newGear(), ...changes });
    expect(status).toBe(400);
    expect(body.errors?.[0]?.field).toBe(field);
  });

  it('is shown but not changed by people who may only look', async () => {
    const { number } = await add();
    for (const role of ['viewer', 'designer', 'purchaser'] as const) {
      const client = await server.as(role);
      expect((await client.get(`/api/parts/${number}`)).status).toBe(200);
      expect((await client.post('/api/parts', newGear())).status).toBe(403);
      expect((await client.patch(`/api/parts/${number}`, { version: 1, note: 'x' })).status).toBe(403);
    }
    expect((await server.anonymous().get('/api/parts')).status).toBe(401);
  });

  it('goes from draft to withdrawn with a successor, and every step is on record', async () => {
    const [old, replacement] = [await add(), await add({ standing: 'cleared' })];
    const edit = (version: number, changes: object) =>
      librarian.patch<Part>(`/api/parts/${old.number}`, { version, ...changes });
    expect((await edit(1, { standing: 'cleared' })).body.standing).toBe('cleared');
    const withdrawn = await edit(2, { standing: 'withdrawn', successorNumber: replacement.number });
    expect(withdrawn.body).toMatchObject({ standing: 'withdrawn', successorNumber: replacement.number });
    const { body } = await viewer.get<{ items: { action: string; by: string; after: object }[] }>(
      `/api/parts/${old.number}/changes`,
    );
    expect(body.items.map(({ action }) => action)).toEqual(['withdrew', 'cleared', 'added']);
    expect(body.items[0]?.after).toEqual({
      standing: 'withdrawn',
      successorNumber: replacement.number,
    });
  });

  it('answers 409 with the present state to an edit of an older version, and keeps that state', async () => {
    const { number } = await add();
    const path = `/api/parts/${number}`;
    await librarian.patch(path, { version: 1, description: 'Seen by nobody yet' });
    const { status, body } = await librarian.patch<Refusal>(path, { version: 1, description: 'Stale' });
    expect(status).toBe(409);
    expect(body.code).toBe('changed-meanwhile');
    expect(body.current).toMatchObject({ number, version: 2, description: 'Seen by nobody yet' });
    expect((await viewer.get<Part>(path)).body.description).toBe('Seen by nobody yet');
  });

  it('keeps its number and kind', async () => {
    const { number } = await add();
    const { status, body } = await librarian.patch<Refusal>(`/api/parts/${number}`, {
      version: 1,
      number: 'OTHER',
      kind: 'seal',
    });
    expect(status).toBe(400);
    expect(body.errors?.map(({ field }) => field).sort()).toEqual(['kind', 'number']);
  });
});

describe('the list', () => {
  beforeAll(async () => {
    // Only these are of brass, so that every query of this block can be narrowed to them.
    const rows = [
      { number: 'LIST-1', teeth: 20, module: 1, bore: 6 },
      { number: 'LIST-2', teeth: 40, module: 1, bore: 8 },
      { number: 'LIST-3', teeth: 40, module: 2, bore: 10 },
      { number: 'LIST-4', teeth: 60, module: 2, bore: 12, helixAngleDeg: 15, hand: 'left' },
      { number: 'LIST-5', teeth: 80, module: 0.5, bore: 5, helixAngleDeg: 15, hand: 'right' },
    ];
    for (const { number, ...attributes } of rows) {
      await add({ number, material: 'Brass', description: `Turntable gear ${attributes.teeth}`, attributes });
    }
  });

  it('sorts by two keys, up and down', async () => {
    expect(await numbersOf('material=brass&sort=-teeth,module')).toEqual([
      'LIST-5',
      'LIST-4',
      'LIST-2',
      'LIST-3',
      'LIST-1',
    ]);
    expect(await numbersOf('material=Brass&sort=module,-teeth')).toEqual([
      'LIST-5',
      'LIST-2',
      'LIST-1',
      'LIST-4',
      'LIST-3',
    ]);
  });

  it.each([
    ['kind=gear&teethMin=40&teethMax=60', ['LIST-2', 'LIST-3', 'LIST-4']],
    ['module=2', ['LIST-3', 'LIST-4']],
    ['helixAngleDeg=15&hand=left', ['LIST-4']],
    ['helixAngleDeg=0&boreMin=8', ['LIST-2', 'LIST-3']],
    ['text=table%20GEAR%2060', ['LIST-4']],
    ['text=list-3', ['LIST-3']],
    ['text=%2580', []],
    ['kind=seal', []],
  ])('filters by %s', async (filter, expected) => {
    expect(await numbersOf(`material=Brass&sort=number&${filter}`)).toEqual(expected);
  });

  it('finds a text with signs that mean something to a database as what it is', async () => {
    await add({ number: 'SIGNS-1', description: 'Gear "50%" AND_OR (x*y)' });
    for (const text of ['"50%"', 'AND_OR', '(x*y)', '%"']) {
      expect(await numbersOf(`text=${encodeURIComponent(text)}`)).toEqual(['SIGNS-1']);
    }
    for (const text of ["'; DROP TABLE part; --", 'NEAR(', '"""', '%', '_', '\u0000abc']) {
      expect((await viewer.get(`/api/parts?text=${encodeURIComponent(text)}`)).status).toBe(200);
    }
  });

  it('pages without gaps or doubles, and past the end is empty', async () => {
    const pages = await Promise.all(
      [1, 2, 3, 4].map((page) => numbersOf(`material=Brass&size=2&page=${page}`)),
    );
    expect(pages.map(({ length }) => length)).toEqual([2, 2, 1, 0]);
    expect(new Set(pages.flat()).size).toBe(5);
    const { body } = await viewer.get<Page>('/api/parts?material=Brass&size=2&page=1000000');
    expect(body).toEqual({ items: [], total: 5, page: 1_000_000, size: 2 });
  });

  it('puts parts without the figure last', async () => {
    const bearing = { kind: 'seal', description: 'Seal', material: 'Cork' };
    await librarian.post('/api/parts', {
      ...bearing,
      attributes: { shaftDiameter: 20, outerDiameter: 35, width: 7 },
    });
    await add({ material: 'Cork', attributes: { teeth: 30 } });
    for (const sort of ['teeth', '-teeth']) {
      const { body } = await viewer.get<Page>(`/api/parts?material=Cork&sort=${sort}`);
      expect(body.items.map(({ kind }) => kind)).toEqual(['gear', 'seal']);
    }
  });

  it.each([
    ['sort=price', 'sort'],
    ['sort=number,kind,teeth', 'sort'],
    ['size=101', 'size'],
    ['page=0', 'page'],
    ['teethMin=many', 'teethMin'],
    ['module=NaN', 'module'],
    ['kind=sprocket', 'kind'],
    ['colour=green', 'colour'],
    [`text=${'x'.repeat(201)}`, 'text'],
  ])('refuses %s', async (query, field) => {
    const { status, body } = await viewer.get<Refusal>(`/api/parts?${query}`);
    expect(status).toBe(400);
    expect(body.errors?.[0]?.field).toBe(field);
  });

  it('counts what the library holds for the filter bar', async () => {
    const { body } =
      await viewer.get<Record<string, { value: string | number; count: number }[]>>('/api/parts/facets');
    expect(body.materials).toContainEqual({ value: 'Brass', count: 5 });
    expect(body.modules).toContainEqual({ value: 0.5, count: 1 });
    const modules = body.modules?.map(({ value }) => Number(value)) ?? [];
    expect(modules).toEqual([...modules].sort((a, b) => a - b));
    const total = (await viewer.get<Page>('/api/parts?size=1')).body.total;
    expect(body.kinds?.reduce((sum, { count }) => sum + count, 0)).toBe(total);
  });
});
