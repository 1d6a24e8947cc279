import { beforeEach, describe, expect, it } from 'vitest';
import { Clock } from '../common/clock.js';
import { type ProblemError } from '../common/errors.js';
import { MOST_WRONG, PAUSE_MS, SignInThrottle, WINDOW_MS } from './sign-in-throttle.js';

let now = 0;
let throttle: SignInThrottle;
beforeEach(() => {
  now = Date.parse('2026-03-02T08:00:00Z');
  const clock = new Clock();
  clock.now = () => new Date(now);
  throttle = new SignInThrottle(clock);
});

const wrong = () => Promise.resolve(null);
const right = () => Promise.resolve('person');

async function wrongTimes(times: number, address = '10.0.0.1', email = 'a@b.example'): Promise<void> {
  for (let count = 0; count < times; count += 1) await throttle.guard(address, email, wrong);
}

describe('SignInThrottle', () => {
  it('makes an e-mail wait out the pause after too many wrong attempts, from any address', async () => {
    await wrongTimes(MOST_WRONG.email);
    now += 20_000;
    const refusal = await throttle
      .guard('10.0.0.2', 'a@b.example', right)
      .catch((error: ProblemError) => error);
    expect(refusal).toMatchObject({ statusCode: 429, extra: { retryAfterSeconds: PAUSE_MS / 1000 - 20 } });
    now += PAUSE_MS - 20_000;
    expect(await throttle.guard('10.0.0.2', 'a@b.example', right)).toBe('person');
  });

  it('makes every further wrong attempt wait again', async () => {
    await wrongTimes(MOST_WRONG.email);
    now += PAUSE_MS;
    await wrongTimes(1);
    await expect(wrongTimes(1)).rejects.toThrow('Wait 60 seconds');
  });

  it('makes an address wait that guesses over many e-mails', async () => {
    for (let count = 0; count < MOST_WRONG.address; count += 1)
      await wrongTimes(1, '10.0.0.9', `p${count}@b.example`);
    await expect(throttle.guard('10.0.0.9', 'fresh@b.example', right)).rejects.toThrow('Wait');
    expect(await throttle.guard('10.0.0.1', 'fresh@b.example', right)).toBe('person');
  });

  it('starts afresh after a right attempt, for the e-mail but not for the address', async () => {
    for (let round = 0; round < 5; round += 1) {
      await wrongTimes(MOST_WRONG.email - 1);
      await throttle.guard('10.0.0.1', 'a@b.example', right);
    }
    await wrongTimes(MOST_WRONG.address - 5 * (MOST_WRONG.email - 1), '10.0.0.1', 'c@b.example');
    await expect(throttle.guard('10.0.0.1', 'd@b.example', right)).rejects.toThrow('Wait');
  });

  it('forgets wrong attempts after the window', async () => {
    await wrongTimes(MOST_WRONG.email - 1);
    now += WINDOW_MS;
    await wrongTimes(MOST_WRONG.email - 1);
    expect(await throttle.guard('10.0.0.1', 'a@b.example', right)).toBe('person');
  });

  it('counts an attempt that throws as wrong', async () => {
    const broken = () => Promise.reject(new Error('link over'));
    for (let count = 0; count < MOST_WRONG.email; count += 1) {
      await expect(throttle.guard('10.0.0.1', 'first-admin', broken)).rejects.toThrow('link over');
    }
    await expect(throttle.guard('10.0.0.1', 'first-admin', broken)).rejects.toThrow('Wait');
  });
});
