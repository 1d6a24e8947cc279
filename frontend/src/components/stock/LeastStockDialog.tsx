import Alert from '@mui/material/Alert';
import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { setLeastStock } from '../../api/hooks/useStockItem';
import { asProblem } from '../../api/problem';
import type { StockItem } from '../../api/types';
import { applyProblem } from '../applyProblem';
import { NumberField, numberOrNull, textOf } from '../NumberField';
import { useNotices } from '../Notices';
import { quantityWords } from './stockWords';

/** Says from when on the shelf of a part counts as low. */
export function LeastStockDialog({ item, onClose }: { item: StockItem; onClose: () => void }) {
  const { tell } = useNotices();
  const [version, setVersion] = useState(item.version);
  const [refusal, setRefusal] = useState<string | null>(null);
  const { control, handleSubmit, setError, formState } = useForm({
    defaultValues: { leastStock: textOf(item.leastStock) },
  });
  const save = handleSubmit(async ({ leastStock }) => {
    setRefusal(null);
    try {
      const after = await setLeastStock(item.number, numberOrNull(leastStock), version);
      const words =
        after.leastStock === null
          ? `${item.number} is not watched any more.`
          : `${item.number} is low below ${quantityWords(after.leastStock, after.unit)}.`;
      tell(words);
      onClose();
    } catch (error) {
      const problem = asProblem(error);
      if (problem.changedMeanwhile) {
        const theirs = problem.current as StockItem;
        const now = theirs.leastStock === null ? 'none' : quantityWords(theirs.leastStock, theirs.unit);
        setVersion(theirs.version);
        setRefusal(
          `Somebody changed this part meanwhile; its least stock is now ${now}. Save again to put yours in its place.`,
        );
        return;
      }
      setRefusal(applyProblem(problem, setError, (path) => (path === 'leastStock' ? path : null)));
    }
  });
  return (
    <Dialog open onClose={onClose} fullWidth maxWidth="xs" aria-labelledby="least-title">
      <form noValidate onSubmit={(event) => void save(event)}>
        <DialogTitle id="least-title">Least stock of {item.number}</DialogTitle>
        <DialogContent>
          {refusal !== null && (
            <Alert severity="error" sx={{ mb: 1.5 }}>
              {refusal}
            </Alert>
          )}
          <Typography color="textSecondary" sx={{ mb: 1.5 }}>
            {item.description}
          </Typography>
          <NumberField
            control={control}
            name="leastStock"
            label="Low below"
            unit={item.unit}
            min={0}
            above
            max={1_000_000}
            whole={item.unit === 'pcs'}
            autoFocus
            hint="Over all places. Leave it blank to watch this part no more."
          />
        </DialogContent>
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" variant="contained" disabled={formState.isSubmitting}>
            Save
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}
