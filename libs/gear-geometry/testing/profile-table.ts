import { RackEnvelope, type EnvelopeGear } from './rack-envelope.js';

const INTERVALS = 900;

/**
 * The rolled profile tabulated for speed: the parts left by flank and rounding apart, each smooth, so that the
 * edge where they cross stays sharp. Cubic interpolation between the entries.
 */
export class ProfileTable {
  readonly z: number;
  readonly tip: number;
  readonly root: number;
  private readonly flank: number[];
  private readonly rounding: number[];

  constructor(gear: EnvelopeGear) {
    const cut = new RackEnvelope(gear, 24);
    this.z = cut.z;
    this.tip = cut.tip;
    this.root = cut.root;
    const radii = Array.from(
      { length: INTERVALS + 1 },
      (_, i) => this.root + ((this.tip - this.root) * i) / INTERVALS,
    );
    this.flank = radii.map((radius) => cut.reachOfUpperFlank(radius));
    this.rounding = radii.map((radius) => cut.reachOfRounding(radius));
  }

  /** Half the gap's angle at a radius. */
  gapAt(radius: number): number {
    const place = ((radius - this.root) / (this.tip - this.root)) * INTERVALS;
    const first = Math.max(0, Math.min(INTERVALS - 3, Math.floor(place) - 1));
    const t = place - first;
    return Math.max(cubic(this.flank, first, t), cubic(this.rounding, first, t));
  }
}

/** Lagrange interpolation through four entries; out of reach when any of them is. */
function cubic(table: readonly number[], first: number, t: number): number {
  const [a = 0, b = 0, c = 0, d = 0] = table.slice(first, first + 4);
  const value =
    (-a * (t - 1) * (t - 2) * (t - 3)) / 6 +
    (b * t * (t - 2) * (t - 3)) / 2 -
    (c * t * (t - 1) * (t - 3)) / 2 +
    (d * t * (t - 1) * (t - 2)) / 6;
  return Number.isFinite(value) ? value : Number.NEGATIVE_INFINITY;
}
