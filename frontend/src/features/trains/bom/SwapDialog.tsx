import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import FormControlLabel from '@mui/material/FormControlLabel';
import Radio from '@mui/material/Radio';
import RadioGroup from '@mui/material/RadioGroup';
import Typography from '@mui/material/Typography';
import { useId } from 'react';
import { useLineSubstitutes } from '../../../api/hooks/useBomEdits';
import { asProblem } from '../../../api/problem';
import type { BomLine, Train } from '../../../api/types';
import { ErrorState } from '../../../components/ErrorState';
import { LoadingRows } from '../../../components/LoadingRows';
import { SubstituteLine } from '../../../components/substitutes/SubstituteLine';
import { quantityWords } from './bomCells';
import { SwapPreview } from './SwapPreview';
import { ORIGINAL, useSwap } from './useSwap';

interface SwapDialogProps {
  train: Train;
  line: BomLine;
  /** Quantity of the line × build quantity. */
  needed: number;
  canSwap: boolean;
  onClose: () => void;
}

/** Parts that could take a line's place; choosing one shows what it changes before anything is booked. */
export function SwapDialog({ train, line, needed, canSwap, onClose }: SwapDialogProps) {
  const id = useId();
  const { data, error, mutate } = useLineSubstitutes(train.code, line.key, needed);
  const swap = useSwap(train, line, onClose);
  const items = data?.items ?? [];
  const now = line.partNumber ?? line.description;
  const own = line.replaces && (line.replaces.partNumber ?? line.replaces.description);

  return (
    <Dialog
      open
      onClose={onClose}
      fullWidth
      maxWidth={swap.choice === null ? 'md' : 'lg'}
      aria-labelledby={id}
    >
      <DialogTitle id={id}>{`Substitutes for ${now}`}</DialogTitle>
      <DialogContent>
        {swap.problem !== null && (
          <Alert severity="error" sx={{ mb: 1.5 }}>
            {swap.problem}
          </Alert>
        )}
        <Typography color="textSecondary" sx={{ mb: 1 }}>
          {`Find ${line.findNumber}, ${line.source.join(', ')}; ${quantityWords({ quantity: needed, unit: line.unit })} needed. Parts that drop in, the soonest here first.`}
        </Typography>
        {!data && error === undefined && <LoadingRows rows={5} height={44} label="Loading the substitutes" />}
        {!data && error !== undefined && (
          <ErrorState problem={asProblem(error)} what="the substitutes" onRetry={() => void mutate()} />
        )}
        <Box sx={swap.choice === null ? undefined : sideBySide}>
          <Box sx={{ minWidth: 0 }}>
            {data && (
              <RadioGroup
                aria-label="Substitute"
                value={swap.choice ?? ''}
                onChange={(_, value) => swap.choose(value)}
              >
                {own && canSwap && (
                  <FormControlLabel
                    value={ORIGINAL}
                    control={<Radio />}
                    label={`Put the original part back: ${own}`}
                  />
                )}
                {items.map((substitute) => (
                  <FormControlLabel
                    key={substitute.part.number}
                    value={substitute.part.number}
                    disabled={!canSwap}
                    control={<Radio />}
                    label={<SubstituteLine substitute={substitute} />}
                    sx={{
                      alignItems: 'flex-start',
                      mr: 0,
                      '& .MuiFormControlLabel-label, & .MuiFormControlLabel-label.Mui-disabled': {
                        flex: 1,
                        color: 'text.primary',
                      },
                    }}
                  />
                ))}
              </RadioGroup>
            )}
            {data && items.length === 0 && (
              <Typography color="textSecondary">
                No cleared part in the library drops in here. A librarian can add one under Parts.
              </Typography>
            )}
            {data && data.leftOut > 0 && (
              <Typography variant="body2" color="textSecondary" sx={{ mt: 1 }}>
                {`${data.leftOut} more drop in; they come later or cost more.`}
              </Typography>
            )}
          </Box>
          <Box aria-live="polite">
            {swap.choice !== null && <SwapPreview result={swap.preview} loading={swap.trying} />}
          </Box>
        </Box>
      </DialogContent>
      <DialogActions>
        <Button onClick={onClose}>{canSwap ? 'Cancel' : 'Close'}</Button>
        {canSwap && (
          <Button
            variant="contained"
            loading={swap.booking}
            disabled={swap.choice === null || swap.preview === null}
            onClick={() => void swap.book()}
          >
            {swap.choice === null
              ? 'Choose a part'
              : swap.choice === ORIGINAL
                ? 'Put the original part back'
                : `Take ${swap.choice}`}
          </Button>
        )}
      </DialogActions>
    </Dialog>
  );
}

/** The choices and what the chosen one changes, beside each other where there is room. */
const sideBySide = {
  display: 'grid',
  gridTemplateColumns: { xs: 'minmax(0, 1fr)', md: 'minmax(0, 1fr) minmax(0, 1.1fr)' },
  columnGap: 3,
  alignItems: 'start',
} as const;
