import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { MOST_WRONG } from '../src/auth/sign-in-throttle.js';
import { addPerson } from '../src/testing/people.js';
import { newBrief, slowRequirement } from '../src/testing/new-brief.js';
import { startServer, type TestServer } from './harness.js';

interface Me {
  id: string;
  email: string;
  roles: string[];
  permissions: string[];
}

let server: TestServer;
beforeAll(async () => {
  server = await startServer();
});
afterAll(() => server.close());

/** Asks again until the answer is as wanted; the test's time limit ends it otherwise. */
async function expectSoon<T>(ask: () => Promise<T>, isRight: (answer: T) => boolean): Promise<T> {
  for (;;) {
    const answer = await ask();
    if (isRight(answer)) return answer;
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
}

describe('signing in', () => {
  it('shows the known accounts in demo mode, and each of them works', async () => {
    const { body } = await server.anonymous().get<{
      demo: boolean;
      accounts: { email: string; role: string }[];
      password: string;
    }>('/api/auth/welcome');
    expect(body.demo).toBe(true);
    expect(body.accounts.map(({ email }) => email)).toEqual(
      ['admin', 'designer', 'librarian', 'purchaser', 'viewer'].map((name) => `${name}@brackenbay.example`),
    );
    expect(body.password).toBe('stageyard-demo');
    for (const { email, role } of body.accounts) {
      const client = await server.anonymous().signIn(email, body.password);
      expect((await client.get<Me>('/api/auth/me')).body.roles).toEqual([role]);
    }
  });

  it('sets one cookie that scripts cannot read and other sites do not send', async () => {
    const answer = await server
      .anonymous()
      .post('/api/auth/sign-in', { email: 'Viewer@BrackenBay.example ', password: 'stageyard-demo' });
    const cookies = answer.headers.getSetCookie();
    expect(cookies).toHaveLength(1);
    expect(cookies[0]).toMatch(/; HttpOnly/);
    expect(cookies[0]).toMatch(/; SameSite=Strict/);
    expect(cookies[0]).toMatch(/; Path=\//);
  });

  it('refuses a wrong password and an unknown address in the same words', async () => {
    const wrong = await server
      .anonymous()
      .post('/api/auth/sign-in', { email: 'viewer@brackenbay.example', password: 'not this one' });
    const unknown = await server
      .anonymous()
      .post('/api/auth/sign-in', { email: 'nobody@brackenbay.example', password: 'not this one' });
    expect(wrong.status).toBe(401);
    expect({ ...(unknown.body as object), requestId: '' }).toEqual({
      ...(wrong.body as object),
      requestId: '',
    });
  });

  it('ends the session at sign-out, also for a copy of the cookie', async () => {
    const client = await server.asAnother('viewer');
    const copy = server.anonymous();
    copy.cookie = client.cookie;
    expect((await copy.get('/api/auth/me')).status).toBe(200);
    expect((await client.post('/api/auth/sign-out')).status).toBe(204);
    expect(client.cookie).toBeNull();
    expect((await copy.get('/api/auth/me')).status).toBe(401);
  });

  it('refuses a cookie that was changed or signed elsewhere', async () => {
    const client = await server.asAnother('admin');
    const [name, value = ''] = (client.cookie ?? '').split('=');
    const [head, claims = '', signature] = value.split('.');
    const unsigned = Buffer.from('{"alg":"none","typ":"JWT"}').toString('base64url');
    for (const forged of [`${head}.${claims}x.${signature}`, `${unsigned}.${claims}.`, 'nonsense', '']) {
      client.cookie = `${name}=${forged}`;
      expect((await client.get('/api/auth/me')).status).toBe(401);
    }
  });

  it('puts a refused sign-in on record for administrators, without what was typed', async () => {
    const person = await addPerson(server.app, { name: 'Nora Finch' });
    for (const email of [person.email, 'my-secret-typed-in-the-wrong-field']) {
      await server.anonymous().post('/api/auth/sign-in', { email, password: 'not this one' });
    }
    const admin = await server.as('admin');
    const address = `/api/audit?entity=session&entityId=${person.id}`;
    const changes = await expectSoon(
      () => admin.get<{ items: { action: string; summary: string }[] }>(address),
      ({ body }) => body.items.length > 0,
    );
    expect(changes.body.items).toMatchObject([{ action: 'sign-in refused' }]);
    expect(changes.body.items[0]?.summary).toContain('Nora Finch');
    const all = await admin.get('/api/audit?entity=session');
    expect(all.bytes.toString()).not.toMatch(/wrong-field|not this one/);
    const viewer = await server.as('viewer');
    for (const entity of ['session', 'user']) {
      const seen = await viewer.get<{ total: number }>(`/api/audit?entity=${entity}`);
      expect([seen.status, seen.body.total]).toEqual([200, 0]);
    }
  });

  it('closes an event stream when its session ends', async () => {
    const client = await server.asAnother('designer');
    const { body: brief } = await client.post<{ id: string }>(
      '/api/briefs',
      newBrief({ requirement: slowRequirement() }),
    );
    const { body: search } = await client.post<{ id: string }>(`/api/briefs/${brief.id}/searches`);
    const events = client.events(`/api/searches/${search.id}/events`);
    expect((await events.next()).value).toMatchObject({ event: 'state' });
    const rest = (async () => {
      let last: unknown;
      for await (const { data } of events) last = data;
      return last;
    })();
    expect((await client.post('/api/auth/sign-out')).status).toBe(204);
    await rest;
    const admin = await server.as('admin');
    const { body: now } = await admin.get<{ state: string }>(`/api/searches/${search.id}`);
    expect(['queued', 'running']).toContain(now.state);
    await admin.post(`/api/searches/${search.id}/stop`);
  });

  it('makes a person wait after many wrong passwords, and nobody else', async () => {
    const { email } = await addPerson(server.app);
    const other = await addPerson(server.app);
    const attempt = (password: string, address = email) =>
      server.anonymous().post<{ message: string }>('/api/auth/sign-in', { email: address, password });
    const wrong = await Promise.all(
      Array.from({ length: MOST_WRONG.email + 3 }, () => attempt('a wrong password')),
    );
    expect(wrong.filter(({ status }) => status === 401)).toHaveLength(MOST_WRONG.email);
    const right = await attempt('stageyard-demo');
    expect(right.status).toBe(429);
    expect(right.body.message).toMatch(/Wait \d+ seconds/);
    expect(Number(right.headers.get('retry-after'))).toBeGreaterThan(0);
    expect((await attempt('stageyard-demo', other.email)).status).toBe(200);
  });

  it('does not hold up many right sign-ins in a row', async () => {
    const { email } = await addPerson(server.app);
    const statuses = await Promise.all(
      Array.from({ length: 40 }, async () => {
        const answer = await server
          .anonymous()
          .post('/api/auth/sign-in', { email, password: 'stageyard-demo' });
        return answer.status;
      }),
    );
    expect(statuses.filter((status) => status !== 200)).toEqual([]);
  });
});

describe('people', () => {
  it('ends every session of a person who is made inactive, at once', async () => {
    const admin = await server.as('admin');
    const person = await addPerson(server.app);
    const [first, second] = [
      await server.anonymous().signIn(person.email),
      await server.anonymous().signIn(person.email),
    ];
    const answer = await admin.patch(`/api/users/${person.id}`, { version: person.version, active: false });
    expect(answer.status).toBe(200);
    expect((await first.get('/api/auth/me')).status).toBe(401);
    expect((await second.get('/api/auth/me')).status).toBe(401);
    const again = await server
      .anonymous()
      .post('/api/auth/sign-in', { email: person.email, password: 'stageyard-demo' });
    expect(again.status).toBe(401);
  });

  it('lets a change of roles count from the next request on', async () => {
    const admin = await server.as('admin');
    const person = await addPerson(server.app, { roles: ['viewer'] });
    const client = await server.anonymous().signIn(person.email);
    expect((await client.get('/api/users')).status).toBe(403);
    await admin.patch(`/api/users/${person.id}`, { version: person.version, roles: ['admin'] });
    expect((await client.get('/api/users')).status).toBe(200);
  });

  it('refuses an address that somebody has, whatever its case', async () => {
    const admin = await server.as('admin');
    const person = await addPerson(server.app);
    const { email } = person;
    const input = { name: 'Second', email: email.toUpperCase(), roles: ['viewer'], password: 'long enough' };
    const answer = await admin.post<{ code: string }>('/api/users', input);
    expect([answer.status, answer.body.code]).toEqual([409, 'email-taken']);
  });

  it('never shows a password or its hash', async () => {
    const admin = await server.as('admin');
    const input = {
      name: 'Quiet',
      email: 'quiet@brackenbay.example',
      roles: ['viewer'],
      password: 'hush hush hush',
    };
    const added = await admin.post('/api/users', input);
    const changes = await admin.get('/api/audit?entity=user');
    const refused = await admin.post('/api/users', { ...input, password: 'short' });
    expect(refused.status).toBe(400);
    for (const { bytes } of [added, changes, refused])
      expect(bytes.toString()).not.toMatch(/hush|argon2|"short"/);
  });
});

describe('the last administrator', () => {
  it('can neither be made inactive nor lose the role', async () => {
    const alone = await startServer({ demo: false });
    try {
      const admin = await alone.asAnother('admin');
      const { body: me } = await admin.get<Me>('/api/auth/me');
      for (const change of [{ active: false }, { roles: ['viewer'] }]) {
        const answer = await admin.patch<{ code: string }>(`/api/users/${me.id}`, { version: 1, ...change });
        expect([answer.status, answer.body.code]).toEqual([409, 'last-admin']);
      }
      expect((await admin.get<Me>('/api/auth/me')).body.roles).toEqual(['admin']);
    } finally {
      await alone.close();
    }
  });
});
