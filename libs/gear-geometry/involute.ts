/** Involute function inv α = tan α − α, α in radians, 0 ≤ α < π/2 (ISO 21771). */
export function involute(alpha: number): number {
  return Math.tan(alpha) - alpha;
}

/** t − atan t, the involute of the angle whose tangent is t; a series near 0 keeps all digits there. */
export function involuteOfTangent(t: number): number {
  if (Math.abs(t) > 0.02) return t - Math.atan(t);
  const t2 = t * t;
  return t * t2 * (1 / 3 - t2 * (1 / 5 - t2 * (1 / 7 - t2 / 9)));
}

/** Involute of 80°, beyond which no gear pair works. */
const GREATEST_INVOLUTE = involute((80 * Math.PI) / 180);

/**
 * The angle (radians) whose involute is `value`, or 0 when there is none between 0° and 80°.
 * Newton's method from above: tan α − α is convex, so the steps fall steadily onto the root.
 */
export function inverseInvolute(value: number): number {
  if (!(value > 0) || value > GREATEST_INVOLUTE) return 0;
  // inv α > α³/3, so this start lies above the root; 1.4 rad is where 80° begins.
  let alpha = Math.min(Math.cbrt(3 * value), 1.4);
  for (let step = 0; step < 60; step++) {
    const t = Math.tan(alpha);
    const correction = (involuteOfTangent(t) - value) / (t * t);
    alpha -= correction;
    if (Math.abs(correction) <= 1e-16 * alpha) break;
  }
  return alpha;
}
