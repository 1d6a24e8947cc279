import { meshGeometry, toothOutline, type GearInput, type MeshGeometry } from '@stageyard/libs/gear-geometry';
import { DomainError } from '@stageyard/libs/units';
import { useId, useMemo } from 'react';
import { formatFixed } from '../components/figures';
import { DASH_DOT, INK, pathOf, type Point } from './ink';
import { meshPose } from './meshPose';
import { ScaleBar } from './ScaleBar';

interface MeshDrawingProps {
  pinion: GearInput;
  wheel: GearInput;
  /** Operating distance, mm; left out, the zero-backlash distance. */
  centreDistance?: number;
  title?: string;
  /** Drawing area, px; it scales down with its container. */
  width?: number;
  height?: number;
  /** Close up on the mesh, or both gears whole. */
  view?: 'mesh' | 'whole';
}

/** Beside the drawing, not on it: across the teeth it could not be read, and on a phone it would shrink with them. */
const CAPTION = {
  display: 'flex',
  flexWrap: 'wrap',
  justifyContent: 'space-between',
  columnGap: 24,
  padding: '8px 14px',
  fontSize: '0.75rem',
  lineHeight: 1.4,
  color: INK.text,
} as const;

type Drawn = { mesh: MeshGeometry; pinion: Point[]; wheel: Point[] } | { refused: string };

function draw(pinion: GearInput, wheel: GearInput, centreDistance: number | undefined): Drawn {
  try {
    const mesh = meshGeometry({ pinion, wheel, ...(centreDistance === undefined ? {} : { centreDistance }) });
    return { mesh, pinion: toothOutline(pinion), wheel: toothOutline(wheel) };
  } catch (error) {
    if (error instanceof DomainError) return { refused: error.message };
    throw error;
  }
}

/**
 * Two generated outlines in mesh, the pinion above and driving clockwise, with the line of action and the path of
 * contact A–E in brass. What the library refuses is said in place of the drawing.
 */
export function MeshDrawing(props: MeshDrawingProps) {
  const { pinion, wheel, centreDistance, title, width = 860, height = 420, view = 'mesh' } = props;
  const clip = useId();
  const drawn = useMemo(() => draw(pinion, wheel, centreDistance), [pinion, wheel, centreDistance]);
  if ('refused' in drawn)
    return <p style={{ padding: '0 14px' }}>This pair cannot be drawn. {drawn.refused}</p>;

  const pose = meshPose(drawn.mesh, pinion.teeth, wheel.teeth);
  const { tipDiameter } = drawn.mesh.gear.pinion;
  const wheelTip = drawn.mesh.gear.wheel.tipDiameter;
  const tall = (tipDiameter + wheelTip) / 2 + drawn.mesh.centreDistance;
  const whole = Math.min((height - 24) / tall, (width - 24) / Math.max(tipDiameter, wheelTip));
  // Close up: about five teeth across, but never less of the pair than there is.
  const close = Math.max(whole, Math.min(width / (22 * pinion.module), height / (11 * pinion.module)));
  const scale = view === 'whole' ? whole : close;
  // Whole: the pair stands centred; close up: the pitch point does.
  const offset =
    view === 'whole' ? (pose.pinionCentre.y + tipDiameter / 2 + (pose.wheelCentre.y - wheelTip / 2)) / 2 : 0;
  const px = ({ x, y }: Point): Point => ({ x: width / 2 + x * scale, y: height / 2 - (y - offset) * scale });
  const place = (outline: Point[], centre: Point, turn: number): string => {
    const [cos, sin] = [Math.cos(turn), Math.sin(turn)];
    return pathOf(
      outline.map(({ x, y }) => px({ x: centre.x + x * cos - y * sin, y: centre.y + x * sin + y * cos })),
      true,
    );
  };
  const circle = (centre: Point, diameter: number, dashed: boolean, colour: string) => {
    const { x, y } = px(centre);
    return (
      <circle
        cx={x}
        cy={y}
        r={(diameter / 2) * scale}
        fill="none"
        stroke={colour}
        strokeWidth={0.8}
        strokeDasharray={dashed ? DASH_DOT : undefined}
      />
    );
  };
  const [t1, t2, a, e] = [px(pose.t1), px(pose.t2), px(pose.a), px(pose.e)];
  const angle = formatFixed(drawn.mesh.operatingPressureAngleDeg, 2);
  const name = title ?? `Pinion with ${pinion.teeth} teeth driving a wheel with ${wheel.teeth}`;
  return (
    <figure style={{ margin: 0 }}>
      <figcaption style={CAPTION}>
        <span>{`Pinion above, ${pinion.teeth} teeth, drives clockwise; wheel below, ${wheel.teeth} teeth. Pitch circles dash-dot.`}</span>
        <span style={{ color: INK.dimension }}>
          {`Line of action at ${angle}°, path of contact A to E ${formatFixed(drawn.mesh.pathOfContact, 2)} mm`}
        </span>
      </figcaption>
      <svg
        role="img"
        aria-label={`${name}; contact runs from A to E over ${formatFixed(drawn.mesh.pathOfContact, 2)} mm`}
        viewBox={`0 0 ${width} ${height}`}
        style={{ display: 'block', width: '100%', height: 'auto', background: INK.sheet }}
      >
        <clipPath id={clip}>
          <rect width={width} height={height} />
        </clipPath>
        <g clipPath={`url(#${clip})`}>
          <path
            d={place(drawn.wheel, pose.wheelCentre, pose.wheelTurn)}
            fill={INK.wheel}
            stroke={INK.outline}
            strokeWidth={1.1}
          />
          <path
            d={place(drawn.pinion, pose.pinionCentre, pose.pinionTurn)}
            fill={INK.pinion}
            fillOpacity={0.85}
            stroke={INK.outline}
            strokeWidth={1.1}
          />
          {circle(pose.pinionCentre, tipDiameter, false, INK.faint)}
          {circle(pose.wheelCentre, wheelTip, false, INK.faint)}
          {circle(pose.pinionCentre, drawn.mesh.gear.pinion.baseDiameter, false, INK.centre)}
          {circle(pose.wheelCentre, drawn.mesh.gear.wheel.baseDiameter, false, INK.centre)}
          {circle(pose.pinionCentre, 2 * pose.pinionPitchRadius, true, INK.centre)}
          {circle(pose.wheelCentre, 2 * pose.wheelPitchRadius, true, INK.centre)}
          <line
            x1={width / 2}
            x2={width / 2}
            y1={0}
            y2={height}
            stroke={INK.centre}
            strokeWidth={0.8}
            strokeDasharray={DASH_DOT}
          />
          <line x1={t1.x} y1={t1.y} x2={t2.x} y2={t2.y} stroke={INK.dimension} strokeWidth={1} />
          {drawn.mesh.pathOfContact > 0 && (
            <>
              <line x1={a.x} y1={a.y} x2={e.x} y2={e.y} stroke={INK.dimension} strokeWidth={4} />
              <Letter at={a} letter="A" side={1} />
              <Letter at={e} letter="E" side={-1} />
            </>
          )}
        </g>
        <ScaleBar x={width - 14} y={height - 16} pxPerMm={scale} />
      </svg>
    </figure>
  );
}

function Letter({ at, letter, side }: { at: Point; letter: string; side: 1 | -1 }) {
  return (
    <text
      x={at.x + 10 * side}
      y={at.y - 6 * side + 4}
      textAnchor="middle"
      fontSize={13}
      fontWeight={600}
      fill={INK.dimension}
      stroke={INK.sheet}
      strokeWidth={3}
      paintOrder="stroke"
    >
      {letter}
    </text>
  );
}
