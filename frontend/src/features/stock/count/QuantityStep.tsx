import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import InputAdornment from '@mui/material/InputAdornment';
import TextField from '@mui/material/TextField';
import Typography from '@mui/material/Typography';
import { useState, type FormEvent } from 'react';
import { numberOrNull, numberProblem } from '../../../components/NumberField';
import type { FoundPart } from './lookUp';

interface QuantityStepProps {
  part: FoundPart;
  start: string;
  onQuantity: (counted: number, text: string) => void;
  onBack: () => void;
}

/** What is there. Enter takes it. */
export function QuantityStep({ part, start, onQuantity, onBack }: QuantityStepProps) {
  const [typed, setTyped] = useState(start);
  const [wrong, setWrong] = useState<string | null>(null);
  const whole = part.unit === 'pcs';
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const problem = numberProblem(typed, { required: true, min: 0, max: 1_000_000, whole }, part.unit);
    const counted = numberOrNull(typed);
    if (problem !== null || counted === null) setWrong(problem ?? 'Give a figure.');
    else onQuantity(counted, typed);
  };
  return (
    <form noValidate onSubmit={submit}>
      <Typography variant="h2" component="p" className="part-number">
        {part.number}
      </Typography>
      <Typography color="textSecondary" sx={{ mb: 1.5, minHeight: 22 }}>
        {part.description || 'Not looked up: the network is away. The number is checked once it is sent.'}
      </Typography>
      <TextField
        label="What is there"
        value={typed}
        onChange={(event) => {
          setTyped(event.target.value);
          setWrong(null);
        }}
        fullWidth
        autoFocus
        autoComplete="off"
        error={wrong !== null}
        helperText={wrong ?? '0 when none is there'}
        slotProps={{
          htmlInput: {
            inputMode: whole ? 'numeric' : 'decimal',
            className: 'number',
            maxLength: 20,
            enterKeyHint: 'done',
            style: { height: 40, fontSize: 20 },
          },
          input: { endAdornment: <InputAdornment position="end">{part.unit}</InputAdornment> },
        }}
      />
      <Box sx={{ display: 'flex', gap: 1, mt: 1.5 }}>
        <Button type="submit" variant="contained" sx={{ flex: 1, minHeight: 48 }}>
          Take it, next
        </Button>
        <Button variant="outlined" sx={{ minHeight: 48 }} onClick={onBack}>
          Other part
        </Button>
      </Box>
    </form>
  );
}
