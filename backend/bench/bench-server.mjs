import { fork } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { DEMO_PASSWORD } from '../dist/auth/demo-people.js';

/** A server that does not end by itself is ended by force after this. */
const PATIENCE_MS = 10_000;

/** A server of its own process on an empty folder and a free port; `close` ends it and removes the folder. */
export async function openBenchServer() {
  const dataDir = mkdtempSync(path.join(tmpdir(), 'stageyard-bench-'));
  const child = fork(fileURLToPath(new URL('./serving.mjs', import.meta.url)), {
    env: {
      ...process.env,
      STAGEYARD_DATA: dataDir,
      STAGEYARD_DEMO: 'on',
      LOG_LEVEL: 'error',
      PUBLIC_URL: '',
    },
  });
  const ended = new Promise((resolve) => child.once('exit', resolve));
  const close = async () => {
    if (child.connected) child.disconnect();
    const impatience = setTimeout(() => child.kill('SIGKILL'), PATIENCE_MS);
    await ended;
    clearTimeout(impatience);
    rmSync(dataDir, { recursive: true, force: true });
  };
  const answer = (kind) =>
    new Promise((resolve, reject) => {
      const hear = (message) => {
        if (message.kind === 'failed') reject(new Error(message.message));
        if (message.kind !== kind) return;
        child.off('message', hear);
        resolve(message);
      };
      child.on('message', hear);
      void ended.then(() => reject(new Error('The server of the bench ended.')));
    });
  try {
    const { url } = await answer('listening');
    const cookie = await signIn(url);
    return {
      dataDir,
      request: (method, place, body) => request(url, cookie, method, place, body),
      /** Tells the server something and waits for the answer of that kind. */
      ask(message, kind) {
        const heard = answer(kind);
        child.send(message);
        return heard;
      },
      tell: (message) => child.send(message),
      close,
    };
  } catch (error) {
    await close();
    throw error;
  }
}

async function signIn(url) {
  const body = JSON.stringify({ email: 'librarian@brackenbay.example', password: DEMO_PASSWORD });
  const headers = { 'content-type': 'application/json' };
  const response = await fetch(`${url}/api/auth/sign-in`, { method: 'POST', headers, body });
  if (response.status !== 200) throw new Error(`The bench cannot sign in: ${response.status}`);
  return response.headers.getSetCookie()[0].split(';')[0];
}

/** One request, timed from the call to the parsed answer. */
async function request(url, cookie, method, place, body) {
  const started = performance.now();
  const headers = { cookie, ...(body ? { 'content-type': 'application/json' } : {}) };
  const response = await fetch(url + place, {
    method,
    headers,
    ...(body ? { body: JSON.stringify(body) } : {}),
  });
  const answer = await response.json();
  return { status: response.status, body: answer, ms: performance.now() - started };
}
