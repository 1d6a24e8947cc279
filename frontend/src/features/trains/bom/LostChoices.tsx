import Alert from '@mui/material/Alert';
import Button from '@mui/material/Button';
import { bookSwap } from '../../../api/hooks/useBomEdits';
import { saveBuying } from '../../../api/hooks/useTrainPrices';
import type { Bom, Train, TrainPrices } from '../../../api/types';
import { useTrainSaving } from '../useTrainSaving';

interface LostChoicesProps {
  train: Train;
  lost: TrainPrices['lostChoices'];
  canChoose: boolean;
}

/** Offers that a person chose and that cannot be used any more, with why; the rule stands in. */
export function LostChoices({ train, lost, canChoose }: LostChoicesProps) {
  const saving = useTrainSaving();
  if (lost.length === 0) return null;
  const choices = lost.map(({ partNumber }) => ({ partNumber, offerId: null }));
  const forget = () => saving.run(() => saveBuying(train.code, { version: train.version, choices }), train);
  return (
    <Alert
      severity="warning"
      sx={{ mb: 1 }}
      action={
        canChoose && (
          <Button onClick={() => void forget()} loading={saving.busy}>
            Let the rule choose
          </Button>
        )
      }
    >
      {lost.map(({ partNumber, message }) => (
        <div key={partNumber}>{message}</div>
      ))}
      {saving.problem}
    </Alert>
  );
}

interface IdleSwapsProps {
  train: Train;
  idle: Bom['idleSwaps'];
  canEdit: boolean;
}

/** Parts that were chosen for lines which the bill no longer has. */
export function IdleSwaps({ train, idle, canEdit }: IdleSwapsProps) {
  const saving = useTrainSaving();
  const [first] = idle;
  if (!first) return null;
  const forget = () =>
    saving.run(
      () => bookSwap(train.code, { version: train.version, key: first.key, partNumber: null }),
      train,
    );
  return (
    <Alert
      severity="info"
      sx={{ mb: 1 }}
      action={
        canEdit && (
          <Button onClick={() => void forget()} loading={saving.busy}>
            Forget this choice
          </Button>
        )
      }
    >
      {`${first.partNumber} was chosen for a line that this bill no longer has (${first.key}).`}
      {idle.length > 1 && ` ${idle.length - 1} more such ${idle.length === 2 ? 'choice' : 'choices'}.`}
      {saving.problem}
    </Alert>
  );
}
