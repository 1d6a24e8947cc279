import type { TrainFigures, TrainOption, TrainSpec } from '@stageyard/libs/train-planner';
import { useMemo } from 'react';
import { EndView } from './EndView';
import { FirstAngleMark } from './FirstAngleMark';
import { INK } from './ink';
import { PlanView } from './PlanView';
import { ScaleBar } from './ScaleBar';
import { layOut } from './trainLayout';
import { trainInWords } from './trainInWords';

interface TrainDrawingProps {
  train: TrainSpec | TrainOption;
  /** Shaft spans and the box; left out, they are derived from the face widths and no box is drawn. */
  figures?: TrainFigures;
  /** One per shaft, mm. */
  shaftDiameters?: readonly (number | null)[];
  /** px; the drawing scales down with its container. */
  width?: number;
  /** A fixed scale, for drawings side by side. */
  mmPerPixel?: number;
  dimensions?: boolean;
}

const MARGIN = { right: 22, top: 30, foot: 46 };
const MOST_TALL = 640;

/**
 * The train to scale in two first-angle views: along the shafts, and the planes and shafts from above. Centre lines
 * and pitch circles dash-dot, tip circles thin, dimensions in mm, the input's sense of rotation in brass.
 */
export function TrainDrawing(props: TrainDrawingProps) {
  const { train, figures, shaftDiameters, width = 900, mmPerPixel, dimensions = true } = props;
  const layout = useMemo(() => layOut(train, figures, shaftDiameters), [train, figures, shaftDiameters]);
  const { bounds } = layout.strip;
  const length = bounds.width + 2 * layout.wall;
  const height = bounds.height + 2 * layout.wall;
  const depth = layout.depth + 2 * layout.wall;
  const left = dimensions ? 54 : 16;
  const between = dimensions ? 84 : 40;
  const roomX = width - left - MARGIN.right;
  const roomY = MOST_TALL - MARGIN.top - between - MARGIN.foot;
  const pxPerMm =
    mmPerPixel === undefined ? Math.min(roomX / length, roomY / (height + depth)) : 1 / mmPerPixel;
  const drawnWidth = mmPerPixel === undefined ? width : Math.ceil(left + length * pxPerMm + MARGIN.right);
  const drawnHeight = Math.ceil(MARGIN.top + (height + depth) * pxPerMm + between + MARGIN.foot);
  const originX = left + (drawnWidth - left - MARGIN.right - length * pxPerMm) / 2;
  const xOf = (x: number) => originX + (x - bounds.x + layout.wall) * pxPerMm;
  const axisY = MARGIN.top + (height / 2) * pxPerMm;
  const planFoot = MARGIN.top + (height + depth) * pxPerMm + between;
  return (
    <svg
      role="img"
      aria-label={trainInWords(train)}
      viewBox={`0 0 ${drawnWidth} ${drawnHeight}`}
      width={drawnWidth}
      style={{ display: 'block', maxWidth: '100%', height: 'auto', background: INK.sheet }}
    >
      <EndView
        layout={layout}
        dimensions={dimensions}
        pxPerMm={pxPerMm}
        toPx={(x, y) => ({ x: xOf(x), y: axisY - y * pxPerMm })}
      />
      <PlanView
        layout={layout}
        dimensions={dimensions}
        pxPerMm={pxPerMm}
        toPx={(x, z) => ({ x: xOf(x), y: planFoot - (z + layout.wall) * pxPerMm })}
      />
      {dimensions && (
        <>
          <FirstAngleMark x={drawnWidth - 50} y={drawnHeight - 22} />
          <ScaleBar x={drawnWidth - 70} y={drawnHeight - 12} pxPerMm={pxPerMm} />
        </>
      )}
    </svg>
  );
}
