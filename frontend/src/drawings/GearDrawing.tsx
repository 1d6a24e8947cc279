import { toothOutline, type GearGeometry, type GearInput } from '@stageyard/libs/gear-geometry';
import { useMemo } from 'react';
import { formatFixed } from '../components/figures';
import { DASH_DOT, INK, pathOf } from './ink';
import { ScaleBar } from './ScaleBar';

interface GearDrawingProps {
  gear: GearInput;
  geometry: GearGeometry;
  /** mm; drawn as a hole. */
  bore?: number | null;
  size?: number;
}

/** One generated gear in the transverse plane: the outline as it will be cut, pitch circle dash-dot, bore, scale bar. */
export function GearDrawing({ gear, geometry, bore, size = 300 }: GearDrawingProps) {
  const scale = (size - 24) / geometry.tipDiameter;
  const middle = size / 2;
  const outline = useMemo(() => {
    const k = (size - 24) / geometry.tipDiameter;
    return pathOf(
      toothOutline(gear).map(({ x, y }) => ({ x: size / 2 + x * k, y: size / 2 - y * k })),
      true,
    );
  }, [gear, geometry.tipDiameter, size]);
  const circle = (diameter: number, colour: string, dashed: boolean) => (
    <circle
      cx={middle}
      cy={middle}
      r={(diameter / 2) * scale}
      fill="none"
      stroke={colour}
      strokeWidth={0.8}
      strokeDasharray={dashed ? DASH_DOT : undefined}
    />
  );
  return (
    <svg
      role="img"
      aria-label={`The gear to scale, tip diameter ${formatFixed(geometry.tipDiameter, 2)} mm`}
      viewBox={`0 0 ${size} ${size + 26}`}
      style={{ display: 'block', width: '100%', maxWidth: size, margin: '0 auto' }}
    >
      <path d={outline} fill={INK.pinion} stroke={INK.outline} strokeWidth={1} />
      {circle(geometry.referenceDiameter, INK.centre, true)}
      {circle(geometry.baseDiameter, INK.faint, false)}
      {bore !== undefined && bore !== null && bore > 0 && bore < geometry.rootDiameter && (
        <circle cx={middle} cy={middle} r={(bore / 2) * scale} fill={INK.sheet} stroke={INK.outline} />
      )}
      <path
        d={`M4 ${middle}H${size - 4}M${middle} 4V${size - 4}`}
        stroke={INK.centre}
        strokeWidth={0.7}
        strokeDasharray={DASH_DOT}
      />
      <ScaleBar x={size - 10} y={size + 18} pxPerMm={scale} />
    </svg>
  );
}
