import { spawn, type ChildProcess } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { request } from '@playwright/test';
import { DEMO_PASSWORD, ROLES, stateFile, type Role } from './roles';

const ROOT = path.join(import.meta.dirname, '../..');
const START_MS = 60_000;

/** Runs a built script of the project to its end. */
function run(script: string, env: NodeJS.ProcessEnv): Promise<void> {
  return new Promise((done, fail) => {
    const child = spawn(process.execPath, [path.join(ROOT, script)], {
      env,
      stdio: ['ignore', 'ignore', 'inherit'],
    });
    child.on('error', fail);
    child.on('exit', (code) => (code === 0 ? done() : fail(new Error(`${script} ended with ${code}`))));
  });
}

/** Starts the built server and waits until it says where it listens. */
function serve(env: NodeJS.ProcessEnv): Promise<{ child: ChildProcess; url: string }> {
  return new Promise((done, fail) => {
    const child = spawn(process.execPath, [path.join(ROOT, 'backend/dist/main.js')], {
      env,
      stdio: ['ignore', 'pipe', 'inherit'],
    });
    const timer = setTimeout(() => fail(new Error('The server did not say that it listens.')), START_MS);
    let said = '';
    child.stdout.on('data', (chunk: Buffer) => {
      said = (said + chunk.toString()).slice(-5000);
      const url = /listens at (http:\/\/\S+)/.exec(said)?.[1];
      if (url === undefined) return;
      clearTimeout(timer);
      done({ child, url });
    });
    child.on('error', fail);
    child.on('exit', (code) => fail(new Error(`The server ended with ${code} before it listened.`)));
  });
}

/** Signs in once per role; the journeys start from these sessions, so that the sign-in throttle stays out of the way. */
async function keepSession(url: string, role: Role): Promise<void> {
  const context = await request.newContext({ baseURL: url });
  const data = { email: `${role}@brackenbay.example`, password: DEMO_PASSWORD };
  const response = await context.post('/api/auth/sign-in', { data });
  if (!response.ok()) throw new Error(`Signing in as ${role}: ${response.status()} ${await response.text()}`);
  await context.storageState({ path: stateFile(role) });
  await context.dispose();
}

/** Demo data in a folder of its own, the built server on a free loopback port; both go when the journeys end. */
export default async function startServer(): Promise<() => Promise<void>> {
  const folder = mkdtempSync(path.join(tmpdir(), 'stageyard-journeys-'));
  const env = {
    ...process.env,
    HOST: '127.0.0.1',
    PORT: '0',
    STAGEYARD_DATA: path.join(folder, 'data'),
    STAGEYARD_DEMO: 'on',
    PUBLIC_URL: '',
    LOG_LEVEL: 'error',
  };
  await run('seed/dist/load.js', env);
  const { child, url } = await serve(env);
  process.env.STAGEYARD_JOURNEY_URL = url;
  process.env.STAGEYARD_JOURNEY_FOLDER = folder;
  for (const role of ROLES) await keepSession(url, role);
  return async () => {
    const ended = new Promise((done) => child.once('exit', done));
    child.kill('SIGTERM');
    await Promise.race([ended, new Promise((done) => setTimeout(done, 5000))]);
    rmSync(folder, { recursive: true, force: true });
  };
}
