import { describe, expect, it } from 'vitest';
import { heightOfLines, wrappedLines } from './row-height.js';

describe('lines of text that wraps in a column', () => {
  it('are one for what fits, and for nothing at all', () => {
    expect(wrappedLines('', 10)).toBe(1);
    expect(wrappedLines('Housing', 12)).toBe(1);
  });

  it('are one a word where no two fit beside each other', () => {
    expect(wrappedLines('housing bearing locating', 10)).toBe(3);
  });

  it('break a word that is longer than the column, and go on after it', () => {
    expect(wrappedLines('8'.repeat(40), 10)).toBeGreaterThanOrEqual(4);
    expect(wrappedLines(`${'8'.repeat(40)} housing bearing`, 10)).toBeGreaterThan(
      wrappedLines('8'.repeat(40), 10),
    );
  });

  it('count the lines that the text itself begins', () => {
    expect(wrappedLines('Stage 1 pinion\nKW-00275', 20)).toBe(2);
  });

  it('are never fewer for bold or indented text', () => {
    const text = 'Stage 1 wheel, Stage 2 wheel, Stage 3 pinion, Shaft 2, locating bearing';
    for (let width = 8; width < 80; width += 1) {
      const plain = wrappedLines(text, width);
      expect(wrappedLines(text, width, { bold: true })).toBeGreaterThanOrEqual(plain);
      expect(wrappedLines(text, width, { indent: 1 })).toBeGreaterThanOrEqual(plain);
    }
  });

  // Typeset by an office suite with a wide face, in columns of these widths: never more lines than counted here.
  it.each([
    ['Tooth thickness allowance unknown, counted as none; bore 20 mm, shaft 12 mm: step the seat up.', 42, 2],
    ['Stage 1 wheel, Stage 2 wheel, Stage 3 pinion, Shaft 2, locating bearing', 19, 4],
    [
      'Keyway: t1 4.0 mm in the shaft, t2 3.3 mm in the hub. Key 18 mm is longer than the hub, 15 mm; not in the library.',
      42,
      3,
    ],
    ['Spur gear z 74, m 1.5, 20°, x 0, face 15 mm, bore 30 mm', 36, 2],
  ])('cover what was seen on paper: %s', (text, width, seen) => {
    const counted = wrappedLines(text, width, { indent: 1 });
    expect(counted).toBeGreaterThanOrEqual(seen);
    expect(counted).toBeLessThanOrEqual(seen + 1);
  });
});

describe('the height of a row', () => {
  it('grows with its lines and stops where a sheet stops', () => {
    expect(heightOfLines(2)).toBeGreaterThan(heightOfLines(1));
    expect(heightOfLines(1000)).toBe(409);
  });
});
