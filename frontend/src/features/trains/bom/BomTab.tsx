import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useTrainBom } from '../../../api/hooks/useTrainBom';
import { asProblem } from '../../../api/problem';
import type { Train } from '../../../api/types';
import { copyTsv } from '../../../components/copyTsv';
import { EmptyState } from '../../../components/EmptyState';
import { ErrorState } from '../../../components/ErrorState';
import { formatFixed } from '../../../components/figures';
import { LoadingRows } from '../../../components/LoadingRows';
import { useNotices } from '../../../components/Notices';
import { BomTable } from './BomTable';
import { BOM_HEADS, bomCells } from './bomCells';

/** The bill of materials: every line with where it is used, what to look at before ordering, and the export. */
export function BomTab({ train, canExport }: { train: Train; canExport: boolean }) {
  const { data: bom, error, mutate } = useTrainBom(train.code);
  const { tell } = useNotices();
  if (!bom) {
    if (error === undefined) return <LoadingRows rows={14} label="Loading the bill of materials" />;
    return (
      <ErrorState problem={asProblem(error)} what="the bill of materials" onRetry={() => void mutate()} />
    );
  }
  if (bom.lines.length === 0) {
    return (
      <EmptyState title="Nothing on this bill of materials">
        Adopt an option with at least one stage.
      </EmptyState>
    );
  }
  const { totals } = bom;
  async function copy(): Promise<void> {
    const done = await copyTsv([BOM_HEADS, ...(bom?.lines ?? []).map(bomCells)]);
    tell(
      done ? `${totals.lines} lines copied; paste into a spreadsheet.` : 'The browser did not allow copying.',
    );
  }
  const unknown =
    totals.linesWithoutMass === 0
      ? ''
      : ` without ${totals.linesWithoutMass === 1 ? '1 line' : `${totals.linesWithoutMass} lines`} of unknown mass`;
  return (
    <>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', columnGap: 2, mb: 0.75 }}>
        <Typography sx={{ flex: 1, minWidth: 240 }} color="textSecondary">
          <Box component="strong" sx={{ fontWeight: 600, color: 'text.primary', mr: 1.5 }}>
            {totals.lines} lines
          </Box>
          {`${totals.made} to be made, ${totals.bought} to be bought; ${formatFixed(totals.massKg, 2)} kg${unknown}.`}
        </Typography>
        <Button variant="text" onClick={() => void copy()} sx={{ fontWeight: 500, displayPrint: 'none' }}>
          Copy table
        </Button>
        {!canExport && (
          <Typography variant="body2" color="textSecondary">
            The workbook is for designers, librarians, purchasers and administrators.
          </Typography>
        )}
      </Box>
      <BomTable lines={bom.lines} />
      <Typography variant="body2" color="textSecondary" sx={{ mt: 1 }}>
        Prices and lead times are not known yet; their columns in the workbook are empty.
      </Typography>
    </>
  );
}
