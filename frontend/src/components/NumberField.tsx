import InputAdornment from '@mui/material/InputAdornment';
import TextField from '@mui/material/TextField';
import type { ReactNode } from 'react';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';
import { readDecimal } from './decimalText';

export interface NumberLimits {
  required?: boolean;
  min?: number;
  max?: number;
  /** The value must be above `min`, not equal to it. */
  above?: boolean;
  whole?: boolean;
}

interface NumberFieldProps<Form extends FieldValues> extends NumberLimits {
  control: Control<Form>;
  name: FieldPath<Form>;
  label: string;
  unit?: string;
  hint?: ReactNode;
  placeholder?: string;
  disabled?: boolean;
  autoFocus?: boolean;
}

const limitWords = (limit: number): string => limit.toLocaleString('en-GB', { maximumFractionDigits: 10 });

/** What is wrong with typed text as a figure within limits; `null` when nothing is. */
export function numberProblem(typed: string, limits: NumberLimits, unit = ''): string | null {
  const reading = readDecimal(typed);
  if (reading.kind === 'problem') return reading.message;
  if (reading.kind === 'blank') return limits.required ? 'Give a figure.' : null;
  const { value } = reading;
  const u = unit === '' ? '' : ` ${unit}`;
  if (limits.whole && !Number.isInteger(value)) return `Give a whole number; ${reading.text} is not one.`;
  if (limits.min !== undefined && limits.above && value <= limits.min)
    return `Must be above ${limitWords(limits.min)}${u}.`;
  if (limits.min !== undefined && value < limits.min)
    return `Must be at least ${limitWords(limits.min)}${u}.`;
  if (limits.max !== undefined && value > limits.max) return `Must be at most ${limitWords(limits.max)}${u}.`;
  return null;
}

/**
 * A figure with its unit. The form holds the text exactly as typed (a decimal comma is fine); `readDecimal` or
 * `numberOrNull` reads it when the form is sent. Nothing that was typed is ever rewritten.
 */
export function NumberField<Form extends FieldValues>(props: NumberFieldProps<Form>) {
  const { control, name, label, unit, hint, placeholder, disabled, autoFocus } = props;
  const { field, fieldState } = useController({
    control,
    name,
    rules: { validate: (typed) => numberProblem(String(typed ?? ''), props, unit) ?? true },
  });
  const { ref, ...input } = field;
  const error = fieldState.error?.message;
  return (
    <TextField
      {...input}
      inputRef={ref}
      label={label}
      fullWidth
      required={props.required}
      disabled={disabled}
      autoFocus={autoFocus}
      placeholder={placeholder}
      error={error !== undefined}
      helperText={error ?? hint}
      autoComplete="off"
      slotProps={{
        htmlInput: { inputMode: props.whole ? 'numeric' : 'decimal', className: 'number', maxLength: 40 },
        input:
          unit === undefined
            ? undefined
            : { endAdornment: <InputAdornment position="end">{unit}</InputAdornment> },
      }}
    />
  );
}

/** The typed figure, or `null` when the field is blank or not a number. */
export function numberOrNull(typed: string | undefined): number | null {
  const reading = readDecimal(typed ?? '');
  return reading.kind === 'number' ? reading.value : null;
}

/** A figure as text for a form: `1.25`, or blank for nothing. */
export function textOf(value: number | null | undefined): string {
  return value === null || value === undefined ? '' : String(value);
}
