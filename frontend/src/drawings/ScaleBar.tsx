import { INK } from './ink';

const STEPS = [1, 2, 5];

/** The longest of 1, 2, 5 × 10ⁿ mm that is at most `most` mm long. */
export function barLength(most: number): number {
  const power = 10 ** Math.floor(Math.log10(most));
  return Math.max(...STEPS.map((step) => step * power).filter((length) => length <= most * (1 + 1e-9)));
}

/** A bar of a round length; `x` is its right end. */
export function ScaleBar({ x, y, pxPerMm }: { x: number; y: number; pxPerMm: number }) {
  const length = barLength(150 / pxPerMm);
  const wide = length * pxPerMm;
  return (
    <g stroke={INK.outline} strokeWidth={1}>
      <path d={`M${x - wide} ${y - 4}v8M${x} ${y - 4}v8M${x - wide} ${y}h${wide}`} fill="none" />
      <text x={x - wide / 2} y={y - 7} textAnchor="middle" fontSize={12} fill={INK.text} stroke="none">
        {`${length} mm`}
      </text>
    </g>
  );
}
