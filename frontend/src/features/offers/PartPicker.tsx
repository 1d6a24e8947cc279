import Autocomplete from '@mui/material/Autocomplete';
import TextField from '@mui/material/TextField';
import { useController, type Control } from 'react-hook-form';
import type { OfferForm } from './offerForm';
import { usePartHit } from './usePartHit';

/** The part that is offered, found by number or words. */
export function PartPicker({ control }: { control: Control<OfferForm> }) {
  const { field, fieldState } = useController({
    control,
    name: 'partNumber',
    rules: { validate: (typed) => typed.trim() !== '' || 'Say which part is offered.' },
  });
  const { hits, hit, isLoading } = usePartHit(field.value);
  const error = fieldState.error?.message;
  return (
    <Autocomplete
      freeSolo
      options={hits}
      getOptionLabel={(option) => (typeof option === 'string' ? option : option.number)}
      filterOptions={(all) => all}
      inputValue={field.value}
      onInputChange={(_, text) => field.onChange(text)}
      onBlur={field.onBlur}
      loading={isLoading}
      renderOption={({ key, ...item }, option) => (
        <li key={key} {...item}>
          <span className="part-number">{option.number}</span>&ensp;{option.description}
        </li>
      )}
      renderInput={(params) => (
        <TextField
          {...params}
          inputRef={field.ref}
          label="Part"
          required
          error={error !== undefined}
          helperText={error ?? hit?.description ?? 'A number or words find it'}
        />
      )}
    />
  );
}
