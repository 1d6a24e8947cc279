import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import TextField from '@mui/material/TextField';
import { useRef, useState, type FormEvent } from 'react';
import { CameraScan } from './CameraScan';
import { hasCameraScan } from './barcodeDetector';

/** Longest part number. */
const LONGEST = 40;

interface NumberStepProps {
  start: string;
  /** Gives what is wrong with the number; null when the part was found. */
  onFind: (number: string) => Promise<string | null>;
}

/** The part number: typed, or sent by a scanner, which types it and presses Enter. */
export function NumberStep({ start, onFind }: NumberStepProps) {
  const [typed, setTyped] = useState(start);
  const [wrong, setWrong] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const [scanning, setScanning] = useState(false);
  const input = useRef<HTMLInputElement>(null);

  const find = async (text: string) => {
    const number = text.trim();
    if (number === '') {
      setWrong('Scan or type a part number.');
      return;
    }
    setBusy(true);
    const problem = await onFind(number);
    setBusy(false);
    if (problem === null) return;
    setWrong(problem);
    // The next scan writes over it.
    input.current?.select();
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (!busy) void find(typed);
  };
  return (
    <form noValidate onSubmit={submit}>
      <TextField
        label="Part number"
        inputRef={input}
        value={typed}
        onChange={(event) => {
          setTyped(event.target.value);
          setWrong(null);
        }}
        fullWidth
        autoFocus
        autoComplete="off"
        error={wrong !== null}
        helperText={wrong ?? 'Scan or type it, then Enter'}
        slotProps={{
          htmlInput: {
            maxLength: LONGEST,
            autoCapitalize: 'characters',
            autoCorrect: 'off',
            spellCheck: false,
            enterKeyHint: 'next',
            style: { height: 40, fontSize: 20 },
          },
        }}
      />
      <Box sx={{ display: 'flex', gap: 1, mt: 1.5 }}>
        <Button type="submit" variant="contained" sx={{ flex: 1, minHeight: 48 }}>
          {busy ? 'Looking…' : 'Next'}
        </Button>
        {hasCameraScan() && (
          <Button variant="outlined" sx={{ minHeight: 48 }} onClick={() => setScanning(true)}>
            Use the camera
          </Button>
        )}
      </Box>
      {scanning && (
        <CameraScan
          onClose={() => setScanning(false)}
          onRead={(text) => {
            setScanning(false);
            setTyped(text);
            void find(text);
          }}
        />
      )}
    </form>
  );
}
