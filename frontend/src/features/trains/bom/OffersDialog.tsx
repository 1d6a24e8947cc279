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
import { useId, useState, type FormEvent } from 'react';
import { usePartOffers } from '../../../api/hooks/usePartOffers';
import { saveBuying, type Prefer } from '../../../api/hooks/useTrainPrices';
import type { Train } from '../../../api/types';
import { EmptyState } from '../../../components/EmptyState';
import { ErrorState } from '../../../components/ErrorState';
import { LoadingRows } from '../../../components/LoadingRows';
import { useNotices } from '../../../components/Notices';
import { quantityWords } from '../../../components/offers/offerWords';
import { PartLink } from '../PartLink';
import { useTrainSaving } from '../useTrainSaving';
import { OfferLine } from './OfferLine';

interface OffersDialogProps {
  train: Train;
  part: { number: string; description: string; needed: number; unit: string };
  /** Offer that a person chose; null: the rule chooses. */
  chosenId: string | null;
  prefer: Prefer;
  canChoose: boolean;
  onClose: () => void;
}

const RULE = '';

/** Which offer a part is bought from: the one the rule takes, or another, with what each comes to. */
export function OffersDialog(props: OffersDialogProps) {
  const { train, part, chosenId, prefer, canChoose, onClose } = props;
  const id = useId();
  const { offers: answer, problem, mutate } = usePartOffers(part.number, part.needed, prefer);
  const [offerId, setOfferId] = useState(chosenId ?? RULE);
  const saving = useTrainSaving();
  const { tell } = useNotices();
  const offers = answer?.offers ?? [];

  async function choose(event: FormEvent): Promise<void> {
    event.preventDefault();
    const choices = [{ partNumber: part.number, offerId: offerId === RULE ? null : offerId }];
    const put = (version: number, list: typeof choices) => saveBuying(train.code, { version, choices: list });
    const saved = await saving.run(() => put(train.version, choices), train);
    if (!saved) return;
    const supplier = offers.find((offer) => offer.id === offerId)?.supplier.name;
    const words = supplier ? `${part.number} from ${supplier}.` : `${part.number}: the rule chooses again.`;
    const before = [{ partNumber: part.number, offerId: chosenId }];
    tell(words, { name: 'Undo', run: () => void put(saved.version, before).catch(() => tell(NO_UNDO)) });
    onClose();
  }

  return (
    <Dialog open onClose={onClose} fullWidth maxWidth="sm" aria-labelledby={id}>
      <form onSubmit={(event) => void choose(event)}>
        <DialogTitle id={id}>{`Offers for ${part.number}`}</DialogTitle>
        <DialogContent>
          {saving.problem !== null && (
            <Alert severity="error" sx={{ mb: 1.5 }}>
              {[saving.problem, ...saving.issues.map(({ message }) => message)].join(' ')}
            </Alert>
          )}
          <Typography color="textSecondary" sx={{ mb: 1 }}>
            {`${part.description}; ${quantityWords(part.needed, part.unit)} needed for ${train.buildQuantity} to build`}
            {answer?.onShelf != null && `, ${quantityWords(answer.onShelf, part.unit)} on the shelf`}.
          </Typography>
          {!answer && problem === null && <LoadingRows rows={4} height={48} label="Loading the offers" />}
          {!answer && problem !== null && (
            <ErrorState problem={problem} what="the offers" onRetry={() => void mutate()} />
          )}
          {answer && offers.length === 0 && (
            <EmptyState title="Nobody offers this part">
              Add an offer on the page of <PartLink number={part.number} />.
            </EmptyState>
          )}
          {answer && offers.length > 0 && (
            <RadioGroup aria-label="Offer" value={offerId} onChange={(_, value) => setOfferId(value)}>
              <FormControlLabel
                value={RULE}
                disabled={!canChoose}
                control={<Radio />}
                label={
                  prefer === 'price'
                    ? 'The rule chooses: the lowest total in the house currency'
                    : 'The rule chooses: the shortest lead time'
                }
              />
              {offers.map((offer) => (
                <FormControlLabel
                  key={offer.id}
                  value={offer.id}
                  disabled={!canChoose || offer.state !== 'valid' || offer.price === null}
                  control={<Radio />}
                  label={<OfferLine offer={offer} unit={part.unit} />}
                  sx={{ alignItems: 'flex-start', mr: 0, '& .MuiFormControlLabel-label': { flex: 1 } }}
                />
              ))}
            </RadioGroup>
          )}
          <Box sx={{ mt: 1 }}>
            {!canChoose && (
              <Typography variant="body2" color="textSecondary">
                Offers are chosen by designers, purchasers and administrators.
              </Typography>
            )}
          </Box>
        </DialogContent>
        <DialogActions>
          <Button onClick={onClose}>{canChoose ? 'Cancel' : 'Close'}</Button>
          {canChoose && (
            <Button
              type="submit"
              variant="contained"
              loading={saving.busy}
              disabled={offers.length === 0 || offerId === (chosenId ?? RULE)}
            >
              {offerId === RULE ? 'Let the rule choose' : 'Choose this offer'}
            </Button>
          )}
        </DialogActions>
      </form>
    </Dialog>
  );
}

const NO_UNDO = 'It could not be undone: the train was changed again meanwhile. Choose the offer by hand.';
