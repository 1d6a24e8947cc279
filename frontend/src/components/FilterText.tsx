import TextField from '@mui/material/TextField';
import { useEffect, useRef, useState } from 'react';

interface FilterTextProps {
  label: string;
  /** As the address has it. */
  value: string;
  onChange: (text: string) => void;
  width?: number;
}

/** How long typing must rest before the list is asked, ms. */
const REST = 250;

/** A text filter that waits for a pause in the typing before it touches the address. */
export function FilterText({ label, value, onChange, width = 240 }: FilterTextProps) {
  const [typed, setTyped] = useState(value);
  const [lastValue, setLastValue] = useState(value);
  const waiting = useRef<ReturnType<typeof setTimeout>>(undefined);
  // The address changed by itself (back, cleared filters): follow it.
  if (value !== lastValue) {
    setLastValue(value);
    setTyped(value);
  }
  useEffect(() => () => clearTimeout(waiting.current), []);
  return (
    <TextField
      label={label}
      type="search"
      value={typed}
      autoComplete="off"
      onChange={(event) => {
        const text = event.target.value;
        setTyped(text);
        clearTimeout(waiting.current);
        waiting.current = setTimeout(() => {
          setLastValue(text.trim());
          onChange(text.trim());
        }, REST);
      }}
      sx={{ width: { xs: '100%', sm: width } }}
    />
  );
}
