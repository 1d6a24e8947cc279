import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Client, startServer, type TestServer } from './harness.js';

interface Supplier {
  code: string;
  name: string;
  standing: string;
  currency: string;
  contacts: object[];
  offers: { open: number; expired: number; oldestPricedOn: string | null };
  version: number;
}
interface Refusal {
  code: string;
  message: string;
  errors?: { field: string; message: string; limit?: unknown }[];
  current?: Supplier;
}
interface Page {
  items: Supplier[];
  total: number;
}

let server: TestServer;
let purchaser: Client;
let viewer: Client;
beforeAll(async () => {
  server = await startServer();
  purchaser = await server.as('purchaser');
  viewer = await server.as('viewer');
});
afterAll(() => server.close());

const NORTHWHARF = {
  name: 'Northwharf Drives',
  currency: 'eur',
  language: 'de',
  contacts: [{ name: 'Order desk', role: 'Sales', email: 'sales@northwharf.example', phone: '' }],
  address: 'Quay 4\nNorthwharf',
  freight: { kind: 'free-from', charge: 1250, freeFrom: 50000 },
  leastOrderValue: 2500,
  leadTimeDays: 12,
  note: 'Asks for the drawing with every enquiry.',
};

async function add(changes: object = {}): Promise<Supplier> {
  const { status, body } = await purchaser.post<Supplier>('/api/suppliers', { ...NORTHWHARF, ...changes });
  expect([status, body]).toEqual([201, body]);
  return body;
}

describe('a supplier', () => {
  it('is added active with a running code, and read back as it was typed', async () => {
    const added = await add();
    expect(added).toMatchObject({
      ...NORTHWHARF,
      code: 'S-0001',
      currency: 'EUR',
      standing: 'active',
      version: 1,
      offers: { open: 0, expired: 0, oldestPricedOn: null },
    });
    expect((await purchaser.get('/api/suppliers/s-0001')).body).toEqual(added);
  });

  it('needs no more than a name and a currency', async () => {
    const { status, body } = await purchaser.post('/api/suppliers', {
      name: 'Plain & Sons',
      currency: 'JPY',
    });
    expect(status).toBe(201);
    expect(body).toMatchObject({
      language: 'en',
      contacts: [],
      freight: { kind: 'as-charged', charge: null, freeFrom: null },
      leastOrderValue: null,
      leadTimeDays: null,
    });
  });

  it('keeps script text in a name as the text it is', async () => {
    const name = '<script>alert("kelp")</script>';
    const { code } = await add({ name });
    const answer = await purchaser.get<Supplier>(`/api/suppliers/${code}`);
    expect(answer.body.name).toBe(name);
    expect(answer.headers.get('content-type')).toContain('application/json');
  });

  it('is refused the name of another, whatever the case of its letters, naming that one', async () => {
    const { code } = await add({ name: 'Saltmarsh Bearings' });
    const { status, body } = await purchaser.post<Refusal>('/api/suppliers', {
      ...NORTHWHARF,
      name: 'SALTMARSH bearings',
    });
    expect([status, body.code, body.errors?.[0]?.field]).toEqual([409, 'name-taken', 'name']);
    expect(body.message).toContain(code);
    const other = await add({ name: 'Dune Castings' });
    const renamed = await purchaser.patch<Refusal>(`/api/suppliers/${other.code}`, {
      version: 1,
      name: 'saltmarsh Bearings',
    });
    expect([renamed.status, renamed.body.code]).toEqual([409, 'name-taken']);
    // Its own name in other letters is not taken.
    const own = { version: 1, name: 'DUNE Castings' };
    expect((await purchaser.patch(`/api/suppliers/${other.code}`, own)).status).toBe(200);
  });

  it.each([
    ['an unknown currency', { currency: 'XYZ' }, 'currency'],
    ['an unknown language', { language: 'tlh' }, 'language'],
    ['a blank name', { name: '  ' }, 'name'],
    [
      'an address that is no e-mail',
      { contacts: [{ ...NORTHWHARF.contacts[0], email: 'desk' }] },
      'contacts.0.email',
    ],
    ['21 contacts', { contacts: Array.from({ length: 21 }, () => NORTHWHARF.contacts[0]) }, 'contacts'],
    ['flat freight without a charge', { freight: { kind: 'flat' } }, 'freight.charge'],
    [
      'free-from freight without its value',
      { freight: { kind: 'free-from', charge: 5 } },
      'freight.freeFrom',
    ],
    ['included freight with a charge', { freight: { kind: 'included', charge: 5 } }, 'freight.charge'],
    ['a charge of a fraction of a cent', { freight: { kind: 'flat', charge: 0.5 } }, 'freight.charge'],
    ['a negative least order value', { leastOrderValue: -1 }, 'leastOrderValue'],
    ['a lead time of 1e12 days', { leadTimeDays: 1e12 }, 'leadTimeDays'],
    ['an unknown field', { rating: 5 }, 'rating'],
  ])('is refused %s, naming the field', async (_, changes, field) => {
    const { status, body } = await purchaser.post<Refusal>('/api/suppliers', {
      ...NORTHWHARF,
      name: 'Refused Ltd',
      ...changes,
    });
    expect(status).toBe(400);
    expect(body.errors?.map((issue) => issue.field)).toEqual([field]);
    expect((await purchaser.get<Page>('/api/suppliers?text=Refused')).body.total).toBe(0);
  });

  it('is changed once by two people at once; the other sees the present state', async () => {
    const { code } = await add({ name: 'Two Hands' });
    const other = await server.as('librarian');
    const answers = await Promise.all(
      [purchaser, other].map((client, index) =>
        client.patch<Refusal & Supplier>(`/api/suppliers/${code}`, { version: 1, leadTimeDays: index + 20 }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const won = answers.find(({ status }) => status === 200);
    const lost = answers.find(({ status }) => status === 409);
    expect(lost?.body.code).toBe('changed-meanwhile');
    expect(lost?.body.current).toEqual(won?.body);
  });

  it('is closed and opened again on record, and an edit that changes nothing is not counted', async () => {
    const { code } = await add({ name: 'On Record' });
    const edit = (version: number, change: object) =>
      purchaser.patch<Supplier>(`/api/suppliers/${code}`, { version, ...change });
    expect((await edit(1, { name: 'On Record', contacts: NORTHWHARF.contacts })).body.version).toBe(1);
    expect((await edit(1, { standing: 'closed' })).body.standing).toBe('closed');
    await edit(2, { standing: 'active' });
    await edit(3, { currency: 'GBP' });
    const { body } = await purchaser.get<{
      items: { action: string; before: object | null; after: object }[];
    }>(`/api/suppliers/${code}/changes`);
    expect(body.items.map(({ action }) => action)).toEqual(['changed', 'opened again', 'closed', 'added']);
    expect(body.items[0]).toMatchObject({ before: { currency: 'EUR' }, after: { currency: 'GBP' } });
  });

  it('answers 404 in plain words for a code nobody has', async () => {
    const { status, body } = await purchaser.get<Refusal>('/api/suppliers/S-9999');
    expect([status, body.code]).toEqual([404, 'not-found']);
    expect(body.message).toContain('There is no supplier “S-9999”');
  });
});

describe('the list of suppliers', () => {
  it('is filtered and sorted', async () => {
    await add({ name: 'Zinc & Zeal', currency: 'NOK', leadTimeDays: 3, note: 'list-test' });
    await add({ name: 'alder works', currency: 'NOK', leadTimeDays: null, note: 'list-test' });
    await add({ name: 'Birch works', currency: 'NOK', leadTimeDays: 30, note: 'list-test' });
    const names = async (query: string) =>
      (await purchaser.get<Page>(`/api/suppliers?text=list-test&${query}`)).body.items.map(
        ({ name }) => name,
      );
    expect(await names('')).toEqual(['alder works', 'Birch works', 'Zinc & Zeal']);
    expect(await names('sort=-leadTimeDays')).toEqual(['Birch works', 'Zinc & Zeal', 'alder works']);
    expect(await names('sort=offers,-name')).toEqual(['Zinc & Zeal', 'Birch works', 'alder works']);
    expect(await names('currency=nok&standing=active&size=1&page=2')).toEqual(['Birch works']);
    expect(await names('standing=closed')).toEqual([]);
    expect((await purchaser.get('/api/suppliers?sort=address')).status).toBe(400);
  });

  it('is searched in what people typed of contacts, not in how they are kept', async () => {
    const contact = { name: 'Ines Falk', role: 'Quotations', email: 'ines@cairn.example', phone: '0555 123' };
    await add({ name: 'Cairn Castings', contacts: [contact] });
    const found = async (text: string) =>
      (await purchaser.get<Page>(`/api/suppliers?text=${text}`)).body.items.map(({ name }) => name);
    for (const text of ['ines%20falk', 'quotations', 'ines@cairn', '0555']) {
      expect(await found(text), text).toEqual(['Cairn Castings']);
    }
    // The contacts are kept with these words in them.
    expect(await found('phone')).toEqual([]);
    expect(await found('role')).toEqual([]);
  });
});

describe('people without prices', () => {
  it('see no supplier anywhere', async () => {
    const { code } = await add({ name: 'Unseen Forge' });
    for (const path of ['', `/${code}`, `/${code}/changes`]) {
      expect((await viewer.get(`/api/suppliers${path}`)).status).toBe(403);
    }
    for (const query of ['entity=supplier', 'text=Unseen', `entityId=${code}`]) {
      expect((await viewer.get<{ total: number }>(`/api/audit?${query}`)).body.total).toBe(0);
      expect((await purchaser.get<{ total: number }>(`/api/audit?${query}`)).body.total).toBeGreaterThan(0);
    }
  });

  it('are the viewers; designers read and do not write', async () => {
    const designer = await server.as('designer');
    expect((await designer.get('/api/suppliers')).status).toBe(200);
    expect((await designer.post('/api/suppliers', NORTHWHARF)).status).toBe(403);
    expect((await viewer.post('/api/suppliers', NORTHWHARF)).status).toBe(403);
  });
});
