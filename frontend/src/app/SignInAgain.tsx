import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import TextField from '@mui/material/TextField';
import Typography from '@mui/material/Typography';
import { useState, type FormEvent } from 'react';
import { useSWRConfig } from 'swr';
import { answer, api } from '../api/client';
import { asProblem } from '../api/problem';

/** Stands over the page when the session ended meanwhile; nothing beneath it is lost. */
export function SignInAgain({ email }: { email: string }) {
  const { mutate } = useSWRConfig();
  const [password, setPassword] = useState('');
  const [refusal, setRefusal] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);

  const signIn = async (event: FormEvent) => {
    event.preventDefault();
    setBusy(true);
    try {
      await answer(api.POST('/api/auth/sign-in', { body: { email, password } }));
      await mutate(() => true);
    } catch (error) {
      setRefusal(asProblem(error).message);
      setBusy(false);
    }
  };

  return (
    <Dialog open fullWidth maxWidth="xs" aria-labelledby="sign-in-again">
      <form onSubmit={(event) => void signIn(event)}>
        <DialogTitle id="sign-in-again">Your session ended</DialogTitle>
        <DialogContent>
          <Typography sx={{ mb: 2 }}>
            Sign in again as <b>{email}</b> to go on. The page behind this keeps what you typed.
          </Typography>
          <TextField
            label="Password"
            type="password"
            autoFocus
            fullWidth
            autoComplete="current-password"
            value={password}
            onChange={(event) => setPassword(event.target.value)}
            error={refusal !== null}
            helperText={refusal}
          />
        </DialogContent>
        <DialogActions>
          <Button onClick={() => window.location.assign('/sign-in')}>Leave</Button>
          <Button type="submit" variant="contained" disabled={busy || password === ''}>
            Sign in
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}
