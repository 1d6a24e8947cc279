import Autocomplete from '@mui/material/Autocomplete';
import TextField from '@mui/material/TextField';
import { useState, type Ref } from 'react';
import { useSupplier } from '../api/hooks/useSupplier';
import { useSuppliers } from '../api/hooks/useSuppliers';
import type { Supplier } from '../api/types';
import { useSettled } from './useSettled';

interface SupplierPickerProps {
  /** Code of the chosen supplier, or blank. */
  code: string;
  onPick: (supplier: Supplier | null) => void;
  error?: string;
  hint?: string;
  required?: boolean;
  inputRef?: Ref<HTMLInputElement>;
  onBlur?: () => void;
  autoFocus?: boolean;
}

/** One of the active suppliers, found by code, name or contact. */
export function SupplierPicker(props: SupplierPickerProps) {
  const { code, onPick, error, hint, required, inputRef, onBlur, autoFocus } = props;
  const { supplier } = useSupplier(code === '' ? null : code);
  const [typed, setTyped] = useState('');
  const text = useSettled(typed.trim().slice(0, 200));
  const chosen = code === '' ? null : (supplier ?? null);
  // The name of the chosen one stands in the field; it is no search.
  const searching = text !== '' && text !== chosen?.name;
  const { page, isLoading } = useSuppliers({
    standing: 'active',
    sort: 'name',
    size: 25,
    ...(searching ? { text } : {}),
  });
  return (
    <Autocomplete<Supplier>
      options={page?.items ?? []}
      value={chosen}
      onChange={(_, picked) => onPick(picked)}
      onInputChange={(_, value) => setTyped(value)}
      onBlur={onBlur}
      getOptionLabel={({ name }) => name}
      getOptionKey={(option) => option.code}
      isOptionEqualToValue={(a, b) => a.code === b.code}
      filterOptions={(all) => all}
      autoHighlight
      loading={isLoading}
      loadingText="Searching…"
      noOptionsText={text === '' ? 'No active supplier yet' : `No active supplier carries “${text}”.`}
      renderOption={({ key, ...item }, option) => (
        <li key={key} {...item}>
          <span className="part-number">{option.code}</span>&ensp;{option.name}
        </li>
      )}
      renderInput={(params) => (
        <TextField
          {...params}
          inputRef={inputRef}
          label="Supplier"
          required={required}
          autoFocus={autoFocus}
          error={error !== undefined}
          helperText={error ?? hint}
        />
      )}
    />
  );
}
