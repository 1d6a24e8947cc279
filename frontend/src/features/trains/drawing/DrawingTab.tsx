import Box from '@mui/material/Box';
import type { Train } from '../../../api/types';
import { FigureTable } from '../../../components/FigureTable';
import { formatFixed } from '../../../components/figures';
import { errorWords, exactRatioWords } from '../../../components/optionWords';
import { Sheet } from '../../../components/Sheet';
import { TrainDrawing } from '../../../drawings/TrainDrawing';
import { DrawingFrame } from '../DrawingFrame';
import { ChecksTable } from '../stages/ChecksTable';
import { FindingsList } from '../stages/FindingsList';
import { ShaftsTable } from './ShaftsTable';

/** The train to scale, its figures as a whole, its shafts. */
export function DrawingTab({ train, canEdit }: { train: Train; canEdit: boolean }) {
  const { figures, spec } = train;
  const diameters = spec.shafts.map(({ diameter }) => diameter);
  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: 'minmax(0, 1fr)', lg: 'minmax(0, 1fr) 320px' },
        gap: 2,
        alignItems: 'start',
      }}
    >
      <Box sx={{ display: 'grid', gap: 2, minWidth: 0 }}>
        <Sheet flush>
          <DrawingFrame label="Drawing of the train">
            <TrainDrawing train={spec} figures={figures} shaftDiameters={diameters} />
          </DrawingFrame>
        </Sheet>
        <ShaftsTable train={train} canEdit={canEdit} />
        <Sheet title="Checks of the whole" flush>
          <ChecksTable checks={figures.checks.filter(({ stage }) => stage === undefined)} />
        </Sheet>
      </Box>
      <Box sx={{ display: 'grid', gap: 2 }}>
        <Sheet title="Whole train" flush>
          <FigureTable
            label="Whole train"
            rows={[
              { label: 'Ratio, exact', values: [exactRatioWords(figures.ratio)] },
              { label: 'Ratio', values: [`${formatFixed(figures.ratio.value, 4)} : 1`] },
              {
                label: 'Ratio error',
                unit: '%',
                values: [errorWords(figures.ratio.errorPercent)],
                note: spec.target && `asked: ${spec.target.ratio} ± ${spec.target.tolerancePercent} %`,
              },
              {
                label: 'Centre-distance sum',
                unit: 'mm',
                values: [formatFixed(figures.centreDistanceSum, 2)],
              },
              { label: 'Box length', unit: 'mm', values: [formatFixed(figures.box.length, 1)] },
              { label: 'Box width', unit: 'mm', values: [formatFixed(figures.box.width, 1)] },
              { label: 'Box height', unit: 'mm', values: [formatFixed(figures.box.height, 1)] },
              {
                label: 'Mass of the gears',
                unit: 'kg',
                values: [formatFixed(figures.mass, 3)],
                note: 'solid discs',
              },
              {
                label: 'Backlash at the output',
                unit: 'arcmin',
                values: [formatFixed(figures.backlashArcmin, 1)],
              },
              {
                label: 'Output turns',
                values: [figures.direction === 'same' ? 'with the input' : 'against the input'],
              },
            ]}
          />
        </Sheet>
        <FindingsList findings={figures.findings} none="The geometry has nothing to remark." />
      </Box>
    </Box>
  );
}
