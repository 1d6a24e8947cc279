import { rmSync } from 'node:fs';
import { request } from 'node:http';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startServer, type TestServer } from './harness.js';

let demo: TestServer;
let real: TestServer;
beforeAll(async () => {
  [demo, real] = await Promise.all([startServer(), startServer({ demo: false })]);
});
afterAll(() => Promise.all([demo.close(), real.close()]));

interface Raw {
  status: number | undefined;
  text: string;
}

/** fetch does not let a test choose these headers. */
function raw(
  server: TestServer,
  path: string,
  headers: Record<string, string>,
  method = 'GET',
): Promise<Raw> {
  const { hostname, port } = new URL(server.url);
  return new Promise((resolve, reject) => {
    const asking = request({ hostname, port, path, method, headers }, (response) => {
      let text = '';
      response.on('data', (chunk) => (text += String(chunk)));
      response.on('end', () => resolve({ status: response.statusCode, text }));
    });
    asking.on('error', reject).end();
  });
}

describe('demo mode', () => {
  it.each(['/', '/api/health', '/api/docs-json', '/api/auth/welcome'])(
    'answers %s only under a name of this machine and without a proxy',
    async (path) => {
      const afar: Record<string, string>[] = [
        { host: 'gears.example.com' },
        { host: 'localhost', 'x-forwarded-for': '10.0.0.1' },
        { host: 'localhost', forwarded: 'for=10.0.0.1' },
        { host: 'localhost', 'x-real-ip': '10.0.0.1' },
      ];
      for (const headers of afar) {
        const answer = await raw(demo, path, headers);
        expect(answer.status).toBe(403);
        expect(JSON.parse(answer.text)).toMatchObject({ statusCode: 403, code: 'demo-is-local' });
        expect(answer.text).toContain('PUBLIC_URL');
      }
      expect((await raw(demo, path, { host: 'localhost:3000' })).status).not.toBe(403);
    },
  );

  it('is off when it is switched off: no accounts shown, other hosts answered', async () => {
    const welcome = await raw(real, '/api/auth/welcome', { host: 'gears.example.com' });
    expect(JSON.parse(welcome.text)).toEqual({ demo: false, accounts: [], password: null });
  });

  it('closes its known accounts when the same data folder is served to others', async () => {
    const { OpeningService } = await import('../src/auth/opening.service.js');
    const { createApp } = await import('../src/app.js');
    const first = await startServer();
    const designer = await first.anonymous().signIn('designer@brackenbay.example');
    // One server at a time holds the folder.
    await first.app.close();
    const second = await createApp({ ...first.settings, demo: false });
    await second.listen({ host: '127.0.0.1', port: 0 });
    const url = await second.getUrl();
    const body = JSON.stringify({ email: 'admin@brackenbay.example', password: 'stageyard-demo' });
    const headers = { 'content-type': 'application/json' };
    const signIn = await fetch(`${url}/api/auth/sign-in`, { method: 'POST', headers, body });
    const me = await fetch(`${url}/api/auth/me`, { headers: { cookie: designer.cookie ?? '' } });
    const path = await second.get(OpeningService).firstAdminPath();
    await second.close();
    rmSync(first.settings.dataDir, { recursive: true, force: true });
    expect([signIn.status, me.status]).toEqual([401, 401]);
    expect(path).toMatch(/^\/accept-invite\?token=/);
  });
});

describe('a write from a page of another address', () => {
  it('is refused, even with a good cookie, and nothing changes', async () => {
    const admin = await real.as('admin');
    const before = (await admin.get<{ total: number }>('/api/users')).body.total;
    const body = { name: 'Mallory', email: 'm@example.com', roles: ['admin'], password: 'long enough' };
    const foreign: Record<string, string>[] = [
      { origin: 'http://evil.example' },
      { 'sec-fetch-site': 'cross-site' },
    ];
    for (const headers of foreign) {
      const answer = await admin.send<{ code: string }>('POST', '/api/users', { body, headers });
      expect([answer.status, answer.body.code]).toEqual([403, 'foreign-origin']);
    }
    expect((await admin.get<{ total: number }>('/api/users')).body.total).toBe(before);
    const own = await admin.send('POST', '/api/users', { body, headers: { origin: real.url } });
    expect(own.status).toBe(201);
  });
});

describe('the API pages', () => {
  it('are open in demo mode', async () => {
    const json = await fetch(`${demo.url}/api/docs-json`);
    expect(await json.json()).toMatchObject({ openapi: '3.0.0' });
    const page = await fetch(`${demo.url}/api/docs`);
    expect(await page.text()).toContain('swagger-ui');
  });

  it.each(['/api/docs', '/api/docs/', '/api/docs-json', '/api/docs/swagger-ui-init.js'])(
    'are for administrators elsewhere: %s',
    async (path) => {
      const statusFor = async (cookie: string | null) =>
        (await fetch(real.url + path, { headers: cookie ? { cookie } : {} })).status;
      expect(await statusFor(null)).toBe(401);
      expect(await statusFor((await real.as('designer')).cookie)).toBe(403);
      expect(await statusFor((await real.as('admin')).cookie)).toBe(200);
    },
  );
});

describe('every answer', () => {
  it('forbids pages of others to frame it and scripts from elsewhere', async () => {
    const { headers } = await fetch(`${real.url}/api/health`);
    const policy = headers.get('content-security-policy') ?? '';
    expect(policy).toContain("script-src 'self'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toMatch(/unsafe-eval|https?:/);
    expect(headers.get('x-content-type-options')).toBe('nosniff');
    expect(headers.get('cache-control')).toBe('no-store');
  });
});
