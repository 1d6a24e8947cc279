import Alert from '@mui/material/Alert';
import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import FormControlLabel from '@mui/material/FormControlLabel';
import Radio from '@mui/material/Radio';
import RadioGroup from '@mui/material/RadioGroup';
import TextField from '@mui/material/TextField';
import { useState, type FormEvent } from 'react';
import { useNavigate } from 'react-router-dom';
import { adoptOption } from '../api/hooks/useTrains';
import { asProblem } from '../api/problem';
import type { Brief, Pin } from '../api/types';
import { moduleWords, ratioWords, teethWords } from './optionWords';

interface AdoptDialogProps {
  brief: Pick<Brief, 'id' | 'title'>;
  /** What may be adopted; the first is proposed. */
  pins: readonly Pick<Pin, 'key' | 'searchId' | 'option'>[];
  onClose: () => void;
}

/** Makes a pinned option a train: asks which and under what title, then goes to it. */
export function AdoptDialog({ brief, pins, onClose }: AdoptDialogProps) {
  const navigate = useNavigate();
  const [key, setKey] = useState(pins[0]?.key ?? '');
  const [title, setTitle] = useState(brief.title);
  const [refused, setRefused] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);

  async function adopt(event: FormEvent): Promise<void> {
    event.preventDefault();
    const pin = pins.find((each) => each.key === key);
    if (!pin) return;
    if (title.trim() === '') return setRefused('Give the train a title, so that others find it.');
    setBusy(true);
    setRefused(null);
    try {
      const train = await adoptOption({
        briefId: brief.id,
        searchId: pin.searchId,
        optionKey: pin.key,
        title: title.trim(),
      });
      void navigate(`/trains/${encodeURIComponent(train.code)}`);
    } catch (error) {
      setRefused(asProblem(error).message);
      setBusy(false);
    }
  }

  return (
    <Dialog open onClose={onClose} fullWidth maxWidth="xs" aria-labelledby="adopt-title">
      <form onSubmit={(event) => void adopt(event)}>
        <DialogTitle id="adopt-title">Adopt as train</DialogTitle>
        <DialogContent>
          {refused !== null && (
            <Alert severity="error" sx={{ mb: 1.5 }}>
              {refused}
            </Alert>
          )}
          <RadioGroup
            aria-label="Option"
            value={key}
            onChange={(_, value) => setKey(value)}
            sx={{ mb: 1.5, display: pins.length > 1 ? undefined : 'none' }}
          >
            {pins.map(({ key: each, option }) => (
              <FormControlLabel
                key={each}
                value={each}
                control={<Radio />}
                label={`${teethWords(option.stages)}, ${moduleWords(option.stages)}, ${ratioWords(option.ratio.value)} : 1`}
              />
            ))}
          </RadioGroup>
          <TextField
            label="Title of the train"
            id="adopt-train-title"
            fullWidth
            autoFocus
            value={title}
            onChange={(event) => setTitle(event.target.value)}
            helperText="It becomes revision A, working; the brief keeps its pins."
          />
        </DialogContent>
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" variant="contained" loading={busy}>
            Adopt
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}
