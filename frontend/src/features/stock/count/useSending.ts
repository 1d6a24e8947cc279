import { useCallback, useEffect, useRef, useState } from 'react';
import { asProblem } from '../../../api/problem';
import { waiting } from './countTypes';
import { refused, taken } from './roundChanges';
import type { RoundStore } from './roundStore';
import { keepMovement } from './shelfCache';
import { sendCount } from './sendCount';

/** While the network is away it is tried again this often, ms. */
const AGAIN = 15_000;

/**
 * Sends what waits, one after the other in the order it was typed, as long as the page is open. Without an answer
 * everything stays where it is and is tried again, with the same keys.
 * @param count how many wait: more of them start the sending
 * @returns whether the network is away, and what tries again at once
 */
export function useSending(store: RoundStore, count: number): { away: boolean; tryAgain: () => void } {
  const [away, setAway] = useState(false);
  const busy = useRef(false);

  const run = useCallback(async () => {
    if (busy.current) return;
    busy.current = true;
    try {
      for (;;) {
        const [next] = waiting(store.get());
        if (next === undefined) return;
        try {
          const movement = await sendCount(next);
          store.change((round) => taken(round, next.key, movement));
          keepMovement(movement);
        } catch (error) {
          const problem = asProblem(error);
          // What the server could not do just now it may do later; only what it will never take is refused.
          if (
            problem.noAnswer ||
            problem.signedOut ||
            problem.statusCode === 429 ||
            problem.statusCode >= 500
          ) {
            setAway(true);
            return;
          }
          store.change((round) => refused(round, next.key, problem));
        }
        setAway(false);
      }
    } finally {
      busy.current = false;
    }
  }, [store]);

  const tryAgain = useCallback(() => void run(), [run]);
  useEffect(() => {
    if (count > 0) tryAgain();
  }, [count, tryAgain]);
  useEffect(() => {
    const timer = setInterval(tryAgain, AGAIN);
    window.addEventListener('online', tryAgain);
    return () => {
      clearInterval(timer);
      window.removeEventListener('online', tryAgain);
    };
  }, [tryAgain]);

  return { away, tryAgain };
}
