import InputAdornment from '@mui/material/InputAdornment';
import TextField from '@mui/material/TextField';
import type { ReactNode } from 'react';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';
import { readMoney } from './moneyText';

interface MoneyFieldProps<Form extends FieldValues> {
  control: Control<Form>;
  name: FieldPath<Form>;
  label: string;
  /** ISO 4217; stands behind the figure and decides how many decimals there may be. */
  currency: string;
  hint?: ReactNode;
  required?: boolean;
}

/** What is wrong with a typed amount; null when nothing is. */
export function moneyProblem(typed: string, currency: string, required = false): string | null {
  const reading = readMoney(typed, currency);
  if (reading.kind === 'problem') return reading.message;
  return required && reading.kind === 'blank' ? 'Give an amount.' : null;
}

/** An amount of money. The form holds the text exactly as typed; `readMoney` reads it when the form is sent. */
export function MoneyField<Form extends FieldValues>(props: MoneyFieldProps<Form>) {
  const { control, name, label, currency, hint, required } = props;
  const { field, fieldState } = useController({
    control,
    name,
    rules: { validate: (typed) => moneyProblem(String(typed ?? ''), currency, required) ?? true },
  });
  const { ref, ...input } = field;
  const error = fieldState.error?.message;
  return (
    <TextField
      {...input}
      inputRef={ref}
      label={label}
      fullWidth
      required={required}
      error={error !== undefined}
      helperText={error ?? hint}
      autoComplete="off"
      slotProps={{
        htmlInput: { inputMode: 'decimal', className: 'number', maxLength: 40 },
        input: { endAdornment: <InputAdornment position="end">{currency}</InputAdornment> },
      }}
    />
  );
}
