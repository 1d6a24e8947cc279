import TextField from '@mui/material/TextField';
import type { ReactNode } from 'react';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';

interface TextInputProps<Form extends FieldValues> {
  control: Control<Form>;
  name: FieldPath<Form>;
  label: string;
  hint?: ReactNode;
  required?: boolean;
  /** Fewest characters, unless blank. */
  least?: number;
  /** Most characters; said at the field rather than cut off silently. */
  most?: number;
  rows?: number;
  type?: 'text' | 'email' | 'password';
  autoComplete?: string;
  autoFocus?: boolean;
  placeholder?: string;
}

/** A text field of a form whose refusals stand right under it. */
export function TextInput<Form extends FieldValues>(props: TextInputProps<Form>) {
  const {
    control,
    name,
    label,
    hint,
    required,
    least = 0,
    most = 200,
    rows,
    type,
    autoComplete,
    autoFocus,
  } = props;
  const { field, fieldState } = useController({
    control,
    name,
    rules: {
      validate: (typed) => {
        const text = String(typed ?? '');
        if (required && text.trim() === '') return 'Fill this in.';
        if (text !== '' && text.length < least)
          return `At least ${least} characters; this has ${text.length}.`;
        return text.length <= most || `At most ${most} characters; this has ${text.length}.`;
      },
    },
  });
  const { ref, ...input } = field;
  const error = fieldState.error?.message;
  return (
    <TextField
      {...input}
      inputRef={ref}
      label={label}
      type={type}
      fullWidth
      required={required}
      multiline={rows !== undefined}
      minRows={rows}
      maxRows={rows === undefined ? undefined : rows * 3}
      error={error !== undefined}
      helperText={error ?? hint}
      autoComplete={autoComplete ?? 'off'}
      autoFocus={autoFocus}
      placeholder={props.placeholder}
    />
  );
}
