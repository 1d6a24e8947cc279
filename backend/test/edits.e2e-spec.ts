import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { addPerson } from '../src/testing/people.js';
import { type Client, startServer, type TestServer } from './harness.js';

interface Change {
  by: string;
  at: string;
  action: string;
  before: Record<string, unknown> | null;
  after: Record<string, unknown> | null;
}

let server: TestServer;
let admin: Client;
beforeAll(async () => {
  server = await startServer();
  admin = await server.as('admin');
});
afterAll(() => server.close());

describe('two people who edit the same thing at once', () => {
  it('get one success and one 409 that shows the thing as it stands', async () => {
    const other = await server.asAnother('admin');
    const person = await addPerson(server.app);
    const edit = (client: Client, name: string) =>
      client.patch<{ code: string; current: object; name: string }>(`/api/users/${person.id}`, {
        version: 1,
        name,
      });
    const answers = await Promise.all([edit(admin, 'One'), edit(other, 'Two')]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    const won = answers.find(({ status }) => status === 200);
    const lost = answers.find(({ status }) => status === 409);
    expect(lost?.body.code).toBe('changed-meanwhile');
    expect(lost?.body.current).toEqual(won?.body);
    expect(won?.body).toMatchObject({ version: 2 });
  });

  it('get exactly one success out of twenty, and one row in the record', async () => {
    const person = await addPerson(server.app);
    const answers = await Promise.all(
      Array.from({ length: 20 }, (_, index) =>
        admin.patch(`/api/users/${person.id}`, { version: 1, name: `Name ${index}` }),
      ),
    );
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(1);
    const { body } = await admin.get<{ items: Change[] }>(`/api/audit?entity=user&entityId=${person.id}`);
    expect(body.items.map(({ action }) => action)).toEqual(['changed', 'added']);
  });
});

describe('the record of changes', () => {
  it('says who, when, what, before and after', async () => {
    const start = new Date().toISOString();
    const input = {
      name: 'Rhea Moss',
      email: 'rhea@brackenbay.example',
      roles: ['viewer'],
      password: 'long enough',
    };
    const { body: added } = await admin.post<{ id: string }>('/api/users', input);
    await admin.patch(`/api/users/${added.id}`, { version: 1, roles: ['librarian'] });
    const { body } = await admin.get<{ items: Change[]; total: number }>(`/api/audit?entityId=${added.id}`);
    expect(body.total).toBe(2);
    const [changed, first] = body.items;
    expect(first).toMatchObject({
      by: 'Test admin',
      action: 'added',
      before: null,
      after: { name: 'Rhea Moss' },
    });
    expect(changed).toMatchObject({ before: { roles: ['viewer'] }, after: { roles: ['librarian'] } });
    expect(changed && changed.at >= start && changed.at <= new Date().toISOString()).toBe(true);
  });

  it('has no row for a change that was refused', async () => {
    const before = (await admin.get<{ total: number }>('/api/audit?entity=user')).body.total;
    await admin.post('/api/users', { name: 'Incomplete' });
    const { email } = await addPerson(server.app);
    await admin.post('/api/users', { name: 'Twice', email, roles: ['viewer'], password: 'long enough' });
    expect((await admin.get<{ total: number }>('/api/audit?entity=user')).body.total).toBe(before + 1);
  });
});
