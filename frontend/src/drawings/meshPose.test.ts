import { meshGeometry, toothOutline, type GearInput } from '@stageyard/libs/gear-geometry';
import { describe, expect, it } from 'vitest';
import type { Point } from './ink';
import { meshPose } from './meshPose';
import { barLength } from './ScaleBar';

function placed(outline: readonly Point[], centre: Point, turn: number): Point[] {
  const [cos, sin] = [Math.cos(turn), Math.sin(turn)];
  return outline.map(({ x, y }) => ({ x: centre.x + x * cos - y * sin, y: centre.y + x * sin + y * cos }));
}

/** Even-odd rule. */
function inside({ x, y }: Point, polygon: readonly Point[]): boolean {
  let within = false;
  polygon.forEach((a, at) => {
    const b = polygon[(at + 1) % polygon.length] ?? a;
    if (a.y > y !== b.y > y && x < a.x + ((b.x - a.x) * (y - a.y)) / (b.y - a.y)) within = !within;
  });
  return within;
}

function distanceTo({ x, y }: Point, polygon: readonly Point[]): number {
  return Math.min(
    ...polygon.map((a, at) => {
      const b = polygon[(at + 1) % polygon.length] ?? a;
      const length2 = (b.x - a.x) ** 2 + (b.y - a.y) ** 2;
      const along = length2 === 0 ? 0 : ((x - a.x) * (b.x - a.x) + (y - a.y) * (b.y - a.y)) / length2;
      const t = Math.min(1, Math.max(0, along));
      return Math.hypot(x - a.x - t * (b.x - a.x), y - a.y - t * (b.y - a.y));
    }),
  );
}

const PAIRS: [string, GearInput, GearInput, number | undefined][] = [
  ['without backlash', { teeth: 18, module: 2 }, { teeth: 41, module: 2 }, undefined],
  ['with play', { teeth: 18, module: 2 }, { teeth: 41, module: 2 }, 59.15],
  [
    'shifted',
    { teeth: 12, module: 1, profileShift: 0.35 },
    { teeth: 50, module: 1, profileShift: 0.1 },
    undefined,
  ],
];

describe('meshPose', () => {
  it.each(PAIRS)(
    '%s: the drawn flanks touch and do not run into each other',
    (_, pinion, wheel, centreDistance) => {
      const mesh = meshGeometry({
        pinion,
        wheel,
        ...(centreDistance === undefined ? {} : { centreDistance }),
      });
      const pose = meshPose(mesh, pinion.teeth, wheel.teeth);
      const near = ({ x, y }: Point) => Math.hypot(x, y) < 3 * pinion.module;
      const driver = placed(toothOutline(pinion), pose.pinionCentre, pose.pinionTurn).filter(near);
      const driven = placed(toothOutline(wheel), pose.wheelCentre, pose.wheelTurn);
      const distances = driver.map((point) => ({
        gap: distanceTo(point, driven),
        bites: inside(point, driven),
      }));
      expect(Math.min(...distances.map(({ gap }) => gap))).toBeLessThan(0.01);
      expect(Math.max(0, ...distances.filter(({ bites }) => bites).map(({ gap }) => gap))).toBeLessThan(
        0.005,
      );
    },
  );

  it('lays A and E on the line from T1 to T2, as far apart as the path of contact is long', () => {
    const mesh = meshGeometry({ pinion: { teeth: 20, module: 2 }, wheel: { teeth: 60, module: 2 } });
    const { t1, t2, a, e } = meshPose(mesh, 20, 60);
    expect(Math.hypot(t2.x - t1.x, t2.y - t1.y)).toBeCloseTo(mesh.tangentPointDistance, 9);
    expect(Math.hypot(e.x - a.x, e.y - a.y)).toBeCloseTo(mesh.pathOfContact, 9);
    expect((t2.x - t1.x) * (a.y - t1.y) - (t2.y - t1.y) * (a.x - t1.x)).toBeCloseTo(0, 9);
  });
});

describe('barLength', () => {
  it('is 1, 2 or 5 times a power of ten, and fits', () => {
    expect([0.03, 0.5, 1, 1.99, 7, 49, 50, 180].map(barLength)).toEqual([0.02, 0.5, 1, 1, 5, 20, 50, 100]);
  });
});
