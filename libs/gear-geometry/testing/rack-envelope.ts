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
  tipShortening?: number;
}

/** One gear cut by a rack; the transverse section, mm and radians. */
export class RackEnvelope {
  readonly z: number;
  readonly reference: number;
  readonly tip: number;
  readonly root: number;
  private readonly m: number;
  private readonly tanAlpha: number;
  private readonly cosBeta: number;
  private readonly shift: number;
  private readonly rounding: { depth: number; offset: number; radius: number };
  /** Depths below the datum line where the straight flank and the whole rack end. */
  readonly flankEnd: number;
  private readonly deepest: number;

  /** Fewer `samples` are quicker and still right away from the onset of undercut. */
  constructor(
    gear: EnvelopeGear,
    private readonly samples = 80,
  ) {
    const m = gear.m ?? 1;
    const alpha = ((gear.alphaDeg ?? 20) * Math.PI) / 180;
    const radius = (gear.tipRadius ?? 0.38) * m;
    this.z = gear.z;
    this.m = m;
    this.tanAlpha = Math.tan(alpha);
    this.cosBeta = Math.cos(((gear.betaDeg ?? 0) * Math.PI) / 180);
    this.shift = (gear.x ?? 0) * m;
    this.reference = (gear.z * m) / (2 * this.cosBeta);
    this.tip = this.reference + ((gear.addendum ?? 1) - (gear.tipShortening ?? 0)) * m + this.shift;
    this.deepest = (gear.dedendum ?? 1.25) * m;
    this.root = this.reference + this.shift - this.deepest;
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

  /** Half the gap's angle left by the straight flank alone, down to `keepOff` above its end. */
  reachOfFlank(radius: number, keepOff = 0): number {
    return this.bestOfFlank(radius, keepOff).value;
  }

  /** Depth of the flank's point that shapes the tooth at a radius. */
  flankDepthAt(radius: number): number {
    return this.flankEnd - this.bestOfFlank(radius).at ** 3;
  }

  /** Half the gap's angle left by the tip rounding alone. */
  reachOfRounding(radius: number): number {
    const { depth: centre, offset, radius: round } = this.rounding;
    if (round === 0) return this.reachAt(radius, this.deepest, offset);
    const from = Math.asin((this.flankEnd - centre) / round);
    return greatest(
      0,
      Math.cbrt(Math.PI / 2 - from),
      (t) => {
        const angle = from + t ** 3;
        return this.reachAt(radius, centre + round * Math.sin(angle), offset + round * Math.cos(angle));
      },
      this.samples,
    ).value;
  }

  /**
   * Half the gap's angle left by the part of the flank furthest from its end that reaches as far as it can: the
   * smooth flank, without the bite of the flank's end below it.
   */
  reachOfUpperFlank(radius: number): number {
    return this.peaksOfFlank(radius, 0).at(-1)?.value ?? Number.NEGATIVE_INFINITY;
  }

  private bestOfFlank(radius: number, keepOff = 0): Peak {
    const candidates = this.peaksOfFlank(radius, keepOff);
    return candidates.reduce((best, peak) => (peak.value > best.value ? peak : best), {
      at: 0,
      value: Number.NEGATIVE_INFINITY,
    });
  }

  /** Cubed steps crowd towards the flank's end, where the interesting part is tiny at the onset of undercut. */
  private peaksOfFlank(radius: number, keepOff: number): Peak[] {
    // A sharp corner is the flank's end too: keep the two apart.
    const from = Math.max(keepOff, this.rounding.radius === 0 ? this.m / 1000 : 0);
    const reach = (t: number) => {
      const depth = this.flankEnd - t ** 3;
      return this.reachAt(radius, depth, this.flankWidth(depth));
    };
    return peaks(Math.cbrt(from), Math.cbrt(this.flankEnd + this.m), reach, this.samples);
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

interface Peak {
  at: number;
  value: number;
}

/** Greatest value of a function, with where it is. */
export function greatest(low: number, high: number, value: (at: number) => number, samples = 80): Peak {
  return peaks(low, high, value, samples).reduce((best, peak) => (peak.value > best.value ? peak : best), {
    at: low,
    value: Number.NEGATIVE_INFINITY,
  });
}

/** Every local maximum: samples, then golden section around each sample not below its neighbours. */
function peaks(low: number, high: number, value: (at: number) => number, samples: number): Peak[] {
  const step = (high - low) / samples;
  const values = Array.from({ length: samples + 1 }, (_, i) => value(low + i * step));
  return values.flatMap((here, i) => {
    const hidden = here < (values[i - 1] ?? here) || here < (values[i + 1] ?? here);
    if (here === Number.NEGATIVE_INFINITY || hidden) return [];
    const peak = refine(Math.max(low, low + (i - 1) * step), Math.min(high, low + (i + 1) * step), value);
    return [peak.value > here ? peak : { at: low + i * step, value: here }];
  });
}

function refine(low: number, high: number, value: (at: number) => number): Peak {
  let [left, right] = [low, high];
  for (let i = 0; i < 40; i++) {
    const third = (right - left) * 0.3819660112501051;
    if (value(left + third) > value(right - third)) right -= third;
    else left += third;
  }
  const at = (left + right) / 2;
  return { at, value: value(at) };
}

/** Where a condition that holds at `low` stops holding on the way to `high`, by halving. */
export function turningPoint(low: number, high: number, holds: (at: number) => boolean): number {
  let [a, b] = [low, high];
  for (let i = 0; i < 48; i++) {
    const mid = (a + b) / 2;
    if (holds(mid)) a = mid;
    else b = mid;
  }
  return (a + b) / 2;
}
