import Button from '@mui/material/Button';
import { formatTrimmed, moduleToDiametralPitch } from '@stageyard/libs/units';
import { useState, type ReactNode } from 'react';
import type { GearGeometry, Train } from '../../../api/types';
import { FigureTable, type FigureRow } from '../../../components/FigureTable';
import { formatFixed, formatSigned } from '../../../components/figures';
import { Sheet } from '../../../components/Sheet';
import { PartLink } from '../PartLink';
import { ChoosePartDialog } from './ChoosePartDialog';

interface GearTableProps {
  train: Train;
  stage: number;
  canEdit: boolean;
}

/** Pinion and wheel side by side: what the cutter fixes, and the part each is. */
export function GearTable({ train, stage, canEdit }: GearTableProps) {
  const [choosing, setChoosing] = useState<'pinion' | 'wheel' | null>(null);
  const spec = train.spec.stages[stage];
  const mesh = train.figures.meshes[stage];
  if (!spec || !mesh) return null;
  const part = (role: 'pinion' | 'wheel'): ReactNode => {
    const number = spec[role].partNumber;
    return (
      <>
        <span style={{ whiteSpace: 'nowrap' }}>
          {number === null ? 'to be made' : <PartLink number={number} />}
        </span>
        {canEdit && (
          <>
            <br />
            <Button
              variant="text"
              onClick={() => setChoosing(role)}
              aria-label={`Choose the part of the ${role}`}
              sx={{ minHeight: 24, py: 0, mr: -1, fontWeight: 500, displayPrint: 'none' }}
            >
              Choose
            </Button>
          </>
        )}
      </>
    );
  };
  return (
    <Sheet flush>
      <FigureTable
        label={`Gears of stage ${stage + 1}`}
        head={[`Stage ${stage + 1}`, 'Pinion', 'Wheel']}
        rows={[
          { label: 'Part', values: [part('pinion'), part('wheel')] },
          ...gearRows(train, stage, mesh.gear.pinion, mesh.gear.wheel),
        ]}
      />
      {choosing && (
        <ChoosePartDialog train={train} stage={stage} role={choosing} onClose={() => setChoosing(null)} />
      )}
    </Sheet>
  );
}

function gearRows(train: Train, stage: number, pinion: GearGeometry, wheel: GearGeometry): FigureRow[] {
  const spec = train.spec.stages[stage];
  if (!spec) return [];
  const both = (pick: (gear: GearGeometry) => ReactNode): ReactNode[] => [pick(pinion), pick(wheel)];
  const mm = (pick: (gear: GearGeometry) => number) => both((gear) => formatFixed(pick(gear), 3));
  const rows: FigureRow[] = [
    { label: 'Teeth', values: [spec.pinion.teeth, spec.wheel.teeth] },
    {
      label: 'Module',
      unit: 'mm',
      values: both(() => formatTrimmed(spec.module, 4)),
      note: `diametral pitch ${formatTrimmed(moduleToDiametralPitch(spec.module), 3)}`,
    },
    { label: 'Pressure angle', unit: '°', values: both(() => formatTrimmed(train.spec.pressureAngleDeg, 3)) },
  ];
  if (train.spec.helixAngleDeg > 0) {
    rows.push(
      { label: 'Helix angle', unit: '°', values: both(() => formatTrimmed(train.spec.helixAngleDeg, 4)) },
      { label: 'Hand', values: [spec.pinion.hand ?? '–', spec.wheel.hand ?? '–'] },
    );
  }
  rows.push(
    {
      label: 'Profile shift',
      values: [formatSigned(spec.pinion.profileShift, 4), formatSigned(spec.wheel.profileShift, 4)],
    },
    {
      label: 'Face width',
      unit: 'mm',
      values: [formatTrimmed(spec.pinion.faceWidth, 2), formatTrimmed(spec.wheel.faceWidth, 2)],
    },
    { label: 'Reference diameter', unit: 'mm', values: mm((gear) => gear.referenceDiameter) },
    { label: 'Base diameter', unit: 'mm', values: mm((gear) => gear.baseDiameter) },
    { label: 'Tip diameter', unit: 'mm', values: mm((gear) => gear.tipDiameter) },
    { label: 'Root diameter', unit: 'mm', values: mm((gear) => gear.rootDiameter) },
    { label: 'Form diameter', unit: 'mm', values: mm((gear) => gear.formDiameter) },
    { label: 'Undercut', values: both((gear) => (gear.undercut ? 'yes' : 'no')) },
    {
      label: 'Least shift without undercut',
      values: both((gear) => formatSigned(gear.leastShiftWithoutUndercut, 4)),
    },
    { label: 'Tip thickness', unit: 'mm', values: mm((gear) => gear.tipThickness) },
    { label: 'Tooth thickness', unit: 'mm', values: mm((gear) => gear.toothThickness) },
    { label: 'Span over teeth', values: both((gear) => gear.spanTeeth ?? '–') },
    { label: 'Span', unit: 'mm', values: both((gear) => formatFixed(gear.spanLength, 3)) },
  );
  return rows;
}
