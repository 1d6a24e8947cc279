import { formatFixed } from '../components/figures';
import { ArrowHead } from './ArrowHead';
import { Dimension } from './Dimension';
import type { ViewFrame } from './EndView';
import { DASH_DOT, DASH_TWO_DOTS, INK } from './ink';
import type { LaidGear, TrainLayout } from './trainLayout';

interface PlanViewProps extends ViewFrame {
  layout: TrainLayout;
  dimensions: boolean;
}

/** The planes and shafts seen from above, the input side at the foot (first angle: it lies below the end view). */
export function PlanView({ layout, toPx, pxPerMm, dimensions }: PlanViewProps) {
  const { strip, wall, depth } = layout;
  const left = strip.bounds.x - wall;
  const right = strip.bounds.x + strip.bounds.width + wall;
  const topLeft = toPx(left, depth + wall);
  const bottomRight = toPx(right, -wall);
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
      {layout.shafts.map((shaft, index) => {
        const from = toPx(shaft.x, shaft.z2);
        const to = toPx(shaft.x, shaft.z1);
        const half = ((shaft.diameter ?? 0) / 2) * pxPerMm;
        return (
          <g key={index}>
            {half > 0 && (
              <rect
                x={from.x - half}
                y={from.y}
                width={2 * half}
                height={to.y - from.y}
                fill={INK.sheet}
                stroke={INK.outline}
                strokeWidth={1}
              />
            )}
          </g>
        );
      })}
      {[...layout.gears]
        .sort((a, b) => (a.role === b.role ? 0 : a.role === 'wheel' ? -1 : 1))
        .map((gear) => (
          <PlanGear key={gear.key} gear={gear} toPx={toPx} pxPerMm={pxPerMm} />
        ))}
      {layout.shafts.map((shaft, index) => {
        const x = toPx(shaft.x, 0).x;
        return (
          <line
            key={index}
            x1={x}
            x2={x}
            y1={topLeft.y - 8}
            y2={bottomRight.y + 8}
            stroke={INK.centre}
            strokeWidth={0.7}
            strokeDasharray={DASH_DOT}
          />
        );
      })}
      <PowerArrow x={toPx(0, 0).x} y={bottomRight.y + 12} />
      {dimensions && (
        <Dimension
          from={topLeft}
          to={{ x: topLeft.x, y: bottomRight.y }}
          at={topLeft.x - 24}
          direction="vertical"
          text={formatFixed(depth + 2 * wall, 1)}
        />
      )}
    </g>
  );
}

function PlanGear({ gear, toPx, pxPerMm }: { gear: LaidGear } & ViewFrame) {
  const corner = toPx(gear.x - gear.tipRadius, gear.z2);
  const wide = 2 * gear.tipRadius * pxPerMm;
  const tall = (gear.z2 - gear.z1) * pxPerMm;
  const pitch = [gear.x - gear.pitchRadius, gear.x + gear.pitchRadius].map((x) => toPx(x, 0).x);
  const text = String(gear.teeth);
  return (
    <g>
      <rect
        x={corner.x}
        y={corner.y}
        width={wide}
        height={tall}
        fill={gear.role === 'pinion' ? INK.pinion : INK.wheel}
        fillOpacity={0.88}
        stroke={INK.outline}
        strokeWidth={1}
      />
      {pitch.map((x) => (
        <line
          key={x}
          x1={x}
          x2={x}
          y1={corner.y - 3}
          y2={corner.y + tall + 3}
          stroke={INK.centre}
          strokeWidth={0.8}
          strokeDasharray={DASH_DOT}
        />
      ))}
      {wide > 34 && tall > 13 && (
        <text
          x={corner.x + wide * 0.72}
          y={corner.y + tall / 2 + 4}
          textAnchor="middle"
          fontSize={11.5}
          fill={INK.outline}
        >
          {text}
        </text>
      )}
    </g>
  );
}

/** Where the power comes in: a short brass arrow against the end of the input shaft. */
function PowerArrow({ x, y }: { x: number; y: number }) {
  return (
    <g>
      <line x1={x} x2={x} y1={y + 20} y2={y + 6} stroke={INK.dimension} strokeWidth={1.8} />
      <ArrowHead tip={{ x, y }} angle={-Math.PI / 2} colour={INK.dimension} length={9} />
    </g>
  );
}
