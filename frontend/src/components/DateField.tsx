import TextField from '@mui/material/TextField';
import { isCalendarDate } from '@stageyard/libs/bill-of-materials';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';
import { formatDay } from './figures';

interface DateFieldProps<Form extends FieldValues> {
  control: Control<Form>;
  name: FieldPath<Form>;
  label: string;
  hint?: string;
  /** Stands in place of the hint while no day is given. */
  blank?: string;
  required?: boolean;
  /** Says what is wrong with a day that is given; null when nothing is. */
  check?: (day: string) => string | null;
}

/**
 * A day of the calendar in the browser's own field, which may write 12/01 for the first of December: the day in words
 * stands below. The form holds `YYYY-MM-DD`, or blank.
 */
export function DateField<Form extends FieldValues>(props: DateFieldProps<Form>) {
  const { control, name, label, hint, blank, required, check } = props;
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
  const day = String(field.value ?? '');
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
      helperText={
        error ?? (isCalendarDate(day) ? [formatDay(day), hint].filter(Boolean).join(' · ') : (blank ?? hint))
      }
      slotProps={{ htmlInput: { min: '1990-01-01', max: '2100-12-31' } }}
    />
  );
}
