import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { Fragment } from 'react';
import type { TrainPrices } from '../../../api/types';
import { formatCount, formatDay } from '../../../components/figures';
import { moneyWords } from '../../../components/moneyText';
import { leadTimeWords } from '../../../components/offers/offerWords';

const lines = (count: number): string => (count === 1 ? '1 line' : `${formatCount(count)} lines`);

interface PriceSummaryProps {
  prices: TrainPrices;
  /** Only the sums and what they leave out. */
  short?: boolean;
}

/** The totals by currency, and what keeps them from being the whole. */
export function PriceSummary({ prices, short = false }: PriceSummaryProps) {
  const { totals, unpriced, buildQuantity } = prices;
  return (
    <Typography component="div" sx={{ minWidth: 0 }}>
      <Box component="span" sx={{ color: 'text.secondary' }}>
        {`For ${formatCount(buildQuantity)}: `}
      </Box>
      {totals.length === 0 && 'nothing is priced'}
      {totals.map(({ currency, minor, lines: count }, at) => (
        <Fragment key={currency}>
          {at > 0 && ' + '}
          <Box component="strong" sx={{ fontWeight: 600, fontSize: '1rem', whiteSpace: 'nowrap' }}>
            {moneyWords(minor, currency)}
          </Box>
          {totals.length > 1 && (
            <Box component="span" sx={{ color: 'text.secondary' }}>{` in ${lines(count)}`}</Box>
          )}
        </Fragment>
      ))}
      {unpriced.length > 0 && (
        <>
          {' '}
          <Box component="span" sx={{ color: 'warning.main', fontWeight: 600 }}>
            {`without ${lines(unpriced.length)} of unknown price`}
          </Box>
        </>
      )}
      {!short && <MoreFacts prices={prices} />}
    </Typography>
  );
}

/** Shelf, lead time and age over all lines. */
function MoreFacts({ prices }: Pick<PriceSummaryProps, 'prices'>) {
  const { tooOld, oldestPricedOn, longestLeadTimeDays, shelf } = prices;
  return (
    <>
      <Box component="span" sx={{ color: 'text.secondary' }}>
        {' · '}
        {[
          `${shelf.covered} of ${lines(shelf.lines)} on the shelf`,
          longestLeadTimeDays !== null && `longest lead time ${leadTimeWords(longestLeadTimeDays)}`,
          oldestPricedOn !== null && `oldest price of ${formatDay(oldestPricedOn)}`,
        ]
          .filter(Boolean)
          .join(' · ')}
      </Box>
      {tooOld > 0 && (
        <Box component="span" sx={{ color: 'warning.main', fontWeight: 600 }}>
          {` · ${tooOld === 1 ? '1 price is' : `${tooOld} prices are`} too old`}
        </Box>
      )}
    </>
  );
}
