import Alert from '@mui/material/Alert';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { answer, api } from '../../api/client';
import { asProblem } from '../../api/problem';
import type { Part, PartStanding } from '../../api/types';
import { ConfirmDialog } from '../../components/ConfirmDialog';
import { useNotices } from '../../components/Notices';
import { SuccessorField } from './SuccessorField';
import { useRefreshParts } from './useRefreshParts';

interface StandingActionsProps {
  part: Part;
  onChanged: (after: Part) => void;
}

/** Clear a draft, withdraw a part (with a successor), clear a withdrawn one again. */
export function StandingActions({ part, onChanged }: StandingActionsProps) {
  const { tell } = useNotices();
  const refresh = useRefreshParts();
  const [withdrawing, setWithdrawing] = useState(false);
  const [successor, setSuccessor] = useState('');
  const [refusal, setRefusal] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);

  const move = async (version: number, standing: PartStanding, successorNumber: string | null) => {
    setBusy(true);
    setRefusal(null);
    try {
      const body = { version, standing, ...(standing === 'withdrawn' ? { successorNumber } : {}) };
      const path = { number: part.number };
      const after = await answer(api.PATCH('/api/parts/{number}', { params: { path }, body }));
      onChanged(after);
      refresh();
      setWithdrawing(false);
      if (standing === 'withdrawn') {
        const undo = () => void move(after.version, 'cleared', null);
        tell(
          `${part.number} withdrawn.`,
          part.standing === 'cleared' ? { name: 'Undo', run: undo } : undefined,
        );
      } else tell(`${part.number} cleared for use.`);
    } catch (error) {
      const problem = asProblem(error);
      if (problem.changedMeanwhile && problem.current !== undefined) {
        onChanged(problem.current as Part);
        setRefusal('Somebody changed this part meanwhile. You now see it as it stands; decide again.');
      } else setRefusal(problem.errors.map((issue) => issue.message).join(' ') || problem.message);
      if (standing !== 'withdrawn') tell(problem.message);
    } finally {
      setBusy(false);
    }
  };

  return (
    <>
      {part.standing !== 'withdrawn' && (
        <Button variant="outlined" color="error" disabled={busy} onClick={() => setWithdrawing(true)}>
          Withdraw
        </Button>
      )}
      {part.standing !== 'cleared' && (
        <Button variant="outlined" disabled={busy} onClick={() => void move(part.version, 'cleared', null)}>
          {part.standing === 'withdrawn' ? 'Clear again' : 'Clear for use'}
        </Button>
      )}
      <ConfirmDialog
        open={withdrawing}
        title={`Withdraw ${part.number}?`}
        confirm={`Withdraw ${part.number}`}
        danger
        busy={busy}
        onConfirm={() =>
          void move(part.version, 'withdrawn', successor.trim() === '' ? null : successor.trim())
        }
        onCancel={() => setWithdrawing(false)}
      >
        <Typography sx={{ mb: 2 }}>
          It stays in the library and in trains that use it, but is not offered for new ones.
        </Typography>
        <SuccessorField value={successor} onChange={setSuccessor} exclude={part.number} />
        {refusal !== null && (
          <Alert severity="error" sx={{ mt: 1.5 }}>
            {refusal}
          </Alert>
        )}
      </ConfirmDialog>
    </>
  );
}
