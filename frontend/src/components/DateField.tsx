import TextField from '@mui/material/TextField';
import type { ReactNode } from 'react';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';

interface DateFieldProps<Form extends FieldValues> {
  control: Control<Form>;
  name: FieldPath<Form>;
  label: string;
  hint?: ReactNode;
  required?: boolean;
  /** Says what is wrong with a day that is given; null when nothing is. */
  check?: (day: string) => string | null;
}

/** A day of the calendar in the browser's own field; the form holds `YYYY-MM-DD`, or blank. */
export function DateField<Form extends FieldValues>(props: DateFieldProps<Form>) {
  const { control, name, label, hint, required, check } = props;
  const { field, fieldState } = useController({
    control,
    name,
    rules: {
      validate: (value) => {
        const day = String(value ?? '');
        if (day === '') return required ? 'Give a day.' : true;
        return check?.(day) ?? true;
      },
    },
  });
  const { ref, ...input } = field;
  const error = fieldState.error?.message;
  return (
    <TextField
      {...input}
      inputRef={ref}
      type="date"
      label={label}
      fullWidth
      required={required}
      error={error !== undefined}
      helperText={error ?? hint}
      slotProps={{ htmlInput: { min: '1990-01-01', max: '2100-12-31' } }}
    />
  );
}
