import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import TextField from '@mui/material/TextField';
import Typography from '@mui/material/Typography';
import { useState, type FormEvent } from 'react';
import { usePlaces } from '../../../api/hooks/usePlaces';
import { Sheet } from '../../../components/Sheet';

/** Places offered under a thumb; the others are found by typing. */
const OFFERED = 12;
/** Longest name of a place, as the server takes it. */
const LONGEST = 60;

/** Where the count is made; chosen once and remembered. */
export function PlaceStep({ start, onChoose }: { start: string; onChoose: (place: string) => void }) {
  const [typed, setTyped] = useState(start);
  const [wrong, setWrong] = useState<string | null>(null);
  const places = usePlaces().map(({ place }) => place);
  const wanted = typed.trim().toLowerCase();
  const offered = places.filter((place) => wanted === '' || place.toLowerCase().includes(wanted));
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const place = typed.trim().replace(/\s+/g, ' ');
    if (place === '') setWrong('Say where you count: a rack, shelf or drawer.');
    // As it is written in the books, whatever the case.
    else onChoose(places.find((each) => each.toLowerCase() === place.toLowerCase()) ?? place);
  };
  return (
    <Sheet title="Where do you count?">
      <form noValidate onSubmit={submit}>
        <TextField
          label="Place"
          value={typed}
          onChange={(event) => {
            setTyped(event.target.value);
            setWrong(null);
          }}
          fullWidth
          autoFocus
          autoComplete="off"
          error={wrong !== null}
          helperText={wrong ?? 'Scan its label, choose it below, or type a new one'}
          slotProps={{ htmlInput: { maxLength: LONGEST, enterKeyHint: 'done', style: { height: 32 } } }}
        />
        <Button type="submit" variant="contained" fullWidth sx={{ mt: 1.5, minHeight: 48 }}>
          Count here
        </Button>
      </form>
      {offered.length > 0 && (
        <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 1, mt: 2 }}>
          {offered.slice(0, OFFERED).map((place) => (
            <Button key={place} variant="outlined" sx={{ minHeight: 48 }} onClick={() => onChoose(place)}>
              {place}
            </Button>
          ))}
        </Box>
      )}
      {offered.length > OFFERED && (
        <Typography color="textSecondary" sx={{ mt: 1 }}>
          {offered.length - OFFERED} more: type a part of the name.
        </Typography>
      )}
    </Sheet>
  );
}
