import MenuItem from '@mui/material/MenuItem';
import TextField from '@mui/material/TextField';
import type { ReactNode } from 'react';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';

interface ChoiceFieldProps<Form extends FieldValues> {
  control: Control<Form>;
  name: FieldPath<Form>;
  label: string;
  choices: readonly { value: string; name: string }[];
  hint?: ReactNode;
  required?: boolean;
  disabled?: boolean;
}

/** One of a few; a real list, reachable by keyboard. */
export function ChoiceField<Form extends FieldValues>(props: ChoiceFieldProps<Form>) {
  const { control, name, label, choices, hint, required, disabled } = props;
  const { field, fieldState } = useController({
    control,
    name,
    rules: { validate: (value) => !required || String(value ?? '') !== '' || 'Choose one.' },
  });
  const { ref, ...input } = field;
  const error = fieldState.error?.message;
  return (
    <TextField
      {...input}
      inputRef={ref}
      select
      label={label}
      fullWidth
      required={required}
      disabled={disabled}
      error={error !== undefined}
      helperText={error ?? hint}
      slotProps={{ select: { displayEmpty: true } }}
    >
      {choices.map((choice) => (
        <MenuItem key={choice.value} value={choice.value}>
          {choice.name}
        </MenuItem>
      ))}
    </TextField>
  );
}
