import { huntingTooth } from '@stageyard/libs/gear-geometry';
import type { MeshGeometry } from '../../../api/types';
import { FigureTable, type FigureRow } from '../../../components/FigureTable';
import { formatFixed, formatSigned } from '../../../components/figures';
import { Sheet } from '../../../components/Sheet';

interface MeshTableProps {
  mesh: MeshGeometry;
  teeth: [pinion: number, wheel: number];
  leastContactRatio: number;
}

/** Every figure of the mesh at its operating distance. */
export function MeshTable({ mesh, teeth, leastContactRatio }: MeshTableProps) {
  return (
    <Sheet title="Mesh" flush>
      <FigureTable label="Mesh figures" rows={meshRows(mesh, teeth, leastContactRatio)} />
    </Sheet>
  );
}

/** Rows of the mesh table, lengths in mm. */
export function meshRows(
  mesh: MeshGeometry,
  [z1, z2]: [number, number],
  leastContactRatio: number,
): FigureRow[] {
  const mm = (value: number, decimals = 3) => formatFixed(value, decimals);
  const helical = mesh.overlapRatio !== null && mesh.overlapRatio > 0;
  const rows: FigureRow[] = [
    { label: 'Ratio', values: [`${z2}/${z1} = ${formatFixed(mesh.ratio, 4)}`] },
    { label: 'Centre distance', unit: 'mm', values: [mm(mesh.centreDistance)] },
    { label: 'Centre distance without backlash', unit: 'mm', values: [mm(mesh.zeroBacklashCentreDistance)] },
    { label: 'Reference centre distance', unit: 'mm', values: [mm(mesh.referenceCentreDistance)] },
    {
      label: 'Operating pressure angle',
      unit: '°',
      values: [formatFixed(mesh.operatingPressureAngleDeg, 3)],
    },
    {
      label: 'Contact ratio',
      values: [formatFixed(mesh.contactRatio, 3)],
      note: `asked: at least ${formatFixed(leastContactRatio, 3)}`,
    },
  ];
  if (mesh.contactRatioLimitedBy !== null) {
    rows.push({
      label: 'Contact ratio from the tip circles alone',
      values: [formatFixed(mesh.contactRatioIgnoringUndercut, 3)],
      note: mesh.contactRatioLimitedBy,
    });
  }
  if (helical) {
    rows.push(
      { label: 'Overlap ratio', values: [formatFixed(mesh.overlapRatio, 3)] },
      { label: 'Total contact ratio', values: [formatFixed(mesh.totalContactRatio, 3)] },
    );
  }
  rows.push(
    { label: 'Path of contact, A to E', unit: 'mm', values: [mm(mesh.pathOfContact)] },
    { label: 'Approach, A to C', unit: 'mm', values: [mm(mesh.approachLength)] },
    { label: 'Recess, C to E', unit: 'mm', values: [mm(mesh.recessLength)] },
    { label: 'Between the base tangent points', unit: 'mm', values: [mm(mesh.tangentPointDistance)] },
    { label: 'Transverse base pitch', unit: 'mm', values: [mm(mesh.basePitch)] },
    { label: 'Backlash, circumferential', unit: 'mm', values: [mm(mesh.circumferentialBacklash)] },
    { label: 'Backlash, normal', unit: 'mm', values: [mm(mesh.normalBacklash)] },
    {
      label: 'Backlash at the wheel',
      unit: 'arcmin',
      values: [formatFixed(mesh.angularBacklashArcmin, 2)],
    },
    { label: 'Tip clearance, pinion', unit: 'mm', values: [mm(mesh.tipClearancePinion)] },
    { label: 'Tip clearance, wheel', unit: 'mm', values: [mm(mesh.tipClearanceWheel)] },
    {
      label: 'Room to the least contact ratio',
      unit: 'modules',
      values: [formatSigned(mesh.allowanceAtLeastContactRatio, 4)],
      note: 'how far the axes may move apart, from the distance without backlash',
    },
    {
      label: 'Room to contact ratio 1',
      unit: 'modules',
      values: [formatSigned(mesh.allowanceAtContactRatioOne, 4)],
    },
    { label: 'The same teeth meet again', values: [huntingWords(z1, z2)] },
  );
  return rows;
}

function huntingWords(z1: number, z2: number): string {
  const { hunting, repeatsAfterPinionTurns } = huntingTooth(z1, z2);
  const turns = `after ${repeatsAfterPinionTurns} ${repeatsAfterPinionTurns === 1 ? 'turn' : 'turns'} of the pinion`;
  return hunting ? `${turns} (hunting)` : turns;
}
