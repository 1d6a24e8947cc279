import Typography from '@mui/material/Typography';
import { formatMoney } from '@stageyard/libs/units';
import type { PartOffers } from '../../api/types';
import { leadTimeWords, quantityWords } from '../../components/offers/offerWords';
import { CheaperHint } from '../../components/offers/PricedWords';

interface ChosenOfferProps {
  offers: PartOffers;
  prefer: 'price' | 'arrival';
}

/** Which offer the rule takes at the quantity, and why. */
export function ChosenOffer({
  offers: { quantity, unit, offers, reason, onShelf },
  prefer,
}: ChosenOfferProps) {
  const chosen = offers.find((offer) => offer.chosen);
  const shelf = onShelf !== null && onShelf >= quantity && (
    <Typography color="textSecondary">
      The shelf holds {quantityWords(onShelf, unit)}: nothing needs to be ordered for it.
    </Typography>
  );
  if (chosen === undefined || chosen.price === null) {
    return (
      <>
        <Typography>{reason === null ? WHY_NOT['none-valid'] : WHY_NOT[reason]}</Typography>
        {shelf}
      </>
    );
  }
  const { price, supplier, arrivalDays } = chosen;
  const competing = offers.filter(({ state, price: each }) => state === 'valid' && each !== null);
  return (
    <>
      <Typography>
        <b>{supplier.name}</b>: {quantityWords(price.orderQuantity, unit)} for{' '}
        <b>{formatMoney(price.lineTotal)}</b>
        {arrivalDays === null ? '' : `, here in ${leadTimeWords(arrivalDays)}`}.{' '}
        {whyWords(competing.length, new Set(competing.map(({ currency }) => currency)).size, prefer)}
      </Typography>
      <CheaperHint price={price} unit={unit} />
      {shelf}
    </>
  );
}

const WHY_NOT = {
  'no-offers': 'No supplier offers this part yet.',
  'none-valid': 'No offer can be ordered from today: every one is closed, ended or not yet begun.',
} as const;

function whyWords(competing: number, currencies: number, prefer: ChosenOfferProps['prefer']): string {
  if (competing === 1) return 'It is the only offer that holds today.';
  if (prefer === 'arrival') return `It is here soonest of ${competing} that hold today.`;
  const currency = currencies > 1 ? ' The house currency comes first: currencies are not compared.' : '';
  return `It costs least of ${competing} that hold today.${currency}`;
}
