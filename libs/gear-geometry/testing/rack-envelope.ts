/*
 * A second opinion on generated teeth, for tests only: it knows the shape of the rack and nothing of
 * trochoids, involutes or base circles. On each circle of the gear it tries where the rack, rolling past,
 * reaches furthest into the tooth.
 */

export interface EnvelopeGear {
  z: number;
  m?: number;
  alphaDeg?: number;
  betaDeg?: number;
  x?: number;
  addendum?: number;
  dedendum?: number;
  tipRadius?: number;
}

/** One gear cut by a rack; the transverse section, mm and radians. */
export class RackEnvelope {
  readonly z: number;
  readonly reference: number;
  readonly tip: number;
  private readonly m: number;
  private readonly tanAlpha: number;
  private readonly cosBeta: number;
  private readonly shift: number;
  private readonly rounding: { depth: number; offset: number; radius: number };
  /** Depths below the datum line where the straight flank and the whole rack end. */
  private readonly flankEnd: number;
  private readonly deepest: number;

  constructor(gear: EnvelopeGear) {
    const m = gear.m ?? 1;
    const alpha = ((gear.alphaDeg ?? 20) * Math.PI) / 180;
    const radius = (gear.tipRadius ?? 0.38) * m;
    this.z = gear.z;
    this.m = m;
    this.tanAlpha = Math.tan(alpha);
    this.cosBeta = Math.cos(((gear.betaDeg ?? 0) * Math.PI) / 180);
    this.shift = (gear.x ?? 0) * m;
    this.reference = (gear.z * m) / (2 * this.cosBeta);
    this.tip = this.reference + (gear.addendum ?? 1) * m + this.shift;
    this.deepest = (gear.dedendum ?? 1.25) * m;
    const depth = this.deepest - radius;
    // A circle that touches the flank lies radius/cos α inside it, measured along the datum.
    const offset = this.flankWidth(depth) - radius / Math.cos(alpha);
    this.rounding = { depth, offset, radius };
    this.flankEnd = depth + radius * Math.sin(alpha);
  }

  /** Half the gap's angle at a radius. */
  gapAt(radius: number): number {
    return Math.max(this.reachOfFlank(radius), this.reachOfRounding(radius));
  }

  /** Half the gap's angle left by the straight flank alone. */
  reachOfFlank(radius: number): number {
    // A sharp corner is the flank's end too: keep the two apart.
    const end = this.rounding.radius === 0 ? this.flankEnd - this.m / 1000 : this.flankEnd;
    return greatest(-this.m, end, (depth) => this.reachAt(radius, depth, this.flankWidth(depth))).value;
  }

  /** The same for the tip rounding alone. */
  reachOfRounding(radius: number): number {
    const { depth: centre, offset, radius: round } = this.rounding;
    // Steps of angle around the rounding, so that its steep end is followed too.
    const from = Math.asin(Math.min(1, (this.flankEnd - centre) / (round || 1)));
    if (round === 0) return this.reachAt(radius, this.deepest, offset);
    return greatest(from, Math.PI / 2, (angle) =>
      this.reachAt(radius, centre + round * Math.sin(angle), offset + round * Math.cos(angle)),
    ).value;
  }

  /** Whether the flank's point `step` above its end reaches further into the tooth than its end does. */
  flankShapes(radius: number, step: number): boolean {
    const reach = (depth: number) => this.reachAt(radius, depth, this.flankWidth(depth));
    return reach(this.flankEnd - step) > reach(this.flankEnd);
  }

  private flankWidth(depth: number): number {
    return (Math.PI * this.m) / 4 - depth * this.tanAlpha;
  }

  /**
   * Angle into the tooth that the rack's point (depth below the datum, half width in the normal section)
   * reaches on the circle: the point meets the circle at two rack positions, one each side of the centre line.
   */
  private reachAt(radius: number, depth: number, halfWidth: number): number {
    const height = this.reference + this.shift - depth;
    if (height > radius) return Number.NEGATIVE_INFINITY;
    const across = Math.sqrt(radius * radius - height * height);
    const angle = Math.acos(height / radius);
    const after = angle - (across - halfWidth / this.cosBeta) / this.reference;
    const before = -angle - (-across - halfWidth / this.cosBeta) / this.reference;
    return Math.max(after, before);
  }
}

/** Greatest value of a function that is smooth between a few hundred samples. */
export function greatest(
  low: number,
  high: number,
  value: (at: number) => number,
  samples = 160,
): { at: number; value: number } {
  let best = { at: low, value: value(low) };
  const step = (high - low) / samples;
  for (let i = 1; i <= samples; i++) {
    const at = low + i * step;
    const found = value(at);
    if (found > best.value) best = { at, value: found };
  }
  let left = Math.max(low, best.at - step);
  let right = Math.min(high, best.at + step);
  for (let i = 0; i < 70; i++) {
    const third = (right - left) * 0.3819660112501051;
    const a = { at: left + third, value: value(left + third) };
    const b = { at: right - third, value: value(right - third) };
    if (a.value > best.value) best = a;
    if (b.value > best.value) best = b;
    if (a.value > b.value) right = b.at;
    else left = a.at;
  }
  return best;
}

/** Where a condition that holds at `low` stops holding on the way to `high`, by halving. */
export function turningPoint(low: number, high: number, holds: (at: number) => boolean): number {
  let [a, b] = [low, high];
  for (let i = 0; i < 60; i++) {
    const mid = (a + b) / 2;
    if (holds(mid)) a = mid;
    else b = mid;
  }
  return (a + b) / 2;
}
