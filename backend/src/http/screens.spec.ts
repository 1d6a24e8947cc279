import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { fastify, type FastifyInstance } from 'fastify';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { serveScreens } from './screens.js';

let folder: string;
let root: string;
let server: FastifyInstance;
beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), 'stageyard-screens-'));
  root = path.join(folder, 'dist');
  mkdirSync(path.join(root, 'assets'), { recursive: true });
  writeFileSync(path.join(folder, 'secret'), 'hidden');
  writeFileSync(path.join(root, 'index.html'), '<title>Stageyard</title>');
  writeFileSync(path.join(root, 'assets', 'index-abc123.js'), 'export {};');
  server = fastify();
  await serveScreens(server, root);
  server.get('/api/known', () => ({ known: true }));
});
afterAll(async () => {
  await server.close();
  rmSync(folder, { recursive: true, force: true });
});

describe('the screens', () => {
  it.each(['/', '/parts/KW-00417', '/briefs/1/compare?a=1', '/accept-invite?token=x', '/apis'])(
    'answer %s with the one page, fresh each time',
    async (url) => {
      const answer = await server.inject(url);
      expect([answer.statusCode, answer.body]).toEqual([200, '<title>Stageyard</title>']);
      expect(answer.headers['content-type']).toContain('text/html');
      expect(answer.headers['cache-control']).toBe('no-cache');
    },
  );

  it('send built files for good', async () => {
    const answer = await server.inject('/assets/index-abc123.js');
    expect([answer.statusCode, answer.body]).toEqual([200, 'export {};']);
    expect(answer.headers['cache-control']).toContain('immutable');
  });

  it.each(['/api/unknown', '/api', '/assets/gone.js'])('do not stand in for %s', async (url) => {
    expect((await server.inject(url)).statusCode).toBe(404);
  });

  it.each(['/../secret', '/assets/../../secret', '/%2e%2e/secret', '/assets/..%2f..%2fsecret', '//secret'])(
    'show nothing outside their folder: %s',
    async (url) => {
      expect((await server.inject(url)).body).not.toContain('hidden');
    },
  );

  it('leave the API alone, and writes to other addresses unanswered', async () => {
    expect((await server.inject('/api/known')).json()).toEqual({ known: true });
    expect((await server.inject({ method: 'POST', url: '/parts' })).statusCode).toBe(404);
  });

  it('say what to do when they are not built', async () => {
    const bare = fastify();
    await serveScreens(bare, path.join(root, 'nowhere'));
    const answer = await bare.inject('/');
    await bare.close();
    expect([answer.statusCode, answer.body]).toEqual([503, expect.stringContaining('npm start')]);
  });
});
