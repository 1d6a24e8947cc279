import Button from '@mui/material/Button';
import Box from '@mui/material/Box';
import TextField from '@mui/material/TextField';
import ToggleButton from '@mui/material/ToggleButton';
import ToggleButtonGroup from '@mui/material/ToggleButtonGroup';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { usePartOffers } from '../../api/hooks/usePartOffers';
import type { Part } from '../../api/types';
import { EmptyState } from '../../components/EmptyState';
import { ErrorState } from '../../components/ErrorState';
import { LoadingRows } from '../../components/LoadingRows';
import { numberOrNull, numberProblem } from '../../components/NumberField';
import { Sheet } from '../../components/Sheet';
import { useSettled } from '../../components/useSettled';
import { ChosenOffer } from './ChosenOffer';
import { PartOfferTable } from './PartOfferTable';

type Preference = 'price' | 'arrival';

/** What suppliers ask for the part at a quantity, and which offer the rule takes. Only for those who see prices. */
export function PartOffers({ part }: { part: Part }) {
  const { can } = useMe();
  return can('prices.read') ? <Offers part={part} mayEdit={can('prices.edit')} /> : null;
}

function Offers({ part, mayEdit }: { part: Part; mayEdit: boolean }) {
  const [typed, setTyped] = useState('1');
  const [prefer, setPrefer] = useState<Preference>('price');
  const whole = part.kind !== 'lubricant';
  const unit = whole ? 'pcs' : 'l';
  const wrong = numberProblem(typed, { required: true, min: 0, above: true, max: 1_000_000, whole }, unit);
  const settled = useSettled(typed, 250);
  const settledWrong = numberProblem(settled, { required: true, min: 0, above: true, max: 1_000_000, whole });
  const [asked, setAsked] = useState(1);
  const quantity = settledWrong === null ? numberOrNull(settled) : null;
  // A figure that cannot be read leaves the last answer on the screen.
  if (quantity !== null && quantity !== asked) setAsked(quantity);
  const { offers, problem, mutate } = usePartOffers(part.number, asked, prefer);
  const add =
    mayEdit && part.standing !== 'withdrawn' ? (
      <Button component={Link} to={`/add-offer?part=${encodeURIComponent(part.number)}`}>
        Add an offer
      </Button>
    ) : null;
  const none = offers !== undefined && offers.offers.length === 0;
  return (
    <Sheet title="Offers" aside={none ? null : add} flush>
      {offers === undefined && problem === null && <LoadingRows rows={3} label="Loading the offers" />}
      {offers === undefined && problem !== null && (
        <ErrorState problem={problem} onRetry={() => void mutate()} what="the offers" />
      )}
      {none && (
        <EmptyState title="No supplier offers this part yet" action={add}>
          {mayEdit
            ? 'Add what a supplier asks for it, and it gets a price here and on bills of materials.'
            : 'A purchaser or a librarian adds what suppliers ask for it.'}
        </EmptyState>
      )}
      {offers !== undefined && !none && (
        <>
          <Box sx={headSx}>
            <TextField
              label={`At quantity, ${unit}`}
              value={typed}
              onChange={(event) => setTyped(event.target.value)}
              error={wrong !== null}
              helperText={wrong}
              autoComplete="off"
              sx={{ width: 132 }}
              slotProps={{
                htmlInput: { inputMode: whole ? 'numeric' : 'decimal', className: 'number', maxLength: 20 },
              }}
            />
            <ToggleButtonGroup
              exclusive
              size="small"
              value={prefer}
              aria-label="What decides"
              onChange={(_, value: Preference | null) => value !== null && setPrefer(value)}
              sx={{ mt: { xs: 0, sm: 2.75 } }}
            >
              <ToggleButton value="price">Lowest price</ToggleButton>
              <ToggleButton value="arrival">Soonest here</ToggleButton>
            </ToggleButtonGroup>
            <Box role="status" sx={{ flex: '1 1 260px', pt: { xs: 0, sm: 2.5 }, minWidth: 0 }}>
              <ChosenOffer offers={offers} prefer={prefer} />
            </Box>
          </Box>
          <PartOfferTable offers={offers} />
        </>
      )}
    </Sheet>
  );
}

const headSx = {
  display: 'flex',
  flexWrap: 'wrap',
  gap: 1.5,
  alignItems: 'flex-start',
  px: 1.25,
  pb: 1.25,
} as const;
