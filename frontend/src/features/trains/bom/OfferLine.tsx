import Box from '@mui/material/Box';
import { formatMoney } from '@stageyard/libs/units';
import type { PartOffers } from '../../../api/types';
import { amountWords } from '../../../components/moneyText';
import {
  leadTimeWords,
  priceUnitWords,
  quantityWords,
  validityWords,
} from '../../../components/offers/offerWords';
import { OfferStateWord } from '../../../components/offers/OfferStateWord';
import { PriceAge } from '../../../components/offers/PriceAge';
import { CheaperHint } from '../../../components/offers/PricedWords';

type PricedOffer = PartOffers['offers'][number];

/** One offer as a choice: supplier and total, under it what makes the total and until when it holds. */
export function OfferLine({ offer, unit }: { offer: PricedOffer; unit: string }) {
  const { price, state, supplier } = offer;
  return (
    <Box sx={{ py: 0.5, minWidth: 0 }}>
      <Box sx={{ display: 'flex', justifyContent: 'space-between', gap: 2 }}>
        <Box component="span" sx={{ fontWeight: 600 }}>
          {supplier.name}
          {offer.chosen && (
            <Box component="span" sx={{ fontWeight: 400, color: 'text.secondary' }}>
              {' · the rule takes this one'}
            </Box>
          )}
        </Box>
        <Box component="span" sx={{ fontWeight: 600, whiteSpace: 'nowrap' }}>
          {price ? formatMoney(price.lineTotal) : 'no total'}
        </Box>
      </Box>
      <Box sx={{ color: 'text.secondary', fontSize: '0.8125rem' }}>
        {price &&
          `${quantityWords(price.orderQuantity, unit)} at ${amountWords(price.unitPrice, offer.currency)} ${priceUnitWords(offer)}`}
        {price && price.surplus > 0 && `, ${quantityWords(price.surplus, unit)} left over`}
        {` · lead time ${leadTimeWords(offer.effectiveLeadTimeDays)} · `}
        <PriceAge offer={offer} />
        {` · ${validityWords(offer)}`}
      </Box>
      {state !== 'valid' && (
        <Box sx={{ fontSize: '0.8125rem' }}>
          <OfferStateWord state={state} />
        </Box>
      )}
      {price && (
        <Box sx={{ fontSize: '0.8125rem' }}>
          <CheaperHint price={price} unit={unit} />
        </Box>
      )}
    </Box>
  );
}
