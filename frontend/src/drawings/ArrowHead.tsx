import type { Point } from './ink';

interface ArrowHeadProps {
  tip: Point;
  /** Where the arrow points, radians, SVG axes (y down). */
  angle: number;
  colour: string;
  length?: number;
}

/** A slim filled arrow head, somewhat more than twice as long as wide. */
export function ArrowHead({ tip, angle, colour, length = 7 }: ArrowHeadProps) {
  const half = length / 4.6;
  const back = (side: number): string => {
    const x = tip.x - length * Math.cos(angle) - side * half * Math.sin(angle);
    const y = tip.y - length * Math.sin(angle) + side * half * Math.cos(angle);
    return `${x.toFixed(2)},${y.toFixed(2)}`;
  };
  return <polygon points={`${tip.x.toFixed(2)},${tip.y.toFixed(2)} ${back(1)} ${back(-1)}`} fill={colour} />;
}
