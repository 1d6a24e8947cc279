import Autocomplete from '@mui/material/Autocomplete';
import TextField from '@mui/material/TextField';
import { useFinder } from '../../api/hooks/useFinder';

interface SuccessorFieldProps {
  value: string;
  onChange: (number: string) => void;
  exclude: string;
}

/** The part to use instead, found by number or words; may stay blank. */
export function SuccessorField({ value, onChange, exclude }: SuccessorFieldProps) {
  const { found, isLoading } = useFinder(value);
  const hits = (found?.parts ?? []).filter((part) => part.number !== exclude);
  return (
    <Autocomplete
      freeSolo
      options={hits}
      getOptionLabel={(hit) => (typeof hit === 'string' ? hit : hit.number)}
      filterOptions={(all) => all}
      inputValue={value}
      onInputChange={(_, text) => onChange(text)}
      loading={isLoading}
      renderOption={({ key, ...props }, hit) => (
        <li key={key} {...props}>
          <span className="part-number">{hit.number}</span>&ensp;{hit.description}
        </li>
      )}
      renderInput={(params) => (
        <TextField
          {...params}
          label="Use this part instead"
          helperText="May stay blank; a number or words find it."
        />
      )}
    />
  );
}
