import { meshGeometry, shiftForPolicy } from '../../gear-geometry/index.js';
import { InputError } from '../../units/index.js';
import { type OptionRequest } from '../index.js';

/**
 * The option search written down as plainly as possible, straight from the engineering model: every sequence of
 * pairs is looked at, ratios are whole-number fractions throughout. Slow; for small spaces only. It shares no
 * code with the search it checks.
 */
export interface PlainTrain {
  key: string;
  objective: bigint;
  n: bigint;
  d: bigint;
  distance: bigint;
  teeth: number[];
  length: number;
}

interface PlainPair {
  z1: number;
  z2: number;
  a: number;
  mg: number;
  tip1: number;
  tip2: number;
}

export function exhaustiveSearch(request: OptionRequest): PlainTrain[] {
  const { ratio, stages, envelope, objective } = request;
  const module = [...request.modules].sort((a, b) => a - b)[0] as number;
  const wall = envelope?.wall ?? 0;
  const faceWidth = Math.ceil((request.faceWidthFactor ?? 10) * module - 1e-9);
  const [target, targetScale] = fraction(ratio.target);
  const [tolerance, toleranceScale] = fraction(ratio.tolerancePercent);
  const separateOrders = objective === 'mass' || envelope !== undefined;
  const pairs = plainPairs(request, module, faceWidth);
  const found: PlainTrain[] = [];

  const visit = (train: PlainPair[]): void => {
    if (train.length >= stages.min) consider(train);
    if (train.length === stages.max) return;
    for (const pair of pairs) visit([...train, pair]);
  };
  const consider = (train: PlainPair[]): void => {
    const turn = train.length % 2 === 0 ? 'same' : 'opposite';
    if ((request.direction ?? 'any') !== 'any' && request.direction !== turn) return;
    const n = train.reduce((product, { z2 }) => product * BigInt(z2), 1n);
    const d = train.reduce((product, { z1 }) => product * BigInt(z1), 1n);
    // |n/d ÷ target − 1| · 100 ≤ tolerance, multiplied out.
    const off = absolute(n * targetScale - d * target);
    if (off * 100n * toleranceScale > tolerance * d * target) return;
    if (!separateOrders && !isStandardOrder(train)) return;
    const length = lengthOf(train);
    if (envelope) {
      const height = 2 * Math.max(...train.map(({ tip1, tip2 }) => Math.max(tip1, tip2)));
      const width = train.length * faceWidth + (train.length - 1) * 5;
      const room = (limit: number | undefined, size: number) =>
        limit === undefined || Math.round((size + 2 * wall) * 1e6) <= Math.round(limit * 1e6);
      if (!room(envelope.length, length) || !room(envelope.height, height)) return;
      if (!room(envelope.width, width)) return;
    }
    const whole = (sum: number) => BigInt(Math.round(sum));
    const distance = whole(train.reduce((sum, { a }) => sum + a, 0) * 1e6);
    const mass = whole(train.reduce((sum, { mg }) => sum + mg, 0));
    found.push({
      key: train.map(({ z1, z2 }) => `${z1}/${z2}m${module}`).join('+'),
      objective: objective === 'mass' ? mass : objective === 'centre-distance' ? distance : 0n,
      n,
      d,
      distance,
      teeth: train.flatMap(({ z1, z2 }) => [z1, z2]),
      length,
    });
  };
  visit([]);
  const error = (train: PlainTrain) => absolute(train.n * targetScale - train.d * target);
  return found
    .sort((a, b) => {
      const byError = sign(error(a) * b.d - error(b) * a.d);
      const order = sign(a.objective - b.objective) || byError || sign(a.distance - b.distance);
      return order || compareTeeth(a.teeth, b.teeth);
    })
    .slice(0, request.limit ?? 50);
}

function plainPairs(request: OptionRequest, module: number, faceWidth: number): PlainPair[] {
  const { teeth, stageRatio, pressureAngleDeg = 20, helixAngleDeg = 0, shiftPolicy = 'none' } = request;
  const [least, leastScale] = fraction(stageRatio?.min ?? 1);
  const [most, mostScale] = fraction(stageRatio?.max ?? 1_000_000);
  const pairs: PlainPair[] = [];
  for (let z1 = teeth.pinion.min; z1 <= teeth.pinion.max; z1++) {
    for (let z2 = teeth.wheel.min; z2 <= teeth.wheel.max; z2++) {
      if (BigInt(z2) * leastScale < BigInt(z1) * least || BigInt(z2) * mostScale > BigInt(z1) * most)
        continue;
      const shape = { module, pressureAngleDeg, helixAngleDeg };
      const gears = { pinion: { ...shape, teeth: z1 }, wheel: { ...shape, teeth: z2 } };
      const mesh = unlessRefused(() => {
        const { pinionShift, wheelShift } = shiftForPolicy({ ...gears, policy: shiftPolicy });
        return meshGeometry({
          pinion: { ...gears.pinion, profileShift: pinionShift },
          wheel: { ...gears.wheel, profileShift: wheelShift },
          allowance: request.centreDistanceAllowance ?? 0,
        });
      });
      if (!mesh || mesh.contactRatio < (request.leastContactRatio ?? 1.2)) continue;
      const { pinion, wheel } = mesh.gear;
      if (request.undercut === 'refuse' && (pinion.undercut || wheel.undercut)) continue;
      if (Math.min(pinion.tipThickness, wheel.tipThickness) < 0.2 * module) continue;
      const fatal = ['interference', 'tip-hits-root', 'no-backlash'];
      if (mesh.findings.some(({ code, severity }) => severity === 'fail' && fatal.includes(code))) continue;
      const area = (Math.PI / 4) * (pinion.referenceDiameter ** 2 + wheel.referenceDiameter ** 2);
      pairs.push({
        z1,
        z2,
        a: mesh.centreDistance,
        mg: area * faceWidth * 7.85,
        tip1: pinion.tipDiameter / 2,
        tip2: wheel.tipDiameter / 2,
      });
    }
  }
  return pairs;
}

/** Larger ratio first, equal ratios smaller pinion first. */
function isStandardOrder(train: PlainPair[]): boolean {
  return train.slice(1).every((pair, index) => {
    const before = train[index] as PlainPair;
    const apart = before.z2 * pair.z1 - pair.z2 * before.z1;
    return apart > 0 || (apart === 0 && before.z1 <= pair.z1);
  });
}

function lengthOf(train: PlainPair[]): number {
  const ends: number[] = [];
  let axis = 0;
  for (const { a, tip1, tip2 } of train) {
    ends.push(axis - tip1, axis + tip1);
    axis += a;
    ends.push(axis - tip2, axis + tip2);
  }
  return Math.max(...ends) - Math.min(...ends);
}

/** A plain decimal as numerator and denominator. */
export function fraction(decimal: string | number): [bigint, bigint] {
  const [whole = '0', decimals = ''] = String(decimal).split('.');
  return [BigInt(whole + decimals), 10n ** BigInt(decimals.length)];
}

/** Fewer stages first, then tooth by tooth. */
function compareTeeth(a: number[], b: number[]): number {
  if (a.length !== b.length) return a.length - b.length;
  const place = a.findIndex((teeth, index) => teeth !== b[index]);
  return place < 0 ? 0 : (a[place] as number) - (b[place] as number);
}

function absolute(value: bigint): bigint {
  return value < 0n ? -value : value;
}

function sign(value: bigint): number {
  return value < 0n ? -1 : value > 0n ? 1 : 0;
}

function unlessRefused<T>(work: () => T): T | null {
  try {
    return work();
  } catch (error) {
    if (error instanceof InputError) return null;
    throw error;
  }
}
