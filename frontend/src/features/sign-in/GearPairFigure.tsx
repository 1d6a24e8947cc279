import { pathOf, INK, DASH_DOT, type Point } from '../../drawings/ink';

/** Points of a full involute outline with z teeth, module 1, no shift: enough for an ornament on the first page. */
function outline(teeth: number): Point[] {
  const alpha = (20 * Math.PI) / 180;
  const [pitch, tip, root] = [teeth / 2, teeth / 2 + 1, teeth / 2 - 1.25];
  const base = pitch * Math.cos(alpha);
  const involute = (angle: number) => Math.tan(angle) - angle;
  const halfAt = (radius: number) =>
    Math.PI / (2 * teeth) + involute(alpha) - involute(Math.acos(Math.min(1, base / radius)));
  const radii = Array.from({ length: 9 }, (_, step) => {
    const from = Math.max(base, root);
    return from + ((tip - from) * step) / 8;
  });
  const at = (radius: number, angle: number): Point => ({
    x: radius * Math.sin(angle),
    y: -radius * Math.cos(angle),
  });
  return Array.from({ length: teeth }, (_, tooth) => {
    const centre = (2 * Math.PI * tooth) / teeth;
    const foot = halfAt(radii[0] ?? root);
    return [
      at(root, centre - foot),
      ...radii.map((radius) => at(radius, centre - halfAt(radius))),
      ...[...radii].reverse().map((radius) => at(radius, centre + halfAt(radius))),
      at(root, centre + foot),
    ];
  }).flat();
}

const WHEEL = 41;
const PINION = 17;
const SCALE = 8.2;

/** A pinion and a wheel in mesh, drawn as on paper; says nothing a screen reader needs. */
export function GearPairFigure() {
  const distance = (WHEEL + PINION) / 2;
  const tilt = -0.5;
  const centre: Point = { x: 25, y: 25 };
  const mate: Point = { x: centre.x + distance * Math.cos(tilt), y: centre.y + distance * Math.sin(tilt) };
  const place = (teeth: number, at: Point, turn: number) =>
    pathOf(
      outline(teeth).map(({ x, y }) => ({
        x: (at.x + x * Math.cos(turn) - y * Math.sin(turn)) * SCALE,
        y: (at.y + x * Math.sin(turn) + y * Math.cos(turn)) * SCALE,
      })),
      true,
    );
  // A gap of the wheel faces a tooth of the pinion along the line of centres.
  const wheelTurn = tilt + Math.PI / 2 + Math.PI / WHEEL;
  const pinionTurn = tilt - Math.PI / 2;
  const shape = (teeth: number, at: Point, turn: number, fill: string) => (
    <>
      <path d={place(teeth, at, turn)} fill={fill} stroke={INK.outline} strokeWidth={1} />
      <circle
        cx={at.x * SCALE}
        cy={at.y * SCALE}
        r={(teeth / 2) * SCALE}
        fill="none"
        stroke={INK.centre}
        strokeWidth={0.8}
        strokeDasharray={DASH_DOT}
      />
      <circle cx={at.x * SCALE} cy={at.y * SCALE} r={teeth * 0.85} fill={INK.sheet} stroke={INK.outline} />
      <path
        d={`M${at.x * SCALE - teeth * 1.3} ${at.y * SCALE}h${teeth * 2.6}M${at.x * SCALE} ${at.y * SCALE - teeth * 1.3}v${teeth * 2.6}`}
        stroke={INK.centre}
        strokeWidth={0.8}
        strokeDasharray={DASH_DOT}
      />
    </>
  );
  return (
    <svg viewBox="0 0 520 400" width="100%" style={{ maxWidth: 520, display: 'block' }} aria-hidden="true">
      {shape(WHEEL, centre, wheelTurn, INK.wheel)}
      {shape(PINION, mate, pinionTurn, INK.pinion)}
      <path
        d={`M${centre.x * SCALE} ${centre.y * SCALE}L${mate.x * SCALE} ${mate.y * SCALE}`}
        stroke={INK.dimension}
        strokeWidth={1.2}
      />
    </svg>
  );
}
