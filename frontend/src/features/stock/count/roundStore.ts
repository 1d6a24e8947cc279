import { EMPTY_ROUND, type CountRound } from './countTypes';

/** The round of one person on this device. Every change is written at once, so that a closed tab loses nothing. */
export interface RoundStore {
  get: () => CountRound;
  change: (step: (round: CountRound) => CountRound) => void;
  subscribe: (told: () => void) => () => void;
  /** False when this browser keeps nothing: the round then lives only as long as the page. */
  isKept: () => boolean;
}

const stores = new Map<string, RoundStore>();

/** The round of a person; the same store for every caller. */
export function roundStore(userId: string): RoundStore {
  const known = stores.get(userId) ?? openStore(`stageyard.count.${userId}`);
  stores.set(userId, known);
  return known;
}

function openStore(key: string): RoundStore {
  const listeners = new Set<() => void>();
  const tell = () => listeners.forEach((told) => told());
  let kept = true;
  let round = read(key);
  // Another tab of the same browser counts, too.
  window.addEventListener('storage', (event) => {
    if (event.key !== key) return;
    round = parse(event.newValue);
    tell();
  });
  return {
    get: () => round,
    isKept: () => kept,
    change: (step) => {
      // What another tab wrote a moment ago must not be written over.
      round = step(kept ? read(key, round) : round);
      try {
        localStorage.setItem(key, JSON.stringify(round));
        kept = true;
      } catch {
        kept = false;
      }
      tell();
    },
    subscribe: (told) => {
      listeners.add(told);
      return () => listeners.delete(told);
    },
  };
}

function read(key: string, otherwise: CountRound = EMPTY_ROUND): CountRound {
  try {
    const text = localStorage.getItem(key);
    return text === null ? otherwise : parse(text);
  } catch {
    return otherwise;
  }
}

function parse(text: string | null): CountRound {
  try {
    const stored = JSON.parse(text ?? '') as Partial<CountRound> | null;
    if (typeof stored?.place === 'string' && Array.isArray(stored.counts)) return stored as CountRound;
  } catch {
    // Nothing there, or not ours: an empty round.
  }
  return EMPTY_ROUND;
}
