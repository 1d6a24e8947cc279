import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import MenuItem from '@mui/material/MenuItem';
import TextField from '@mui/material/TextField';
import { useMemo, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { useTrainPrices, type Prefer } from '../../../api/hooks/useTrainPrices';
import { asProblem } from '../../../api/problem';
import type { Bom, Train } from '../../../api/types';
import { BomDialogs, type OpenDialog } from './BomDialogs';
import { BomFacts } from './BomTab';
import { BuildQuantityField } from './BuildQuantityField';
import { IdleSwaps, LostChoices } from './LostChoices';
import { LineMenu } from './LineMenu';
import { PricedTable } from './PricedTable';
import { PriceSummary } from './PriceSummary';
import { pricedLines } from './pricedLine';
import { LookAtList, UnpricedLines } from './UnpricedLines';
import { useRemoveLine } from './useRemoveLine';

interface PricedBomProps {
  train: Train;
  bom: Bom;
  /** Parts and added lines can be changed. */
  canEdit: boolean;
  /** Offers and the build quantity can be chosen. */
  canChoose: boolean;
  canAddOffers: boolean;
}

const readPrefer = (text: string | null): Prefer => (text === 'arrival' ? 'arrival' : 'price');

/** The bill of materials as a purchaser reads it: what every line costs, from whom, and when it comes. */
export function PricedBom({ train, bom, canEdit, canChoose, canAddOffers }: PricedBomProps) {
  const [params, setParams] = useSearchParams();
  const prefer = readPrefer(params.get('prefer'));
  const { data: prices, error, mutate } = useTrainPrices(train, prefer, true);
  const [dialog, setDialog] = useState<OpenDialog | null>(null);
  const removeLine = useRemoveLine(train, bom.extraLines);
  const lines = useMemo(() => pricedLines(bom.lines, prices), [bom.lines, prices]);
  const unpriced = useMemo(() => {
    const keys = new Set(prices?.unpriced.map(({ key }) => key));
    return lines.filter(({ line }) => keys.has(line.key));
  }, [lines, prices]);

  const setPrefer = (next: string) =>
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        if (next === 'arrival') after.set('prefer', next);
        else after.delete('prefer');
        return after;
      },
      { replace: true, preventScrollReset: true },
    );

  return (
    <>
      <PricedTable
        lines={lines}
        on={prices?.on ?? ''}
        menuOf={(line) => (
          <LineMenu
            line={line}
            mayChoose={canChoose}
            mayEdit={canEdit}
            onAct={(act) => (act === 'remove' ? void removeLine(line.line) : setDialog({ act, line }))}
          />
        )}
        frame={(table, copy) => (
          <>
            <Box sx={toolbarSx}>
              <BuildQuantityField train={train} canSet={canChoose} />
              <TextField
                id="prefer"
                select
                label="Offers by"
                value={prefer}
                onChange={(event) => setPrefer(event.target.value)}
                sx={inlineLabel}
              >
                <MenuItem value="price">lowest price</MenuItem>
                <MenuItem value="arrival">soonest arrival</MenuItem>
              </TextField>
              <Box sx={{ flex: 1 }} />
              {canEdit && (
                <>
                  <Button variant="text" onClick={() => setDialog({ act: 'add' })}>
                    Add a line
                  </Button>
                  <Button variant="text" onClick={() => setDialog({ act: 'paste' })}>
                    Paste rows
                  </Button>
                </>
              )}
              <Button variant="text" onClick={copy}>
                Copy table
              </Button>
            </Box>
            {error !== undefined && (
              <Alert
                severity="warning"
                sx={{ mb: 1 }}
                action={<Button onClick={() => void mutate()}>Try again</Button>}
              >
                The prices could not be loaded. {asProblem(error).message}
              </Alert>
            )}
            <LostChoices train={train} lost={prices?.lostChoices ?? []} canChoose={canChoose} />
            <IdleSwaps train={train} idle={bom.idleSwaps} canEdit={canEdit} />
            <Box sx={{ mb: 0.75, minHeight: 24 }}>{prices && <PriceSummary prices={prices} />}</Box>
            {table}
            <Box sx={{ mt: 1, display: 'flex', flexWrap: 'wrap', columnGap: 3, rowGap: 0.5 }}>
              {prices && <PriceSummary prices={prices} short />}
              <BomFacts totals={bom.totals} />
            </Box>
          </>
        )}
      />
      <UnpricedLines
        lines={unpriced}
        mayAddOffers={canAddOffers}
        mayEdit={canEdit}
        onSubstitutes={(line) => setDialog({ act: 'substitutes', line })}
      />
      <LookAtList lines={lines} />
      {dialog && (
        <BomDialogs
          open={dialog}
          train={train}
          bom={bom}
          prefer={prefer}
          canEdit={canEdit}
          canChoose={canChoose}
          onClose={() => setDialog(null)}
        />
      )}
    </>
  );
}

const inlineLabel = {
  flexDirection: 'row',
  alignItems: 'center',
  columnGap: 1,
  '& .MuiInputLabel-root': { mb: 0, whiteSpace: 'nowrap' },
} as const;

const toolbarSx = {
  display: 'flex',
  flexWrap: 'wrap',
  alignItems: 'center',
  columnGap: 2,
  rowGap: 0.75,
  mb: 0.75,
  displayPrint: 'none',
  '& > .MuiButton-root': { fontWeight: 500 },
} as const;
