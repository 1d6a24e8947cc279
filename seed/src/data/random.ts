/** Numbers that look random and are the same at every loading. */
export interface Random {
  /** From 0 up to, but not including, 1. */
  next(): number;
  /** A whole number from `least` to `most`, both included. */
  whole(least: number, most: number): number;
  /** True that often: 0 never, 1 always. */
  chance(share: number): boolean;
  /** One of a list that is not empty. */
  pick<T>(list: readonly T[]): T;
}

/** Random numbers that depend on the text alone, so that one more part changes nothing about the others. */
export function randomOf(text: string): Random {
  let state = hashOf(text);
  const next = () => {
    // Mulberry32: a published 32-bit generator, good enough for a demo (from memory).
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  return {
    next,
    whole: (least, most) => least + Math.floor(next() * (most - least + 1)),
    chance: (share) => next() < share,
    pick: <T>(list: readonly T[]): T => {
      const one = list[Math.floor(next() * list.length)];
      if (one === undefined) throw new Error('There is nothing to pick from an empty list.');
      return one;
    },
  };
}

/** FNV-1a, 32 bits. */
function hashOf(text: string): number {
  let hash = 0x811c9dc5;
  for (let i = 0; i < text.length; i += 1) hash = Math.imul(hash ^ text.charCodeAt(i), 0x01000193);
  return hash;
}
