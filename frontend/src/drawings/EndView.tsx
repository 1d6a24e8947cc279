import { Dimension } from './Dimension';
import { DASH_DOT, DASH_TWO_DOTS, INK, type Point } from './ink';
import type { TrainLayout } from './trainLayout';
import { TurnArrow } from './TurnArrow';
import { formatFixed } from '../components/figures';

export interface ViewFrame {
  /** mm → px of the view. */
  toPx: (x: number, y: number) => Point;
  pxPerMm: number;
}

interface EndViewProps extends ViewFrame {
  layout: TrainLayout;
  dimensions: boolean;
}

/** The train seen along its shafts from the input side. */
export function EndView({ layout, toPx, pxPerMm, dimensions }: EndViewProps) {
  const { strip, wall } = layout;
  const { bounds } = strip;
  const box = {
    left: bounds.x - wall,
    right: bounds.x + bounds.width + wall,
    reach: bounds.height / 2 + wall,
  };
  const topLeft = toPx(box.left, box.reach);
  const bottomRight = toPx(box.right, -box.reach);
  const order = [...layout.gears].sort(
    (a, b) => b.stage - a.stage || (a.role === b.role ? 0 : a.role === 'wheel' ? -1 : 1),
  );
  const input = toPx(strip.inputArrow.x, strip.inputArrow.y);
  return (
    <g>
      {wall > 0 && (
        <rect
          x={topLeft.x}
          y={topLeft.y}
          width={bottomRight.x - topLeft.x}
          height={bottomRight.y - topLeft.y}
          fill="none"
          stroke={INK.faint}
          strokeWidth={0.8}
          strokeDasharray={DASH_TWO_DOTS}
        />
      )}
      {order.map((gear) => {
        const centre = toPx(gear.x, 0);
        return (
          <g key={gear.key}>
            <circle
              cx={centre.x}
              cy={centre.y}
              r={gear.tipRadius * pxPerMm}
              fill={gear.role === 'pinion' ? INK.pinion : INK.wheel}
              fillOpacity={0.82}
              stroke={INK.outline}
              strokeWidth={1}
            />
            <circle
              cx={centre.x}
              cy={centre.y}
              r={gear.pitchRadius * pxPerMm}
              fill="none"
              stroke={INK.centre}
              strokeWidth={0.8}
              strokeDasharray={DASH_DOT}
            />
          </g>
        );
      })}
      {layout.shafts.map((shaft, index) => {
        const centre = toPx(shaft.x, 0);
        return (
          <g key={index}>
            {shaft.diameter !== null && (
              <circle
                cx={centre.x}
                cy={centre.y}
                r={(shaft.diameter / 2) * pxPerMm}
                fill={INK.sheet}
                stroke={INK.outline}
                strokeWidth={1}
              />
            )}
            <line
              x1={centre.x}
              x2={centre.x}
              y1={topLeft.y - 8}
              y2={bottomRight.y + 8}
              stroke={INK.centre}
              strokeWidth={0.7}
              strokeDasharray={DASH_DOT}
            />
            <text
              x={centre.x + 6}
              y={topLeft.y - 10}
              fontSize={12}
              fill={INK.text}
            >{`${index}${index === 0 ? ' input' : index === layout.shafts.length - 1 ? ' output' : ''}`}</text>
          </g>
        );
      })}
      <line
        x1={topLeft.x - 8}
        x2={bottomRight.x + 8}
        y1={toPx(0, 0).y}
        y2={toPx(0, 0).y}
        stroke={INK.centre}
        strokeWidth={0.7}
        strokeDasharray={DASH_DOT}
      />
      <TurnArrow
        centre={input}
        radius={Math.max(strip.inputArrow.radius * pxPerMm, 11)}
        clockwise={strip.inputArrow.clockwise}
        head={9}
        stroke={1.8}
      />
      {dimensions && (
        <>
          {layout.shafts.slice(1).map((shaft, index) => {
            const before = layout.shafts[index];
            if (before === undefined) return null;
            return (
              <Dimension
                key={index}
                from={{ x: toPx(before.x, 0).x, y: bottomRight.y + 8 }}
                to={{ x: toPx(shaft.x, 0).x, y: bottomRight.y + 8 }}
                at={bottomRight.y + 26}
                direction="horizontal"
                text={formatFixed(shaft.x - before.x, 2)}
              />
            );
          })}
          <Dimension
            from={{ x: topLeft.x, y: bottomRight.y }}
            to={bottomRight}
            at={bottomRight.y + 50}
            direction="horizontal"
            text={formatFixed(box.right - box.left, 1)}
          />
          <Dimension
            from={topLeft}
            to={{ x: topLeft.x, y: bottomRight.y }}
            at={topLeft.x - 24}
            direction="vertical"
            text={formatFixed(2 * box.reach, 1)}
          />
        </>
      )}
    </g>
  );
}
