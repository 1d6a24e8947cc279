import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import TextField from '@mui/material/TextField';
import { useState, type FormEvent } from 'react';
import { saveBuying } from '../../../api/hooks/useTrainPrices';
import type { Train } from '../../../api/types';
import { readDecimal } from '../../../components/decimalText';
import { formatCount } from '../../../components/figures';
import { numberProblem } from '../../../components/NumberField';
import { useNotices } from '../../../components/Notices';
import { useTrainSaving } from '../useTrainSaving';

/** Bounds of a build quantity, as the server keeps them. */
const LIMITS = { required: true, whole: true, min: 1, max: 100_000 } as const;

/** How many trains are built at once; every quantity and price on the bill follows. */
export function BuildQuantityField({ train, canSet }: { train: Train; canSet: boolean }) {
  const [typed, setTyped] = useState(String(train.buildQuantity));
  const [began, setBegan] = useState(train.buildQuantity);
  const [wrong, setWrong] = useState<string | null>(null);
  const saving = useTrainSaving();
  const { tell } = useNotices();
  // What somebody else set meanwhile is shown, unless something was typed here.
  if (train.buildQuantity !== began) {
    if (typed === String(began)) setTyped(String(train.buildQuantity));
    setBegan(train.buildQuantity);
  }
  if (!canSet) return <span>{`Prices for ${formatCount(train.buildQuantity)} to build`}</span>;

  async function set(event: FormEvent): Promise<void> {
    event.preventDefault();
    const problem = numberProblem(typed, LIMITS);
    setWrong(problem);
    const reading = readDecimal(typed);
    if (problem !== null || reading.kind !== 'number') return;
    const buildQuantity = reading.value;
    const saved = await saving.run(() => saveBuying(train.code, { version: train.version, buildQuantity }));
    if (!saved) return;
    setTyped(String(saved.buildQuantity));
    tell(`${saved.code}: ${formatCount(saved.buildQuantity)} to build.`);
  }

  const error =
    wrong ??
    ([saving.problem, ...saving.issues.map(({ message }) => message)].filter(Boolean).join(' ') || null);
  const changed = typed.trim() !== String(train.buildQuantity);
  return (
    <Box
      component="form"
      noValidate
      onSubmit={(event) => void set(event)}
      sx={{ display: 'flex', alignItems: 'flex-start', gap: 1, displayPrint: 'none' }}
    >
      <TextField
        id="build-quantity"
        label="Build quantity"
        value={typed}
        onChange={(event) => {
          setTyped(event.target.value);
          setWrong(null);
        }}
        error={error !== null}
        helperText={error}
        autoComplete="off"
        slotProps={{ htmlInput: { inputMode: 'numeric', className: 'number', maxLength: 12 } }}
        sx={{
          flexDirection: 'row',
          alignItems: 'center',
          flexWrap: 'wrap',
          columnGap: 1,
          '& .MuiInputLabel-root': { mb: 0 },
          '& .MuiInputBase-root': { width: 84 },
          '& .MuiFormHelperText-root': { flexBasis: '100%', maxWidth: 320 },
        }}
      />
      {changed && (
        <Button type="submit" variant="outlined" loading={saving.busy}>
          Set
        </Button>
      )}
    </Box>
  );
}
