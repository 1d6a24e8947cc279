import { ProfileTable } from './profile-table.js';
import { greatest, turningPoint, type EnvelopeGear } from './rack-envelope.js';

/*
 * Two outlines cut by the rack, turned against each other: where they touch decides everything. It knows
 * nothing of base circles, lines of action or involutes.
 *
 * The pinion's axis is the origin, the wheel's axis is at (0, a). Angles are measured from the line of centres
 * and count towards +x, so both gears turn forwards with growing angles. A wheel tooth stands in a gap of
 * the pinion; the pinion tooth behind it (towards −x) pushes it.
 */
export class RollingPair {
  readonly pinion: ProfileTable;
  readonly wheel: ProfileTable;
  private readonly speed: number;

  constructor(
    pinion: EnvelopeGear,
    wheel: EnvelopeGear,
    private readonly a: number,
  ) {
    this.pinion = new ProfileTable(pinion);
    this.wheel = new ProfileTable(wheel);
    this.speed = pinion.z / wheel.z;
  }

  /** Angle of the wheel tooth's centre at which one pinion flank touches it; `gap` is the pinion gap's centre. */
  pushed(gap: number): number {
    return greatest(
      this.pinion.root,
      this.pinion.tip,
      (radius) => this.touch(radius, gap - this.pinion.gapAt(radius)),
      60,
    ).value;
  }

  /** Wheel angle that would keep the speed ratio exactly, in step with contact on the line of centres. */
  steady(gap: number): number {
    const radius = (this.a * this.speed) / (1 + this.speed);
    return this.wheelHalfTooth(this.a - radius) + this.speed * (gap - this.pinion.gapAt(radius));
  }

  /** Contact ratio: the pinion angle over which one pair of flanks stays in touch, in pitches. */
  contactRatio(): number {
    const middle = this.pinion.gapAt((this.a * this.speed) / (1 + this.speed));
    const pitch = (2 * Math.PI) / this.pinion.z;
    // Flanks part with the square of the angle past the end, so two small gaps show where the end is.
    const endOn = (side: 1 | -1) => {
      const at = (gap: number) =>
        Math.abs(
          turningPoint(0, side * 1.4 * pitch, (turn) => {
            const angle = middle + turn;
            return this.steady(angle) - this.pushed(angle) < gap;
          }),
        );
      return 2 * at(1e-8) - at(4e-8);
    };
    return (endOn(1) + endOn(-1)) / pitch;
  }

  /** Play of the wheel, radians, with the pinion held: from touching one flank to touching the other. */
  play(gap: number): number {
    const pitch = [(2 * Math.PI) / this.pinion.z, (2 * Math.PI) / this.wheel.z] as const;
    let forwards = Number.NEGATIVE_INFINITY;
    let backwards = Number.NEGATIVE_INFINITY;
    for (const tooth of [-1, 0, 1]) {
      forwards = Math.max(forwards, this.pushed(gap + tooth * pitch[0]) - tooth * pitch[1]);
      backwards = Math.max(backwards, this.pushed(-gap + tooth * pitch[0]) - tooth * pitch[1]);
    }
    return -(forwards + backwards);
  }

  /**
   * Greatest depth (mm) of the wheel's tip corner inside the pinion's tooth on the way in, at steady speed;
   * 0 when it never enters.
   */
  cornerDepth(): number {
    const profile = Array.from({ length: 600 }, (_, i) => {
      const radius = this.pinion.root + ((this.pinion.tip - this.pinion.root) * i) / 599;
      return { radius, angle: this.pinion.gapAt(radius) };
    });
    const middle = this.pinion.gapAt((this.a * this.speed) / (1 + this.speed));
    const pitch = (2 * Math.PI) / this.pinion.z;
    let deepest = 0;
    for (let i = 0; i <= 400; i++) {
      const gap = middle - pitch + (1.5 * pitch * i) / 400;
      const corner = this.steady(gap) - this.wheelHalfTooth(this.wheel.tip);
      const x = this.wheel.tip * Math.sin(corner);
      const y = this.a - this.wheel.tip * Math.cos(corner);
      const radius = Math.hypot(x, y);
      if (radius < this.pinion.root || radius > this.pinion.tip) continue;
      const intoTooth = gap - Math.atan2(x, y);
      if (intoTooth <= this.pinion.gapAt(radius)) continue;
      // In the pinion's own frame: distance to the nearest of the profile's points.
      let nearest = Number.POSITIVE_INFINITY;
      for (const point of profile) {
        const turn = intoTooth - point.angle;
        const square = (radius - point.radius) ** 2 + 4 * radius * point.radius * Math.sin(turn / 2) ** 2;
        nearest = Math.min(nearest, square);
      }
      deepest = Math.max(deepest, Math.sqrt(nearest));
    }
    return deepest;
  }

  private wheelHalfTooth(radius: number): number {
    return Math.PI / this.wheel.z - this.wheel.gapAt(radius);
  }

  /** Wheel angle at which its flank touches a pinion point given in polar form. */
  private touch(radius: number, angle: number): number {
    const x = radius * Math.sin(angle);
    const y = this.a - radius * Math.cos(angle);
    const wheelRadius = Math.hypot(x, y);
    if (wheelRadius > this.wheel.tip || wheelRadius < this.wheel.root) return Number.NEGATIVE_INFINITY;
    return Math.atan2(x, y) + this.wheelHalfTooth(wheelRadius);
  }
}
