import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newBrief, newRequirement } from '../src/testing/new-brief.js';
import { newOffer, newSupplier } from '../src/testing/new-offer.js';
import { newGear } from '../src/testing/new-part.js';
import { newPerson } from '../src/testing/people.js';
import { type Answer, type Client, startServer, type TestServer } from './harness.js';

interface Refused {
  message: string;
  errors?: { field: string }[];
}

type Path = string[];

let server: TestServer;
let admin: Client;
beforeAll(async () => {
  server = await startServer();
  admin = await server.as('admin');
  await admin.post('/api/parts', newGear({ number: partNumber, standing: 'cleared' }));
  ({ code: supplierCode } = (await admin.post<{ code: string }>('/api/suppliers', newSupplier())).body);
});
afterAll(() => server.close());

/** JSON has no word for it, but a number too large for a double is read as infinite. */
const INFINITE = '@infinite@';
const LONG = 'x'.repeat(100_000);
const BAD = [null, '', 'x', INFINITE, -1, 0, 0.5, 1e300, true, [], {}, { a: 1 }];

/** Every place in a body where a value stands, lists and objects themselves included. */
function placesIn(value: unknown, here: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [here];
  const inner = Object.entries(value).flatMap(([key, child]) => placesIn(child, [...here, key]));
  return here.length === 0 ? inner : [here, ...inner];
}

function withValue(body: unknown, [key, ...rest]: Path, value: unknown): unknown {
  if (key === undefined) return value;
  if (Array.isArray(body))
    return body.map((item, at) => (String(at) === key ? withValue(item, rest, value) : item) as unknown);
  const fields = body as Record<string, unknown>;
  return { ...fields, [key]: withValue(fields[key], rest, value) };
}

function send(method: string, path: string, body: unknown): Promise<Answer<Refused>> {
  const text = JSON.stringify(body).replaceAll(`"${INFINITE}"`, '1e999');
  return admin.send<Refused>(method, path, { body: text });
}

const spur = { teeth: 24, module: 2, faceWidth: 20 };
const wheel = { ...spur, teeth: 48, thicknessAllowance: { upper: -0.05, lower: -0.1 } };

/** Every offer is for this part, by this supplier. */
const partNumber = 'OFFERED';
let supplierCode: string;
let count = 0;
const PASTED = {
  pricedOn: '2026-01-15',
  validFrom: '2026-01-15',
  validUntil: '2199-12-31',
  source: 'List 9',
  currency: 'EUR',
};

const wholeSupplier = () =>
  newSupplier({
    language: 'de',
    contacts: [{ name: 'Desk', role: 'Sales', email: 'desk@northwharf.example', phone: '1' }],
    address: 'Quay 4',
    freight: { kind: 'free-from', charge: 900, freeFrom: 50_000 },
    leastOrderValue: 2500,
    note: 'Seen.',
  });

/** Each call gives another source, since the very same offer is refused. */
const wholeOffer = () => ({
  ...newOffer({ partNumber, supplierCode }),
  ...{ supplierPartNumber: 'A1', per: 10, pack: 5, leastQuantity: 5, leadTimeDays: 3, note: 'Seen.' },
  ...{ ...PASTED, source: `List ${(count += 1)}` },
});

/** A body that is taken as it stands, for every route that takes one. */
const ROUTES: [method: string, path: string, body: () => object][] = [
  ['POST', '/api/users', () => newPerson()],
  ['POST', '/api/parts', () => newGear()],
  ['POST', '/api/briefs', () => newBrief()],
  ['POST', '/api/suppliers', () => wholeSupplier()],
  ['POST', '/api/offers', () => wholeOffer()],
  ['POST', '/api/offers/paste', () => ({ text: 'OFFERED\t\t1\t2.50', supplierCode, defaults: PASTED })],
  ['POST', '/api/calc/gear', () => ({ ...spur, pressureAngleDeg: 20, helixAngleDeg: 0, profileShift: 0.1 })],
  ['POST', '/api/calc/mesh', () => ({ pinion: { ...spur, profileShift: 0.1 }, wheel, allowance: 0.01 })],
  ['POST', '/api/calc/shift', () => ({ pinion: spur, wheel, policy: 'none', keepReferenceDistance: true })],
  [
    'POST',
    '/api/calc/fractions',
    () => ({ target: '6.931', tolerancePercent: '0.1', maxTeeth: 100, limit: 5 }),
  ],
  ['POST', '/api/calc/options', () => ({ ...newRequirement() })],
];

describe.each(ROUTES)('%s %s', (method, path, body) => {
  it('takes the good body that the bad ones are made from', async () => {
    const { status, body: answer } = await send(method, path, body());
    expect([status < 300, answer]).toEqual([true, answer]);
  });

  it('never fails inside, whatever stands in whichever field', async () => {
    const attempt = async (place: Path, value: unknown) => {
      const { status, bytes } = await send(method, path, withValue(body(), place, value));
      const what = `${place.join('.')} = ${JSON.stringify(value)}`;
      expect([what, status < 500]).toEqual([what, true]);
      // A refusal may repeat what was sent; a result never holds it.
      expect(bytes.toString()).not.toMatch(status < 300 ? /NaN|Infinity/ : /node_modules|at .*\.[jt]s:/);
    };
    for (const place of placesIn(body())) await Promise.all(BAD.map((value) => attempt(place, value)));
  });

  it('names the field when a text is far too long, in a short answer', async () => {
    // A pasted table may be that long: each of its rows is looked at by itself.
    const isTable = ([field]: Path) => path.endsWith('/paste') && field === 'text';
    for (const place of placesIn(body()).filter((here) => !isTable(here))) {
      const { status, body: answer, bytes } = await send(method, path, withValue(body(), place, LONG));
      const what = place.join('.');
      expect([what, status]).toEqual([what, 400]);
      expect(bytes.length).toBeLessThan(4000);
      const named = answer.errors?.some(
        ({ field }) => field !== '' && what.includes(field.split('.')[0] ?? ''),
      );
      expect([what, named]).toEqual([what, true]);
    }
  });
});

/** What is edited: how it is made, where it then lies, and a change that is taken. */
const EDITS: [kind: string, make: () => object, place: (made: Made) => string, change: object][] = [
  [
    'users',
    () => newPerson(),
    ({ id }) => `/api/users/${id}`,
    { name: 'Other', email: 'other@brackenbay.example', roles: ['viewer'], active: true },
  ],
  [
    'parts',
    () => newGear(),
    ({ number }) => `/api/parts/${number}`,
    { description: 'Other', material: 'C60', mass: 0.3, note: 'Seen.', attributes: newGear().attributes },
  ],
  [
    'suppliers',
    wholeSupplier,
    ({ code }) => `/api/suppliers/${code}`,
    {
      name: 'Other Works',
      standing: 'closed',
      currency: 'GBP',
      leastOrderValue: 3,
      freight: { kind: 'included' },
    },
  ],
  [
    'offers',
    wholeOffer,
    ({ id }) => `/api/offers/${id}`,
    { breaks: [{ quantity: 5, unitPrice: 9 }], pack: 10, leastQuantity: 10, validUntil: null, note: 'Other' },
  ],
  [
    'briefs',
    () => newBrief(),
    ({ id }) => `/api/briefs/${id}`,
    { title: 'Other', note: 'Seen.', requirement: newRequirement() },
  ],
];

interface Made {
  id: string;
  code: string;
  number: string;
  version: number;
}

describe.each(EDITS)('PATCH /api/%s', (kind, make, placeOf, change) => {
  it('never fails inside, and loses nothing by a refused change', async () => {
    const { body: made } = await admin.post<Made>(`/api/${kind}`, make());
    let { version } = made;
    for (const place of placesIn({ version, ...change })) {
      for (const value of BAD) {
        const answer = await send('PATCH', placeOf(made), withValue({ version, ...change }, place, value));
        const what = `${place.join('.')} = ${JSON.stringify(value).slice(0, 20)}`;
        expect([what, answer.status < 500]).toEqual([what, true]);
        if (answer.status === 200) ({ version } = answer.body as unknown as Made);
      }
    }
    const last = await admin.patch<Made>(placeOf(made), { version, ...change });
    expect([last.status, last.body.version]).toEqual([200, version + 1]);
  });
});
