import { ArrowHead } from './ArrowHead';
import { INK, type Point } from './ink';

interface DimensionProps {
  /** The two points measured, px. */
  from: Point;
  to: Point;
  /** Where the dimension line lies: y of a horizontal one, x of a vertical one. */
  at: number;
  direction: 'horizontal' | 'vertical';
  text: string;
}

const GAP = 2.5;
const PAST = 3;
const HEAD = 9;

/** Extension lines, a dimension line with arrow heads, and its figure above the line (ISO 129-1). */
export function Dimension({ from, to, at, direction, text }: DimensionProps) {
  const flat = direction === 'horizontal';
  const [a, b] = flat ? [from.x, to.x] : [from.y, to.y];
  const [low, high] = a < b ? [a, b] : [b, a];
  const along = (value: number): Point => (flat ? { x: value, y: at } : { x: at, y: value });
  const tight = high - low < 4 * HEAD;
  const middle = along((low + high) / 2);
  // Too short for heads inside: they point inwards from outside.
  const outward = flat ? Math.PI : -Math.PI / 2;
  const inward = flat ? 0 : Math.PI / 2;
  const run = tight ? [low - 2 * HEAD, high + 2 * HEAD] : [low, high];
  const [start, end] = [along(run[0] ?? low), along(run[1] ?? high)];
  return (
    <g stroke={INK.dimension} strokeWidth={0.8}>
      {[from, to].map((point, which) => (
        <Extension key={which} point={point} at={at} flat={flat} />
      ))}
      <line x1={start.x} y1={start.y} x2={end.x} y2={end.y} />
      <g stroke="none">
        <ArrowHead tip={along(low)} angle={tight ? inward : outward} colour={INK.dimension} length={HEAD} />
        <ArrowHead tip={along(high)} angle={tight ? outward : inward} colour={INK.dimension} length={HEAD} />
        <text
          x={middle.x}
          y={middle.y}
          dy={flat ? -4 : 0}
          textAnchor="middle"
          fontSize={12}
          fill={INK.dimension}
          transform={flat ? undefined : `rotate(-90 ${middle.x} ${middle.y}) translate(0 -4)`}
        >
          {text}
        </text>
      </g>
    </g>
  );
}

function Extension({ point, at, flat }: { point: Point; at: number; flat: boolean }) {
  const reach = at - (flat ? point.y : point.x);
  if (Math.abs(reach) < GAP) return null;
  const sign = Math.sign(reach);
  return flat ? (
    <line x1={point.x} x2={point.x} y1={point.y + sign * GAP} y2={at + sign * PAST} />
  ) : (
    <line y1={point.y} y2={point.y} x1={point.x + sign * GAP} x2={at + sign * PAST} />
  );
}
