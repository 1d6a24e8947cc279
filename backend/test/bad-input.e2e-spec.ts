import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newBrief, newRequirement } from '../src/testing/new-brief.js';
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

/** A body that is taken as it stands, for every route that takes one. */
const ROUTES: [method: string, path: string, body: () => object][] = [
  ['POST', '/api/users', () => newPerson()],
  ['POST', '/api/parts', () => newGear()],
  ['POST', '/api/briefs', () => newBrief()],
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
    for (const place of placesIn(body())) {
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
    'briefs',
    () => newBrief(),
    ({ id }) => `/api/briefs/${id}`,
    { title: 'Other', note: 'Seen.', requirement: newRequirement() },
  ],
];

interface Made {
  id: string;
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
