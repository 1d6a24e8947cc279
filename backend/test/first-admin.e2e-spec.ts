import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { DataSource } from 'typeorm';
import { OpeningService } from '../src/auth/opening.service.js';
import { startServer, type TestServer } from './harness.js';

let server: TestServer;
beforeAll(async () => {
  server = await startServer({ demo: false });
});
afterAll(() => server.close());

const input = { name: 'Ines Tarn', email: 'Ines@Workshop.example', password: 'a good long one' };

function tokenOf(path: string | null): string {
  return new URLSearchParams(path?.split('?')[1]).get('token') ?? '';
}

describe('the first administrator', () => {
  it('is made by the newest link, once, and is signed in', async () => {
    const opening = server.app.get(OpeningService);
    const old = tokenOf(await opening.firstAdminPath());
    const token = tokenOf(await opening.firstAdminPath());
    expect(token.length).toBeGreaterThan(40);
    for (const wrong of [old, 'made up', `${token}x`]) {
      const refused = await server
        .anonymous()
        .post<{ code: string }>('/api/auth/first-admin', { ...input, token: wrong });
      expect([refused.status, refused.body.code]).toEqual([403, 'link-over']);
    }
    const client = server.anonymous();
    const made = await client.post('/api/auth/first-admin', { ...input, token });
    expect(made.status).toBe(200);
    expect(made.body).toMatchObject({ email: 'ines@workshop.example', roles: ['admin'] });
    expect((await client.get('/api/users')).body).toMatchObject({ total: 1 });
    const again = await server
      .anonymous()
      .post('/api/auth/first-admin', { ...input, email: 'second@workshop.example', token });
    expect(again.status).toBe(403);
    await server.anonymous().signIn('ines@workshop.example', input.password);
    expect(await opening.firstAdminPath()).toBeNull();
  });

  it('gets a link whose token the database does not hold', async () => {
    const other = await startServer({ demo: false });
    const token = tokenOf(await other.app.get(OpeningService).firstAdminPath());
    const rows = await other.app.get(DataSource).query<object[]>('SELECT * FROM "invitations"');
    await other.close();
    expect(rows).toHaveLength(1);
    expect(JSON.stringify(rows)).not.toContain(token);
  });

  it('is not offered in demo mode', async () => {
    const demo = await startServer();
    const path = await demo.app.get(OpeningService).firstAdminPath();
    await demo.close();
    expect(path).toBeNull();
  });
});
