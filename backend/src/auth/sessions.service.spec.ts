import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { DataSource } from 'typeorm';
import { Clock } from '../common/clock.js';
import { WriteQueue } from '../database/write-queue.js';
import { addPerson } from '../testing/people.js';
import { openTempApp, type TempApp } from '../testing/temp-app.js';
import { IDLE_MS, LIFETIME_MS, SessionsService } from './sessions.service.js';

const HOUR = 3_600_000;

let temp: TempApp;
let sessions: SessionsService;
let queue: WriteQueue;
beforeAll(async () => {
  temp = await openTempApp();
  sessions = temp.app.get(SessionsService);
  queue = temp.app.get(WriteQueue);
});
afterAll(() => temp.close());

const start = Date.now();
let elapsed = 0;
beforeEach(() => {
  elapsed = 0;
  vi.spyOn(temp.app.get(Clock), 'now').mockImplementation(() => new Date(start + elapsed));
});
afterEach(() => vi.restoreAllMocks());

async function newCookie(): Promise<string> {
  const { id } = await addPerson(temp.app);
  return (await queue.run((manager) => sessions.start(manager, id))).cookie;
}

/** Asks for the person, and waits for the note of the last use, which the answer does not wait for. */
async function isAlive(cookie: string): Promise<boolean> {
  const person = await sessions.personOf(cookie);
  await queue.run(() => Promise.resolve());
  return person !== null;
}

describe('a session', () => {
  it('ends after 12 hours without use', async () => {
    const cookie = await newCookie();
    elapsed = IDLE_MS - 1;
    expect(await isAlive(cookie)).toBe(true);
    elapsed += IDLE_MS;
    expect(await isAlive(cookie)).toBe(false);
    expect(IDLE_MS).toBe(12 * HOUR);
  });

  it('slides along while it is used, and ends 30 days after the sign-in', async () => {
    const cookie = await newCookie();
    for (let hours = 11; hours < 30 * 24; hours += 11) {
      elapsed = hours * HOUR;
      expect(await isAlive(cookie)).toBe(true);
    }
    elapsed = LIFETIME_MS;
    expect(await isAlive(cookie)).toBe(false);
    expect(LIFETIME_MS).toBe(30 * 24 * HOUR);
  });

  it('is cleared away from the database once it is over', async () => {
    await newCookie();
    elapsed = LIFETIME_MS + HOUR;
    await newCookie();
    const rows = await temp.app
      .get(DataSource)
      .query<{ expiresAt: string }[]>('SELECT "expiresAt" FROM "sessions"');
    expect(rows).toHaveLength(1);
  });

  it('cannot be taken from what the database holds', async () => {
    const cookie = await newCookie();
    const claims = JSON.parse(Buffer.from(cookie.split('.')[1] ?? '', 'base64url').toString()) as {
      sid: string;
    };
    const rows = await temp.app.get(DataSource).query<object[]>('SELECT * FROM "sessions"');
    expect(claims.sid.length).toBeGreaterThan(40);
    expect(JSON.stringify(rows)).not.toContain(claims.sid);
  });
});
