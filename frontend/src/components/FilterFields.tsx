import MenuItem from '@mui/material/MenuItem';
import TextField from '@mui/material/TextField';
import { useEffect, useState, type KeyboardEvent } from 'react';

interface TypedFilterProps {
  label: string;
  value: string;
  onSet: (value: string) => void;
  width: number | string;
  placeholder?: string;
  figure?: boolean;
}

const PAUSE_MS = 300;

/** A typed filter: takes effect after a short pause, or at once on Enter. */
export function TypedFilter({ label, value, onSet, width, placeholder, figure = false }: TypedFilterProps) {
  const [typed, setTyped] = useState(value);
  const [known, setKnown] = useState(value);
  if (known !== value) {
    // The address changed from outside (back button, "clear"): follow it.
    setKnown(value);
    setTyped(value);
  }
  useEffect(() => {
    if (typed === value) return undefined;
    const timer = setTimeout(() => onSet(typed), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [typed, value, onSet]);
  const now = (event: KeyboardEvent) => {
    if (event.key === 'Enter' && typed !== value) onSet(typed);
  };
  return (
    <TextField
      label={label}
      value={typed}
      onChange={(event) => setTyped(event.target.value)}
      onKeyDown={now}
      placeholder={placeholder}
      sx={{ width, flexGrow: figure ? 0 : 1, maxWidth: figure ? undefined : 320 }}
      slotProps={{
        htmlInput: figure ? { inputMode: 'decimal', className: 'number', maxLength: 20 } : { maxLength: 200 },
      }}
    />
  );
}

interface ChoiceFilterProps {
  label: string;
  value: string;
  onSet: (value: string) => void;
  width: number;
  choices: readonly { value: string; name: string; count?: number }[];
}

/** One of a few values, or any; the counts say what the library holds. */
export function ChoiceFilter({ label, value, onSet, width, choices }: ChoiceFilterProps) {
  const unlisted = value !== '' && choices.every((choice) => choice.value !== value);
  return (
    <TextField
      select
      label={label}
      value={value}
      onChange={(event) => onSet(event.target.value)}
      sx={{ width }}
      slotProps={{
        select: {
          displayEmpty: true,
          renderValue: (chosen) =>
            choices.find((each) => each.value === chosen)?.name ?? (String(chosen) || 'any'),
          MenuProps: { slotProps: { paper: { sx: { maxHeight: 380 } } } },
        },
      }}
    >
      <MenuItem value="">any</MenuItem>
      {unlisted && <MenuItem value={value}>{value}</MenuItem>}
      {choices.map((choice) => (
        <MenuItem key={choice.value} value={choice.value} sx={{ justifyContent: 'space-between', gap: 2 }}>
          <span>{choice.name}</span>
          {choice.count !== undefined && <span style={{ opacity: 0.75 }}>{choice.count}</span>}
        </MenuItem>
      ))}
    </TextField>
  );
}
