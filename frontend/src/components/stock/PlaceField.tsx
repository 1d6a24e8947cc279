import Autocomplete from '@mui/material/Autocomplete';
import Box from '@mui/material/Box';
import TextField from '@mui/material/TextField';
import { useController, type Control, type FieldPath, type FieldValues } from 'react-hook-form';
import { usePlaces } from '../../api/hooks/usePlaces';
import type { StockItem } from '../../api/types';
import { quantityWords } from './stockWords';

interface PlaceFieldProps<Form extends FieldValues> {
  control: Control<Form>;
  name: FieldPath<Form>;
  /** Places where this part lies stand first, with how much. */
  item: StockItem | undefined;
}

/** Rack, shelf or drawer: one that is known, or a new one typed in. */
export function PlaceField<Form extends FieldValues>({ control, name, item }: PlaceFieldProps<Form>) {
  const known = usePlaces();
  const { field, fieldState } = useController({
    control,
    name,
    rules: {
      validate: (typed) => {
        const text = String(typed ?? '').trim();
        if (text === '') return 'Say where: a rack, shelf or drawer.';
        return text.length <= 60 || `At most 60 characters; this has ${text.length}.`;
      },
    },
  });
  const own = item?.places ?? [];
  const others = known.map(({ place }) => place).filter((place) => own.every((each) => each.place !== place));
  const { ref, value, onChange, onBlur } = field;
  const error = fieldState.error?.message;
  return (
    <Autocomplete
      freeSolo
      autoSelect={false}
      options={[...own.map(({ place }) => place), ...others]}
      inputValue={String(value ?? '')}
      onInputChange={(_, typed, reason) => {
        // The list sets itself back when it starts; what stands in the field is not its to change.
        if (reason !== 'reset') onChange(typed);
      }}
      onBlur={onBlur}
      renderOption={({ key, ...props }, place) => {
        const level = own.find((each) => each.place === place);
        return (
          <li key={key} {...props}>
            <Box component="span" sx={{ flex: 1 }}>
              {place}
            </Box>
            {level && item && <span>{quantityWords(level.quantity, item.unit)}</span>}
          </li>
        );
      }}
      renderInput={(params) => (
        <TextField
          {...params}
          inputRef={ref}
          label="Place"
          required
          error={error !== undefined}
          helperText={error ?? 'A rack, shelf or drawer; type a new one if it is not in the list'}
        />
      )}
    />
  );
}
