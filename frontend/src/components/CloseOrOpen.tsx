import Alert from '@mui/material/Alert';
import Button from '@mui/material/Button';
import { useState, type ReactNode } from 'react';
import { asProblem } from '../api/problem';
import { ConfirmDialog } from './ConfirmDialog';
import { useNotices } from './Notices';

interface CloseOrOpenProps<Thing extends { version: number }> {
  thing: Thing;
  closed: boolean;
  /** "S-0001", "this offer" */
  name: string;
  /** What closing does, in a sentence or two. */
  children: ReactNode;
  /** @throws Problem when refused */
  save: (version: number, close: boolean) => Promise<Thing>;
  onChanged: (after: Thing) => void;
}

/** Closes a thing after asking once, with a way back; opens a closed one again. */
export function CloseOrOpen<Thing extends { version: number }>(props: CloseOrOpenProps<Thing>) {
  const { thing, closed, name, children, save, onChanged } = props;
  const { tell } = useNotices();
  const [asking, setAsking] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);

  const set = async (version: number, close: boolean): Promise<void> => {
    setBusy(true);
    setRefusal(null);
    try {
      const after = await save(version, close);
      onChanged(after);
      setAsking(false);
      if (close) tell(`Closed ${name}.`, { name: 'Undo', run: () => void set(after.version, false) });
      else tell(`Opened ${name} again.`);
    } catch (error) {
      const problem = asProblem(error);
      const stale = problem.changedMeanwhile && problem.current !== undefined;
      if (stale) onChanged(problem.current as Thing);
      const said = stale
        ? 'Somebody changed it meanwhile. You now see it as it stands; decide again.'
        : problem.message;
      setRefusal(said);
      if (!close) tell(said);
    } finally {
      setBusy(false);
    }
  };

  return (
    <>
      {closed ? (
        <Button variant="outlined" disabled={busy} onClick={() => void set(thing.version, false)}>
          Open {name} again
        </Button>
      ) : (
        <Button variant="outlined" color="error" disabled={busy} onClick={() => setAsking(true)}>
          Close {name}
        </Button>
      )}
      <ConfirmDialog
        open={asking}
        title={`Close ${name}?`}
        confirm={`Close ${name}`}
        danger
        busy={busy}
        onConfirm={() => void set(thing.version, true)}
        onCancel={() => setAsking(false)}
      >
        {children}
        {refusal !== null && (
          <Alert severity="error" sx={{ mt: 1.5 }}>
            {refusal}
          </Alert>
        )}
      </ConfirmDialog>
    </>
  );
}
