import MenuItem from '@mui/material/MenuItem';
import TextField from '@mui/material/TextField';
import { Controller, useFormContext } from 'react-hook-form';
import type { BriefField, BriefForm } from './briefForm';
import { FIELD_NAMES } from './fieldNames';
import { FieldRemarks, useRemarks } from './remarks';

interface ChoiceFieldProps {
  field: BriefField;
  label?: string;
  choices: readonly { value: string; words: string }[];
  bare?: boolean;
}

/** One of a few; remarks under it like under a figure. */
export function ChoiceField({ field, label, choices, bare = false }: ChoiceFieldProps) {
  const { control } = useFormContext<BriefForm>();
  const remarks = useRemarks(field);
  return (
    <Controller
      control={control}
      name={field}
      render={({ field: input, fieldState }) => (
        <div>
          <TextField
            id={`brief-${field}`}
            select
            fullWidth
            label={label ?? FIELD_NAMES[field].label}
            value={input.value}
            onChange={input.onChange}
            onBlur={input.onBlur}
            inputRef={input.ref}
            error={fieldState.invalid || remarks.some(({ kind }) => kind === 'crossed')}
          >
            {choices.map(({ value, words }) => (
              <MenuItem key={value} value={value}>
                {words}
              </MenuItem>
            ))}
          </TextField>
          {!bare && <FieldRemarks id={`remarks-${field}`} remarks={remarks} />}
        </div>
      )}
    />
  );
}
