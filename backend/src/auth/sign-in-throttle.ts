import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock.js';
import { ProblemError } from '../common/errors.js';

/** Wrong attempts that are let through before a pause, within the window. */
export const MOST_WRONG = { address: 40, email: 8 } as const;
export const WINDOW_MS = 10 * 60_000;
export const PAUSE_MS = 60_000;
const MOST_KEYS = 20_000;

interface ThrottleKey {
  name: string;
  most: number;
  /** Whether a right attempt clears the tally: one known account must not clear an address that guesses others. */
  forgives: boolean;
}

interface Tally {
  wrong: number;
  last: number;
}

/**
 * Slows down guessing. Wrong attempts are counted per address and per e-mail; beyond the limit each further one
 * has to wait out a pause after the one before. Right attempts never count. Kept in memory: a restart forgets it.
 */
@Injectable()
export class SignInThrottle {
  private readonly tallies = new Map<string, Tally>();
  private tail: Promise<unknown> = Promise.resolve();

  constructor(private readonly clock: Clock) {}

  /**
   * Makes an attempt unless too many before it were wrong. Attempts are made one after the other, so that many at
   * once cannot slip through, and hashing never takes more than one core.
   * @param attempt gives null when it was wrong; one that throws counts as wrong too
   * @throws ProblemError 429 saying how long to wait
   */
  guard<T>(address: string, email: string, attempt: () => Promise<T | null>): Promise<T | null> {
    const keys = keysOf(address, email);
    const result = this.tail.then(() => this.inTurn(keys, attempt));
    this.tail = result.catch(() => undefined);
    return result;
  }

  private async inTurn<T>(keys: readonly ThrottleKey[], attempt: () => Promise<T | null>): Promise<T | null> {
    const now = this.clock.now().getTime();
    const wait = Math.max(...keys.map((key) => this.waitFor(key, now)));
    if (wait > 0) throw tooMany(Math.ceil(wait / 1000));
    let found: T | null = null;
    try {
      found = await attempt();
    } finally {
      for (const { name, forgives } of keys) {
        if (found === null) this.count(name, now);
        else if (forgives) this.tallies.delete(name);
      }
    }
    return found;
  }

  private waitFor({ name, most }: ThrottleKey, now: number): number {
    const tally = this.tallies.get(name);
    if (!tally || now - tally.last >= WINDOW_MS || tally.wrong < most) return 0;
    return tally.last + PAUSE_MS - now;
  }

  private count(name: string, now: number): void {
    const tally = this.tallies.get(name);
    const wrong = tally && now - tally.last < WINDOW_MS ? tally.wrong + 1 : 1;
    // Taken out first, so that the map stays ordered by the last attempt and the oldest key goes first.
    this.tallies.delete(name);
    this.tallies.set(name, { wrong, last: now });
    if (this.tallies.size > MOST_KEYS) this.tallies.delete(this.tallies.keys().next().value ?? '');
  }
}

function keysOf(address: string, email: string): readonly ThrottleKey[] {
  return [
    { name: `address ${address}`, most: MOST_WRONG.address, forgives: false },
    { name: `email ${email}`, most: MOST_WRONG.email, forgives: true },
  ];
}

function tooMany(seconds: number): ProblemError {
  const message = `Too many wrong attempts. Wait ${seconds} seconds, then try again.`;
  return new ProblemError(429, 'too-many-attempts', message, { extra: { retryAfterSeconds: seconds } });
}
