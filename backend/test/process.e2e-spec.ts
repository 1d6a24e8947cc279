import { type ChildProcess, spawn } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';

/** The built server, as `npm start` runs it. */
const MAIN = fileURLToPath(new URL('../dist/main.js', import.meta.url));

interface Run {
  child: ChildProcess;
  output: () => string;
  /** Resolves with the first match of the pattern in the output. */
  says(pattern: RegExp): Promise<RegExpExecArray>;
  ended: Promise<number | null>;
}

let dataDir: string;
let runs: Run[];
beforeEach(() => {
  dataDir = mkdtempSync(path.join(tmpdir(), 'stageyard-test-'));
  runs = [];
});
afterEach(async () => {
  for (const { child, ended } of runs) {
    if (child.exitCode === null) child.kill('SIGKILL');
    await ended;
  }
  rmSync(dataDir, { recursive: true, force: true });
});

function run(env: Record<string, string>): Run {
  const child = spawn(process.execPath, [MAIN], {
    env: { PATH: process.env.PATH, STAGEYARD_DATA: dataDir, PORT: '0', LOG_LEVEL: 'warn', ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let text = '';
  const ended = new Promise<number | null>((resolve) => child.on('close', resolve));
  const says = (pattern: RegExp) =>
    new Promise<RegExpExecArray>((resolve, reject) => {
      const look = () => {
        const match = pattern.exec(text);
        if (match) resolve(match);
      };
      child.stdout.on('data', look);
      child.stderr.on('data', look);
      void ended.then(() => reject(new Error(`The server ended without saying ${pattern}:\n${text}`)));
      look();
    });
  child.stdout.on('data', (chunk) => (text += String(chunk)));
  child.stderr.on('data', (chunk) => (text += String(chunk)));
  const started = { child, output: () => text, says, ended };
  runs.push(started);
  return started;
}

/** A line of a stack trace, as text or inside a line of the log. */
const STACK = /\bat .*\.[jt]s:\d+/;
const LISTENS = /listens at (http:\/\/\S+)/;

describe('the server process', () => {
  it('lists bad settings and ends with 1, without a stack trace', async () => {
    const { ended, output } = run({ PORT: 'eighty', STAGEYARD_DEMO: 'maybe' });
    expect(await ended).toBe(1);
    expect(output()).toMatch(/PORT is “eighty”/);
    expect(output()).toMatch(/STAGEYARD_DEMO is “maybe”/);
    expect(output()).not.toMatch(STACK);
  });

  it('says plainly that a port is in use', async () => {
    const first = run({});
    const [, url = ''] = await first.says(LISTENS);
    const { port } = new URL(url);
    const second = run({ PORT: port, STAGEYARD_DATA: path.join(dataDir, 'other') });
    expect(await second.ended).toBe(1);
    expect(second.output()).toContain(`Port ${port} on 127.0.0.1 is in use`);
    expect(second.output()).not.toMatch(STACK);
  });

  it('ends calmly when Ctrl-C reaches it twice, from the terminal and from npm', async () => {
    const server = run({});
    await server.says(LISTENS);
    server.child.kill('SIGINT');
    server.child.kill('SIGINT');
    setTimeout(() => server.child.kill('SIGINT'), 30);
    expect(await server.ended).toBe(0);
  });

  it('refuses a data folder that another server uses, until that one is gone, however it went', async () => {
    const first = run({});
    await first.says(LISTENS);
    const second = run({});
    expect(await second.ended).toBe(1);
    expect(second.output()).toContain(`Another Stageyard uses the data folder ${dataDir}`);
    expect(second.output()).not.toMatch(STACK);
    first.child.kill('SIGKILL');
    await first.ended;
    await run({}).says(LISTENS);
  });

  it('says plainly that a data folder cannot be used', async () => {
    const file = path.join(dataDir, 'a-file');
    writeFileSync(file, '');
    const damaged = path.join(dataDir, 'damaged');
    mkdirSync(damaged);
    writeFileSync(
      path.join(damaged, 'stageyard.db'),
      'this is no database, and long enough to be read as one',
    );
    const cases = [
      [path.join(file, 'data'), 'It is no folder'],
      [damaged, 'is damaged'],
    ] as const;
    const servers = cases.map(([folder, words]) => ({
      folder,
      words,
      ...run({ STAGEYARD_DATA: folder }),
    }));
    for (const { folder, words, ended, output } of servers) {
      expect(await ended).toBe(1);
      expect(output()).toContain(`The data folder ${folder} (STAGEYARD_DATA) cannot be used.`);
      expect(output()).toContain(words);
      expect(output()).not.toMatch(STACK);
    }
  });

  it('prints the first link once, ends calmly on SIGTERM, and keeps its key and data for itself', async () => {
    const first = run({ STAGEYARD_DEMO: 'off' });
    const [, url = '', token] = await first.says(/(http:\/\/\S+)\/accept-invite\?token=(\S+)/);
    const body = JSON.stringify({
      token,
      name: 'Ines',
      email: 'ines@workshop.example',
      password: 'a good long one',
    });
    const headers = { 'content-type': 'application/json' };
    const made = await fetch(`${url}/api/auth/first-admin`, { method: 'POST', headers, body });
    expect(made.status).toBe(200);
    const cookie = made.headers.getSetCookie()[0]?.split(';')[0] ?? '';
    for (const file of ['session-secret', 'stageyard.db']) {
      expect(statSync(path.join(dataDir, file)).mode & 0o077).toBe(0);
    }
    first.child.kill('SIGTERM');
    expect(await first.ended).toBe(0);

    const second = run({ STAGEYARD_DEMO: 'off' });
    const [, again = ''] = await second.says(LISTENS);
    expect((await fetch(`${again}/api/auth/me`, { headers: { cookie } })).status).toBe(200);
    second.child.kill('SIGINT');
    expect(await second.ended).toBe(0);
    expect(second.output()).not.toContain('accept-invite');
  });

  it('writes requests to its log with their number, but neither cookie nor password nor token', async () => {
    const server = run({ LOG_LEVEL: 'trace' });
    const [, url = ''] = await server.says(LISTENS);
    const body = JSON.stringify({ email: 'viewer@brackenbay.example', password: 'stageyard-demo' });
    const headers = { 'content-type': 'application/json' };
    const answer = await fetch(`${url}/api/auth/sign-in?token=in-the-query`, {
      method: 'POST',
      headers,
      body,
    });
    const cookie = answer.headers.getSetCookie()[0]?.split(';')[0]?.split('=')[1] ?? '';
    await fetch(`${url}/api/auth/me`, { headers: { cookie: `stageyard_session=${cookie}` } });
    await server.says(new RegExp(answer.headers.get('x-request-id') ?? 'no number'));
    await server.says(/"path":"\/api\/auth\/me"/);
    expect(cookie.length).toBeGreaterThan(40);
    expect(server.output()).not.toContain(cookie);
    expect(server.output()).not.toMatch(/stageyard-demo|in-the-query/);
  });
});
