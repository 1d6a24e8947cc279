import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock.js';
import { ProblemError } from '../common/errors.js';

/** Wrong attempts that are let through before a pause, within the window. */
export const MOST_WRONG = { address: 40, email: 8 } as const;
export const WINDOW_MS = 10 * 60_000;
export const PAUSE_MS = 60_000;
const MOST_KEYS = 20_000;

interface Tally {
  wrong: number;
  last: number;
}

/**
 * Slows down guessing. Wrong attempts are counted per address and per e-mail; beyond the limit each further one
 * has to wait out a pause after the one before. Kept in memory: a restart forgets it.
 */
@Injectable()
export class SignInThrottle {
  private readonly tallies = new Map<string, Tally>();

  constructor(private readonly clock: Clock) {}

  /**
   * Counts an attempt as wrong until `succeeded` takes it back, so that many at once cannot slip through.
   * @throws ProblemError 429 saying how long to wait
   */
  attempt(address: string, email: string): void {
    const now = this.clock.now().getTime();
    const keys = keysOf(address, email);
    const wait = Math.max(...keys.map(({ key, most }) => this.waitFor(key, most, now)));
    if (wait > 0) throw tooMany(Math.ceil(wait / 1000));
    for (const { key } of keys) this.count(key, now);
  }

  /** The attempt was right: it does not count, and the e-mail starts afresh. */
  succeeded(address: string, email: string): void {
    const [byAddress, byEmail] = keysOf(address, email);
    this.tallies.delete(byEmail.key);
    const tally = this.tallies.get(byAddress.key);
    if (tally) tally.wrong -= 1;
  }

  private waitFor(key: string, most: number, now: number): number {
    const tally = this.tallies.get(key);
    if (!tally || now - tally.last >= WINDOW_MS || tally.wrong < most) return 0;
    return tally.last + PAUSE_MS - now;
  }

  private count(key: string, now: number): void {
    const tally = this.tallies.get(key);
    const wrong = tally && now - tally.last < WINDOW_MS ? tally.wrong + 1 : 1;
    // Taken out first, so that the map stays ordered by the last attempt and the oldest key goes first.
    this.tallies.delete(key);
    this.tallies.set(key, { wrong, last: now });
    if (this.tallies.size > MOST_KEYS) this.tallies.delete(this.tallies.keys().next().value ?? '');
  }
}

function keysOf(address: string, email: string) {
  return [
    { key: `address ${address}`, most: MOST_WRONG.address },
    { key: `email ${email}`, most: MOST_WRONG.email },
  ] as const;
}

function tooMany(seconds: number): ProblemError {
  const message = `Too many wrong attempts. Wait ${seconds} seconds, then try again.`;
  return new ProblemError(429, 'too-many-attempts', message, { extra: { retryAfterSeconds: seconds } });
}
