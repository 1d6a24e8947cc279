import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { formatModule } from '@stageyard/libs/units';
import { useMemo, type ReactNode } from 'react';
import type { Part } from '../../api/types';
import { Cautions } from '../../components/Cautions';
import { formatFixed, formatMass, NOTHING } from '../../components/figures';
import { FigureTable, type FigureRow } from '../../components/FigureTable';
import { Sheet } from '../../components/Sheet';
import { attributeOf, figureOf, shownValue } from './attributes';
import { GeometryPanel } from './GeometryPanel';
import { liveGeometry } from './liveGeometry';
import { formOfPart } from './partForm';
import { ATTRIBUTES, isToothed, type AttributeField } from './partKinds';

/** What the part is, and for teeth what that comes to, side by side. */
export function PartFacts({ part, below }: { part: Part; below: ReactNode }) {
  const toothed = isToothed(part.kind);
  const live = useMemo(() => (toothed ? liveGeometry(formOfPart(part).attr) : null), [part, toothed]);
  const rows: FigureRow[] = [
    ...ATTRIBUTES[part.kind].map((field) => ({
      label: field.label,
      ...(field.unit === undefined ? {} : { unit: field.unit }),
      values: [shownAttribute(part, field)],
    })),
    { label: 'Material', values: [part.material ?? NOTHING] },
    { label: 'Mass of one', unit: 'kg', values: [formatMass(part.mass)] },
    { label: 'Made or bought', values: [part.supply === 'made' ? 'made by us' : 'bought'] },
    { label: 'Supplier', values: [part.supplier ?? NOTHING] },
  ];
  const half = Math.ceil(rows.length / 2);
  return (
    <Box sx={toothed ? layoutSx : undefined}>
      <Box sx={{ minWidth: 0 }}>
        <Sheet title="What it is" flush>
          <Box sx={{ display: 'grid', gridTemplateColumns: { xs: '1fr', lg: '1fr 1fr' }, columnGap: 2 }}>
            <Box sx={{ borderBottom: { xs: 1, lg: 0 }, borderColor: 'line.rule' }}>
              <FigureTable label="What it is" rows={rows.slice(0, half)} />
            </Box>
            <FigureTable label="What it is, continued" rows={rows.slice(half)} />
          </Box>
        </Sheet>
        {part.note !== '' && (
          <Sheet title="Note" sx={{ mt: 2 }}>
            <Typography sx={{ whiteSpace: 'pre-wrap', overflowWrap: 'anywhere' }}>{part.note}</Typography>
          </Sheet>
        )}
        <Box sx={{ mt: 2 }}>{below}</Box>
        {toothed && <Cautions short />}
      </Box>
      {live !== null && (
        <GeometryPanel
          live={live}
          bore={figureOf(part, part.kind === 'gear' ? 'bore' : 'shaftDiameter')}
          shiftUnknown={figureOf(part, 'profileShift') === null}
        />
      )}
    </Box>
  );
}

function shownAttribute(part: Part, field: AttributeField): string {
  const value = attributeOf(part, field.name);
  if (field.name === 'module' && typeof value === 'number') return formatModule(value).replace(/^m /, '');
  if (field.name === 'profileShift' && typeof value === 'number') return formatFixed(value, 4);
  return shownValue(value);
}

const layoutSx = {
  display: 'grid',
  gridTemplateColumns: { xs: '1fr', md: 'minmax(0, 1fr) 380px' },
  gap: 2,
  alignItems: 'start',
} as const;
