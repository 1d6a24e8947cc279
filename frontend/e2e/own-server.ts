import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

const MAIN = path.join(import.meta.dirname, '../../backend/dist/main.js');
const START_MS = 30_000;

export interface OwnServer {
  /** The link for the first administrator, as it stands on the console. */
  link: string;
  close: () => Promise<void>;
}

/** The built server as a team starts it: no demo mode, an empty data folder, a free loopback port. */
export async function startOwnServer(): Promise<OwnServer> {
  const folder = mkdtempSync(path.join(tmpdir(), 'stageyard-own-'));
  const child = spawn(process.execPath, [MAIN], {
    env: {
      ...process.env,
      HOST: '127.0.0.1',
      PORT: '0',
      STAGEYARD_DATA: path.join(folder, 'data'),
      STAGEYARD_DEMO: 'off',
      PUBLIC_URL: '',
      LOG_LEVEL: 'error',
    },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const link = await new Promise<string>((done, fail) => {
    const timer = setTimeout(() => fail(new Error('The server printed no link.')), START_MS);
    let said = '';
    child.stdout.on('data', (chunk: Buffer) => {
      said += chunk.toString();
      const found = /(http:\/\/\S+\/accept-invite\?token=\S+)\s/.exec(said)?.[1];
      if (found === undefined) return;
      clearTimeout(timer);
      done(found);
    });
    child.on('error', fail);
    child.on('exit', (code) => fail(new Error(`The server ended with ${code} before it printed a link.`)));
  });
  return {
    link,
    close: async () => {
      const ended = new Promise((done) => child.once('exit', done));
      child.kill('SIGTERM');
      await Promise.race([ended, new Promise((done) => setTimeout(done, 5000))]);
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
