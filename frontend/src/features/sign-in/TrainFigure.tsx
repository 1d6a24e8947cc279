import { meshGeometry, toothOutline, type GearInput } from '@stageyard/libs/gear-geometry';
import { Dimension } from '../../drawings/Dimension';
import { DASH_DOT, INK, pathOf, type Point } from '../../drawings/ink';
import { meshPose } from '../../drawings/meshPose';
import { TurnArrow } from '../../drawings/TurnArrow';

interface Pair {
  pinion: GearInput;
  wheel: GearInput;
}

interface Placed {
  centre: Point;
  outline: string;
  pitch: number;
  root: number;
}

/** 18/72 · 20/75 = 4 · 3.75 = 15 : 1; a shift that leaves the small pinion its flanks. */
const STAGES: Pair[] = [
  {
    pinion: { teeth: 18, module: 1.5, profileShift: 0.2 },
    wheel: { teeth: 72, module: 1.5, profileShift: -0.2 },
  },
  {
    pinion: { teeth: 20, module: 2, profileShift: 0.2 },
    wheel: { teeth: 75, module: 2, profileShift: -0.2 },
  },
];

/** px per mm. */
const SCALE = 3.3;
const EDGE = { left: 12, top: 12, foot: 34 };

/** Both gears of a stage in the pose in which their flanks touch, the pinion's axis `from` mm along the row of shafts. */
function place({ pinion, wheel }: Pair, from: number, middle: number) {
  const mesh = meshGeometry({ pinion, wheel });
  const pose = meshPose(mesh, pinion.teeth, wheel.teeth);
  const drawn = (gear: GearInput, axis: number, turn: number, pitch: number, root: number): Placed => {
    const centre = { x: EDGE.left + axis * SCALE, y: middle };
    // The pose has the pinion above the wheel; a quarter turn lays it to the left. Paper's y points up, the screen's down.
    const [cos, sin] = [Math.cos(turn + Math.PI / 2), Math.sin(turn + Math.PI / 2)];
    const points = toothOutline(gear).map(({ x, y }) => ({
      x: centre.x + (x * cos - y * sin) * SCALE,
      y: centre.y - (x * sin + y * cos) * SCALE,
    }));
    return { centre, outline: pathOf(points, true), pitch: pitch * SCALE, root: (root / 2) * SCALE };
  };
  const { gear, centreDistance } = mesh;
  return {
    centreDistance,
    tip: { pinion: gear.pinion.tipDiameter / 2, wheel: gear.wheel.tipDiameter / 2 },
    pinion: drawn(pinion, from, pose.pinionTurn, pose.pinionPitchRadius, gear.pinion.rootDiameter),
    wheel: drawn(
      wheel,
      from + centreDistance,
      pose.wheelTurn,
      pose.wheelPitchRadius,
      gear.wheel.rootDiameter,
    ),
  };
}

function layOut() {
  const [first, second] = STAGES as [Pair, Pair];
  const start = meshGeometry(first).gear.pinion.tipDiameter / 2;
  const tallest = meshGeometry(second).gear.wheel.tipDiameter / 2;
  const middle = EDGE.top + tallest * SCALE;
  const one = place(first, start, middle);
  const two = place(second, start + one.centreDistance, middle);
  return {
    one,
    two,
    middle,
    width: 2 * EDGE.left + (start + one.centreDistance + two.centreDistance + two.tip.wheel) * SCALE,
    height: middle + tallest * SCALE + EDGE.foot,
  };
}

/** A two-stage train to scale, seen from its output: every flank in contact. Says nothing a screen reader needs. */
export function TrainFigure() {
  const { one, two, middle, width, height } = layOut();
  const at = height - 10;
  return (
    <svg
      viewBox={`0 0 ${width.toFixed(1)} ${height.toFixed(1)}`}
      width="100%"
      style={{ display: 'block' }}
      aria-hidden="true"
    >
      <Gear gear={one.wheel} fill={INK.wheel} web />
      <Gear gear={one.pinion} fill={INK.pinion} shaft={5} />
      <Gear gear={two.wheel} fill={INK.wheel} web shaft={10} />
      <Gear gear={two.pinion} fill={INK.pinion} shaft={7.5} />
      <path
        d={`M2 ${middle}H${width - 2}`}
        stroke={INK.centre}
        strokeWidth={0.8}
        strokeDasharray={DASH_DOT}
      />
      <TurnArrow centre={one.pinion.centre} radius={31} clockwise />
      <Dimension
        from={{ x: one.pinion.centre.x, y: middle + one.tip.pinion * SCALE + 8 }}
        to={{ x: two.pinion.centre.x, y: middle + one.tip.wheel * SCALE + 8 }}
        at={at}
        direction="horizontal"
        text={one.centreDistance.toFixed(1)}
      />
      <Dimension
        from={{ x: two.pinion.centre.x, y: middle + one.tip.wheel * SCALE + 8 }}
        to={{ x: two.wheel.centre.x, y: middle + two.tip.wheel * SCALE + 4 }}
        at={at}
        direction="horizontal"
        text={two.centreDistance.toFixed(1)}
      />
    </svg>
  );
}

interface GearProps {
  gear: Placed;
  fill: string;
  /** Radius of the shaft seen in section, mm; left out where something stands in front of it. */
  shaft?: number;
  /** A rim and a hub, as on a turned wheel. */
  web?: boolean;
}

function Gear({ gear: { centre, outline, pitch, root }, fill, shaft, web = false }: GearProps) {
  const { x, y } = centre;
  const circle = (r: number, colour: string, width: number) => (
    <circle cx={x} cy={y} r={r} fill="none" stroke={colour} strokeWidth={width} />
  );
  return (
    <>
      <path d={outline} fill={fill} stroke={INK.outline} strokeWidth={1} strokeLinejoin="round" />
      {web && circle(root - 5 * SCALE, INK.outline, 0.7)}
      {web && shaft !== undefined && circle(1.9 * shaft * SCALE, INK.outline, 0.7)}
      <circle
        cx={x}
        cy={y}
        r={pitch}
        fill="none"
        stroke={INK.centre}
        strokeWidth={0.8}
        strokeDasharray={DASH_DOT}
      />
      {shaft !== undefined && (
        <circle cx={x} cy={y} r={shaft * SCALE} fill={INK.sheet} stroke={INK.outline} strokeWidth={1} />
      )}
      <path
        d={`M${x} ${y - pitch - 12}V${y + pitch + 12}`}
        stroke={INK.centre}
        strokeWidth={0.8}
        strokeDasharray={DASH_DOT}
      />
    </>
  );
}
