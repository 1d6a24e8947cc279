import { trainStrip, type StripShape, type TrainOption, type TrainSpec } from '@stageyard/libs/train-planner';
import { DASH_DOT_FINE, INK } from './ink';
import { TurnArrow } from './TurnArrow';
import { trainInWords } from './trainInWords';

interface TrainStripProps {
  train: TrainOption | TrainSpec;
  /** px; 36 in rows. */
  height?: number;
  /** px; left out, the box is as wide as the drawing (in a table give all rows the same). */
  width?: number;
  /** One scale for all rows (see `commonScale`); left out, the train fills its box. */
  mmPerPixel?: number;
}

const PAD = 2;

/**
 * The train seen along its shafts, to scale, in a fixed small box: tip circles thin, pitch circles dash-dot where
 * there is room, axes crossed, a brass arrow at the input.
 */
export function TrainStrip({ train, height = 36, width, mmPerPixel }: TrainStripProps) {
  const shape = trainStrip(train);
  const scale = mmPerPixel ?? fittingScale(shape, height, width);
  const boxWidth = width ?? Math.ceil(shape.bounds.width / scale) + 2 * PAD;
  const middleX = shape.bounds.x + shape.bounds.width / 2;
  const middleY = shape.bounds.y + shape.bounds.height / 2;
  const px = (x: number) => boxWidth / 2 + (x - middleX) / scale;
  const py = (y: number) => height / 2 - (y - middleY) / scale;
  const small = height < 60;
  // The last stage lies farthest from a viewer at the input: it is drawn first. Wheels before pinions.
  const order = [...shape.gears].sort(
    (a, b) => b.stage - a.stage || (a.role === b.role ? 0 : a.role === 'wheel' ? -1 : 1),
  );
  const arrow = shape.inputArrow;
  return (
    <svg
      role="img"
      aria-label={trainInWords(train)}
      width={boxWidth}
      height={height}
      viewBox={`0 0 ${boxWidth} ${height}`}
      style={{ display: 'block', flexShrink: 0, maxWidth: '100%' }}
    >
      {order.map((gear) => (
        <g key={`${gear.stage}-${gear.role}`}>
          <circle
            cx={px(gear.x)}
            cy={py(gear.y)}
            r={gear.tipRadius / scale}
            fill={gear.role === 'pinion' ? INK.pinion : INK.wheel}
            fillOpacity={0.9}
            stroke={INK.outline}
            strokeWidth={small ? 0.7 : 0.9}
          />
          {!small && (
            <circle
              cx={px(gear.x)}
              cy={py(gear.y)}
              r={gear.pitchRadius / scale}
              fill="none"
              stroke={INK.centre}
              strokeWidth={0.6}
              strokeDasharray={DASH_DOT_FINE}
            />
          )}
        </g>
      ))}
      {shape.axes.map(({ x, y }, shaft) => (
        <path
          key={shaft}
          d={`M${px(x) - 2.5} ${py(y)}h5M${px(x)} ${py(y) - 2.5}v5`}
          stroke={INK.outline}
          strokeWidth={0.7}
        />
      ))}
      <TurnArrow
        centre={{ x: px(arrow.x), y: py(arrow.y) }}
        radius={Math.max(arrow.radius / scale, 5)}
        clockwise={arrow.clockwise}
        head={small ? 4.5 : 7}
        stroke={small ? 1.2 : 1.6}
      />
    </svg>
  );
}

function fittingScale(shape: StripShape, height: number, width?: number): number {
  const byHeight = shape.bounds.height / (height - 2 * PAD);
  return width === undefined ? byHeight : Math.max(byHeight, shape.bounds.width / (width - 2 * PAD));
}

/** The one scale (mm per px) on which every one of these trains fits a box of this size. */
export function commonScale(
  trains: readonly (TrainOption | TrainSpec)[],
  height: number,
  width: number,
): number {
  return Math.max(1e-6, ...trains.map((train) => fittingScale(trainStrip(train), height, width)));
}
