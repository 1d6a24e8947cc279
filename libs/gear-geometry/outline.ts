import { FieldChecks } from './check-fields.js';
import { checkGear } from './check-gear.js';
import { figuresOf } from './gear-radii.js';
import { involute, involuteOfTangent } from './involute.js';
import { deepestEps, filletRadius, filletTurn } from './trochoid.js';
import { type GearFigures, type GearInput, type ResolvedGear } from './types.js';

/** A point in the transverse plane, mm, y upwards. */
export interface OutlinePoint {
  x: number;
  y: number;
}

/** A point of one flank: radius (mm) and half the tooth's angle there (radians). */
interface FlankPoint {
  radius: number;
  halfAngle: number;
}

/**
 * The gear as its rack cuts it, as one closed outline in the transverse plane: fillet, involute, tip arc and
 * root arc of every tooth, undercut and the mean thickness allowance included. Centred on the axis, the first
 * tooth centred on +y, counter-clockwise; the first point is not repeated at the end.
 * `pointsPerFlank` (4 to 200, default 12) counts the points of one fillet and one involute together.
 */
export function toothOutline(
  input: GearInput,
  { pointsPerFlank = 12 }: { pointsPerFlank?: number } = {},
): OutlinePoint[] {
  const checks = new FieldChecks();
  const gear = checkGear(input, '', checks);
  checks.number('pointsPerFlank', pointsPerFlank, 'Points per flank', { min: 4, max: 200 });
  checks.finish();
  if (gear === null) throw new Error('A gear without issues must resolve.');

  const flank = flankPoints(gear, figuresOf(gear), Math.floor(pointsPerFlank));
  const pitch = (2 * Math.PI) / gear.teeth;
  const points: OutlinePoint[] = [];
  for (let tooth = 0; tooth < gear.teeth; tooth++) {
    const centre = tooth * pitch;
    for (const { radius, halfAngle } of flank) points.push(polar(radius, centre - halfAngle));
    const tip = flank.at(-1) as FlankPoint;
    points.push(polar(tip.radius, centre));
    for (const { radius, halfAngle } of flank.toReversed()) points.push(polar(radius, centre + halfAngle));
    const root = flank[0] as FlankPoint;
    points.push(polar(root.radius, centre + pitch / 2));
  }
  return points;
}

/** Angle counter-clockwise from +y. */
function polar(radius: number, angle: number): OutlinePoint {
  return { x: -radius * Math.sin(angle), y: radius * Math.cos(angle) };
}

/** One flank from the root circle up to the tip circle. */
function flankPoints(gear: ResolvedGear, figures: GearFigures, count: number): FlankPoint[] {
  const tip = figures.rackTip;
  // Half the gap's angle where the involute starts on the base circle.
  const gap =
    (Math.PI / 2 - 2 * gear.effectiveShift * Math.tan(gear.alpha)) / gear.teeth - involute(gear.alphaT);
  const point = (radius: number, turn: number): FlankPoint => ({
    radius,
    // Where both fillets have cut through the tooth, nothing is left of it.
    halfAngle: Math.max(0, Math.PI / gear.teeth - gap - turn),
  });
  const deepest = deepestEps(tip);
  const involuteLeft = figures.formReach < figures.tipReach;
  const last = involuteLeft ? figures.filletEnd : epsAtRadius(figures);
  const onFillet = Math.max(2, Math.floor(count / 2));
  const onInvolute = Math.max(2, count - onFillet);
  const points: FlankPoint[] = [];
  for (let i = 0; i < onFillet; i++) {
    const eps = deepest + ((last - deepest) * i) / (onFillet - (involuteLeft ? 0 : 1));
    points.push(point(filletRadius(tip, eps), filletTurn(tip, eps)));
  }
  for (let i = 0; involuteLeft && i < onInvolute; i++) {
    const reach = figures.formReach + ((figures.tipReach - figures.formReach) * i) / (onInvolute - 1);
    points.push(point(Math.hypot(figures.base, reach), involuteOfTangent(reach / figures.base)));
  }
  return points;
}

/** ε where the fillet passes the tip circle of a gear that undercut has left without an involute. */
function epsAtRadius(figures: GearFigures): number {
  let outside = 0;
  let inside = deepestEps(figures.rackTip);
  for (let step = 0; step < 60; step++) {
    const mid = (outside + inside) / 2;
    if (filletRadius(figures.rackTip, mid) > figures.tip) outside = mid;
    else inside = mid;
  }
  return inside;
}
