import Button from '@mui/material/Button';
import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useMe } from '../../../api/hooks/useMe';
import { useTrainBom } from '../../../api/hooks/useTrainBom';
import { asProblem } from '../../../api/problem';
import type { Bom, Train } from '../../../api/types';
import { EmptyState } from '../../../components/EmptyState';
import { ErrorState } from '../../../components/ErrorState';
import { formatFixed } from '../../../components/figures';
import { LoadingRows } from '../../../components/LoadingRows';
import { BomTable } from './BomTable';
import { PricedBom } from './PricedBom';

interface BomTabProps {
  train: Train;
  canExport: boolean;
}

/** The bill of materials: every line with where it is used, what to look at before ordering, and the export. */
export function BomTab({ train, canExport }: BomTabProps) {
  const { data: bom, error, mutate } = useTrainBom(train.code);
  const { can } = useMe();
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
  if (can('prices.read')) {
    return (
      <PricedBom
        train={train}
        bom={bom}
        canEdit={can('trains.edit')}
        canChoose={can('offers.choose')}
        canAddOffers={can('prices.edit')}
      />
    );
  }
  return (
    <BomTable
      lines={bom.lines}
      frame={(table, copy) => (
        <>
          <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', columnGap: 2, mb: 0.75 }}>
            <BomFacts totals={bom.totals} />
            <Button variant="text" onClick={copy} sx={{ fontWeight: 500, displayPrint: 'none' }}>
              Copy table
            </Button>
            {!canExport && (
              <Typography variant="body2" color="textSecondary">
                The workbook is for designers, librarians, purchasers and administrators.
              </Typography>
            )}
          </Box>
          {table}
        </>
      )}
    />
  );
}

/** `24 lines: 6 to be made, 18 to be bought; 12.40 kg.` */
export function BomFacts({ totals }: Pick<Bom, 'totals'>) {
  const unknown =
    totals.linesWithoutMass === 0
      ? ''
      : ` without ${totals.linesWithoutMass === 1 ? '1 line' : `${totals.linesWithoutMass} lines`} of unknown mass`;
  return (
    <Typography sx={{ flex: 1, minWidth: 240 }} color="textSecondary">
      <Box component="strong" sx={{ fontWeight: 600, color: 'text.primary', mr: 1.5 }}>
        {totals.lines} lines
      </Box>
      {`${totals.made} to be made, ${totals.bought} to be bought; ${formatFixed(totals.massKg, 2)} kg${unknown}.`}
    </Typography>
  );
}
