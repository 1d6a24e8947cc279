import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import Typography from '@mui/material/Typography';
import useMediaQuery from '@mui/material/useMediaQuery';
import { useEffect, useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { useStockItem } from '../../api/hooks/useStockItem';
import type { MovementKind } from '../../api/types';
import { NumberField } from '../NumberField';
import { useNotices } from '../Notices';
import { TextInput } from '../TextInput';
import { useSettled } from '../useSettled';
import { ActField } from './ActField';
import { AfterWords } from './AfterWords';
import { type MovementForm, quantityLimits } from './movementForm';
import { PlaceField } from './PlaceField';
import { ACT_NAMES, bookedWords } from './stockWords';
import { useBooking } from './useBooking';

interface MovementDialogProps {
  /** null: the person types it, or a scanner does. */
  number: string | null;
  kind: MovementKind;
  onClose: () => void;
}

/** Books one change of a shelf quantity. What was typed stays when the server refuses. */
export function MovementDialog({ number, kind, onClose }: MovementDialogProps) {
  const narrow = useMediaQuery('(max-width: 600px)');
  const { tell } = useNotices();
  const form = useForm<MovementForm>({
    defaultValues: { number: number ?? '', kind, quantity: '', place: '', reason: '' },
  });
  const { control, handleSubmit, setError } = form;
  const { isDirty, isSubmitting } = form.formState;
  const typed = useWatch({ control });
  const settled = useSettled((typed.number ?? '').trim());
  const { item, problem } = useStockItem(number ?? settled);
  const [refusal, setRefusal] = useState<string | null>(null);
  const book = useBooking();
  const act = typed.kind ?? kind;
  const limits = quantityLimits(act, item?.unit);

  // A part that lies at one place only most likely goes there, or comes from there.
  const [only] = item?.places.length === 1 ? item.places : [];
  const home = only?.place ?? '';
  useEffect(() => {
    if (home !== '' && form.getValues('place') === '') form.setValue('place', home);
  }, [form, home]);

  const save = handleSubmit(async (values) => {
    setRefusal(null);
    const result = await book(values, item, setError);
    if (result.movement) {
      tell(bookedWords(result.movement));
      onClose();
    } else setRefusal(result.refusal);
  });

  return (
    <Dialog
      open
      onClose={(_, reason) => {
        // A click beside the dialog must not throw away what was typed.
        if (reason !== 'backdropClick' || !isDirty) onClose();
      }}
      fullWidth
      maxWidth="xs"
      fullScreen={narrow}
      aria-labelledby="movement-title"
    >
      <form noValidate onSubmit={(event) => void save(event)}>
        <DialogTitle id="movement-title">
          {number === null ? 'Book a stock movement' : `${ACT_NAMES[act]} ${number}`}
        </DialogTitle>
        <DialogContent>
          <Box sx={{ display: 'flex', flexDirection: 'column', gap: 1.5 }}>
            {refusal !== null && <Alert severity="error">{refusal}</Alert>}
            <ActField control={control} />
            {number === null ? (
              <TextInput
                control={control}
                name="number"
                label="Part number"
                required
                most={40}
                autoFocus
                hint={item?.description ?? (problem && settled !== '' ? problem.message : 'Type or scan it')}
              />
            ) : (
              <Typography color="textSecondary">{item?.description}</Typography>
            )}
            <PlaceField control={control} name="place" item={item} />
            <NumberField
              key={`${act} ${item?.unit ?? ''}`}
              control={control}
              name="quantity"
              label={
                act === 'counted' ? 'What is there' : act === 'corrected' ? 'Added, or taken off' : 'Quantity'
              }
              {...limits}
              required
              autoFocus={number !== null && act === kind}
              unit={item?.unit ?? 'pcs'}
              {...(act === 'corrected' ? { hint: 'Below zero takes off, such as −2' } : {})}
            />
            <AfterWords item={item} form={typed} />
            <TextInput
              control={control}
              name="reason"
              label="Why"
              most={500}
              required={act === 'corrected'}
              hint={
                act === 'corrected' ? 'Say what it mends' : 'Delivery note, train, winch: what helps later'
              }
            />
          </Box>
        </DialogContent>
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" variant="contained" disabled={isSubmitting}>
            {ACT_NAMES[act]}
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}
