import Autocomplete from '@mui/material/Autocomplete';
import TextField from '@mui/material/TextField';
import { CURRENCY_CODES } from '@stageyard/libs/units';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';

interface CurrencyFieldProps<Form extends FieldValues> {
  control: Control<Form>;
  name: FieldPath<Form>;
  label?: string;
  hint?: string;
}

const NAMES = new Intl.DisplayNames('en', { type: 'currency' });

/** `EUR, Euro` */
export const currencyWords = (code: string): string => `${code}, ${NAMES.of(code) ?? code}`;

/** One of the ISO 4217 currencies, found by its code or name. */
export function CurrencyField<Form extends FieldValues>(props: CurrencyFieldProps<Form>) {
  const { control, name, label = 'Currency', hint } = props;
  const { field, fieldState } = useController({ control, name });
  const error = fieldState.error?.message;
  return (
    <Autocomplete
      options={CURRENCY_CODES}
      getOptionLabel={currencyWords}
      value={String(field.value)}
      onChange={(_, code) => field.onChange(code)}
      onBlur={field.onBlur}
      disableClearable
      autoHighlight
      renderInput={(params) => (
        <TextField
          {...params}
          inputRef={field.ref}
          label={label}
          required
          error={error !== undefined}
          helperText={error ?? hint}
        />
      )}
    />
  );
}
