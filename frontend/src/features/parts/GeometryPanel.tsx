import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { HOUSE_LIMITS, type GearGeometry } from '@stageyard/libs/gear-geometry';
import { formatFixed, formatSigned } from '../../components/figures';
import { FigureTable } from '../../components/FigureTable';
import { Sheet } from '../../components/Sheet';
import { VerdictWord } from '../../components/VerdictWord';
import { GearDrawing } from '../../drawings/GearDrawing';
import type { LiveGeometry } from './liveGeometry';

interface GeometryPanelProps {
  live: LiveGeometry;
  bore: number | null;
  /** Says that the maker gives no shift and 0 was taken. */
  shiftUnknown: boolean;
}

/** What the figures come to: outline, diameters, undercut, tip thickness, span. Stays beside the form while typing. */
export function GeometryPanel({ live, bore, shiftUnknown }: GeometryPanelProps) {
  return (
    <Sheet title="Computed geometry" flush>
      <Box aria-live="polite" sx={{ pb: 1 }}>
        {live.kind === 'waiting' && (
          <Typography color="textSecondary" sx={{ px: 1.25, pb: 1 }}>
            Give {live.missing.join(' and ')}, and the geometry appears here as you type.
          </Typography>
        )}
        {live.kind === 'refused' && (
          <Alert severity="error" sx={{ mx: 1.25, mb: 1 }}>
            <b>This gear cannot be cut.</b> {live.messages.join(' ')}
          </Alert>
        )}
        {live.kind === 'computed' && (
          <>
            <Box sx={{ px: 1.25, pt: 0.5, pb: 1 }}>
              <GearDrawing gear={live.gear} geometry={live.geometry} bore={bore} size={250} />
            </Box>
            {bore !== null && bore >= live.geometry.rootDiameter && (
              <Alert severity="error" sx={{ mx: 1.25, mb: 1 }}>
                The bore of {formatFixed(bore, 2)} mm reaches the root circle of{' '}
                {formatFixed(live.geometry.rootDiameter, 2)} mm: nothing is left to hold the teeth.
              </Alert>
            )}
            <GeometryTable geometry={live.geometry} module={live.gear.module} />
            {shiftUnknown && (
              <Typography variant="body2" color="textSecondary" sx={{ px: 1.25, pt: 1 }}>
                The maker gives no profile shift: 0 is taken.
              </Typography>
            )}
          </>
        )}
      </Box>
    </Sheet>
  );
}

function GeometryTable({ geometry, module }: { geometry: GearGeometry; module: number }) {
  const least = HOUSE_LIMITS.tipThickness * module;
  const thin = geometry.tipThickness < least;
  return (
    <FigureTable
      label="Computed geometry"
      rows={[
        { label: 'Reference diameter d', unit: 'mm', values: [formatFixed(geometry.referenceDiameter, 3)] },
        { label: 'Tip diameter', unit: 'mm', values: [formatFixed(geometry.tipDiameter, 3)] },
        { label: 'Root diameter', unit: 'mm', values: [formatFixed(geometry.rootDiameter, 3)] },
        { label: 'Base diameter', unit: 'mm', values: [formatFixed(geometry.baseDiameter, 3)] },
        { label: 'Form diameter', unit: 'mm', values: [formatFixed(geometry.formDiameter, 3)] },
        {
          label: 'Undercut',
          note: `least shift without: ${formatSigned(geometry.leastShiftWithoutUndercut, 4)}`,
          values: [geometry.undercut ? <UndercutWord key="u" /> : 'none'],
        },
        {
          label: 'Tip thickness',
          unit: 'mm',
          note: `house rule: at least ${formatFixed(least, 2)}`,
          values: [
            <span key="t">
              {formatFixed(geometry.tipThickness, 3)}
              {thin && (
                <>
                  {' '}
                  <VerdictWord verdict="fails" value={geometry.tipThickness} limit={least} unit="mm" />
                </>
              )}
            </span>,
          ],
        },
        { label: 'Tooth thickness', unit: 'mm', values: [formatFixed(geometry.toothThickness, 3)] },
        {
          label: `Span over ${geometry.spanTeeth} teeth`,
          unit: 'mm',
          values: [formatFixed(geometry.spanLength, 3)],
        },
      ]}
    />
  );
}

function UndercutWord() {
  return (
    <Box component="span" sx={{ color: 'warning.main', fontWeight: 600 }}>
      ⚠ the root is undercut
    </Box>
  );
}
