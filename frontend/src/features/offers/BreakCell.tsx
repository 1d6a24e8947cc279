import TextField from '@mui/material/TextField';
import type { KeyboardEvent } from 'react';
import { useController, type Control } from 'react-hook-form';
import type { OfferForm } from './offerForm';

interface BreakCellProps {
  control: Control<OfferForm>;
  name: `breaks.${number}.${'quantity' | 'price'}`;
  /** For a screen reader; the column's head says it to the eye. */
  label: string;
  /** What is wrong; null when nothing is. */
  check: () => string | null;
  onKeyDown: (event: KeyboardEvent) => void;
}

/** One figure of the price breaks; holds the text exactly as typed. */
export function BreakCell({ control, name, label, check, onKeyDown }: BreakCellProps) {
  const { field, fieldState } = useController({
    control,
    name,
    rules: { validate: () => check() ?? true },
  });
  const { ref, ...input } = field;
  const error = fieldState.error?.message;
  return (
    <TextField
      {...input}
      inputRef={ref}
      fullWidth
      error={error !== undefined}
      helperText={error}
      autoComplete="off"
      onKeyDown={onKeyDown}
      slotProps={{
        htmlInput: { 'aria-label': label, inputMode: 'decimal', className: 'number', maxLength: 40 },
      }}
    />
  );
}
