import { ArrowHead } from './ArrowHead';
import { INK, type Point } from './ink';

interface TurnArrowProps {
  centre: Point;
  /** px */
  radius: number;
  clockwise: boolean;
  colour?: string;
  /** Length of the head, px. */
  head?: number;
  stroke?: number;
}

/** The arc with a head that marks the input shaft and its sense of rotation, over the top of the axis. */
export function TurnArrow({
  centre,
  radius,
  clockwise,
  colour = INK.dimension,
  head = 7,
  stroke = 1.4,
}: TurnArrowProps) {
  // SVG's y points down, so a growing angle turns clockwise on the screen.
  const sense = clockwise ? 1 : -1;
  const top = -Math.PI / 2;
  const sweep = (150 * Math.PI) / 180;
  const from = top - (sense * sweep) / 2;
  const tipAngle = top + (sense * sweep) / 2;
  const neck = tipAngle - (sense * head * 0.8) / radius;
  const at = (angle: number): Point => ({
    x: centre.x + radius * Math.cos(angle),
    y: centre.y + radius * Math.sin(angle),
  });
  const start = at(from);
  const end = at(neck);
  const tip = at(tipAngle);
  // The head follows the chord over its own length, or it would stand off the arc.
  const pointing = Math.atan2(tip.y - end.y, tip.x - end.x);
  return (
    <g>
      <path
        d={`M${start.x.toFixed(2)} ${start.y.toFixed(2)}A${radius} ${radius} 0 0 ${clockwise ? 1 : 0} ${end.x.toFixed(2)} ${end.y.toFixed(2)}`}
        fill="none"
        stroke={colour}
        strokeWidth={stroke}
      />
      <ArrowHead tip={tip} angle={pointing} colour={colour} length={head} />
    </g>
  );
}
