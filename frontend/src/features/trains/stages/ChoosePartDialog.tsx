import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import FormControlLabel from '@mui/material/FormControlLabel';
import Radio from '@mui/material/Radio';
import RadioGroup from '@mui/material/RadioGroup';
import Typography from '@mui/material/Typography';
import { useState, type FormEvent } from 'react';
import { gearPlace, useFittingGears, type GearPlace } from '../../../api/hooks/useFittingGears';
import { saveTrain } from '../../../api/hooks/useTrain';
import { asProblem } from '../../../api/problem';
import type { Part, Train } from '../../../api/types';
import { ErrorState } from '../../../components/ErrorState';
import { formatPlain } from '../../../components/figures';
import { LoadingRows } from '../../../components/LoadingRows';
import { useNotices } from '../../../components/Notices';
import { useTrainSaving } from '../useTrainSaving';

interface ChoosePartDialogProps {
  train: Pick<Train, 'code' | 'version' | 'spec'>;
  stage: number;
  role: 'pinion' | 'wheel';
  onClose: () => void;
}

const MADE = '';

/** Which stock part a gear is: every cleared gear with the same data, or made to order. */
export function ChoosePartDialog({ train, stage, role, onClose }: ChoosePartDialogProps) {
  const place = gearPlace(train.spec, stage, role);
  const { data: gears, error, mutate } = useFittingGears(place);
  const [number, setNumber] = useState(train.spec.stages[stage]?.[role].partNumber ?? MADE);
  const saving = useTrainSaving();
  const { tell } = useNotices();

  async function choose(event: FormEvent): Promise<void> {
    event.preventDefault();
    const stages = train.spec.stages.map((_, each) =>
      each === stage ? { [role]: { partNumber: number === MADE ? null : number } } : {},
    );
    const saved = await saving.run(() => saveTrain(train.code, { version: train.version, stages }));
    if (!saved) return;
    tell(`Stage ${stage + 1} ${role}: ${number === MADE ? 'to be made' : number}.`);
    onClose();
  }

  return (
    <Dialog open onClose={onClose} fullWidth maxWidth="sm" aria-labelledby="choose-part">
      <form onSubmit={(event) => void choose(event)}>
        <DialogTitle id="choose-part">{`Part for the ${role} of stage ${stage + 1}`}</DialogTitle>
        <DialogContent>
          {saving.problem !== null && (
            <Alert severity="error" sx={{ mb: 1.5 }}>
              {[saving.problem, ...saving.issues.map(({ message }) => message)].join(' ')}
            </Alert>
          )}
          {place && (
            <Typography color="textSecondary" sx={{ mb: 1 }}>
              {`Cleared gears with ${place.teeth} teeth, m ${formatPlain(place.module)}, shift ${formatPlain(place.profileShift)}${helixWords(place)}, at least ${formatPlain(place.faceWidth)} mm wide.`}
            </Typography>
          )}
          {error !== undefined && (
            <ErrorState problem={asProblem(error)} what="the gears" onRetry={() => void mutate()} />
          )}
          {!gears && error === undefined && <LoadingRows rows={4} label="Loading the gears that fit" />}
          {gears && (
            <RadioGroup aria-label="Part" value={number} onChange={(_, value) => setNumber(value)}>
              <FormControlLabel value={MADE} control={<Radio />} label="Made to order" />
              {gears.map((gear) => (
                <FormControlLabel
                  key={gear.number}
                  value={gear.number}
                  control={<Radio />}
                  label={<GearLine gear={gear} />}
                />
              ))}
            </RadioGroup>
          )}
          {gears?.length === 0 && (
            <Typography color="textSecondary" sx={{ mt: 1 }}>
              No cleared gear in the library agrees in every figure. A librarian can add one under Parts.
            </Typography>
          )}
        </DialogContent>
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" variant="contained" loading={saving.busy} disabled={!gears}>
            Choose
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}

const helixWords = ({ helixAngleDeg, hand }: GearPlace): string =>
  helixAngleDeg > 0 ? `, helix ${formatPlain(helixAngleDeg)}° ${hand ?? ''}`.trimEnd() : '';

function GearLine({ gear }: { gear: Pick<Part, 'number' | 'description' | 'attributes' | 'material'> }) {
  const { faceWidth, bore } = gear.attributes as { faceWidth?: number; bore?: number };
  return (
    <Box component="span">
      <span className="part-number">{gear.number}</span>{' '}
      <Box component="span" sx={{ color: 'text.secondary' }}>
        {[
          gear.description,
          faceWidth !== undefined && `${formatPlain(faceWidth)} mm wide`,
          bore !== undefined && `bore ${formatPlain(bore)} mm`,
          gear.material,
        ]
          .filter(Boolean)
          .join(' · ')}
      </Box>
    </Box>
  );
}
