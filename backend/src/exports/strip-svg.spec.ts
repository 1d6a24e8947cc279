import { type StripShape } from '@stageyard/libs/train-planner';
import { describe, expect, it } from 'vitest';
import { stripSvg } from './strip-svg.js';

const SHAPE: StripShape = {
  bounds: { x: -10, y: -30, width: 80, height: 60 },
  axes: [
    { x: 0, y: 0 },
    { x: 40, y: 0 },
  ],
  gears: [
    { x: 0, y: 0, tipRadius: 10, pitchRadius: 9, stage: 0, role: 'pinion' },
    { x: 40, y: 0, tipRadius: 30, pitchRadius: 31, stage: 0, role: 'wheel' },
  ],
  inputArrow: { x: 0, y: 0, radius: 12, clockwise: true },
};

const numbers = (svg: string, pattern: RegExp) =>
  [...svg.matchAll(pattern)].map((match) => match.slice(1).map(Number));

describe('the drawing of a train strip', () => {
  it('is to scale and holds every gear inside its box', () => {
    const svg = stripSvg(SHAPE, 300, 100);
    const [frame] = numbers(svg, /viewBox="(\S+) (\S+) (\S+) (\S+)"/g);
    const [left = 0, top = 0, width = 0, height = 0] = frame ?? [];
    expect(width / height).toBeCloseTo(3, 3);
    const circles = numbers(svg, /cx="(\S+)" cy="(\S+)" r="(\S+)"/g);
    expect(circles).toHaveLength(4);
    for (const [x = 0, y = 0, r = 0] of circles) {
      expect(x - r).toBeGreaterThanOrEqual(left);
      expect(x + r).toBeLessThanOrEqual(left + width);
      expect(y - r).toBeGreaterThanOrEqual(top);
      expect(y + r).toBeLessThanOrEqual(top + height);
    }
    // Tip and pitch radii go in as they are: mm are the drawing's units.
    expect(circles.map((circle) => circle[2]).sort((a = 0, b = 0) => a - b)).toEqual([9, 10, 30, 31]);
  });

  it('turns the arrow the way the input turns', () => {
    const sweep = (clockwise: boolean) => {
      const svg = stripSvg({ ...SHAPE, inputArrow: { ...SHAPE.inputArrow, clockwise } }, 300, 100);
      const [arc] = numbers(svg, /M(\S+) \S+A\S+ \S+ 0 0 ([01]) (\S+) /g);
      return arc;
    };
    // On a screen a sweep of 1 runs clockwise: from the left over the top to the right.
    const [from = 0, flag, to = 0] = sweep(true) ?? [];
    expect(flag).toBe(1);
    expect(from).toBeLessThan(to);
    const [back = 0, other, end = 0] = sweep(false) ?? [];
    expect(other).toBe(0);
    expect(back).toBeGreaterThan(end);
  });
});
