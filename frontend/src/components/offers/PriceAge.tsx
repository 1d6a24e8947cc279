import Box from '@mui/material/Box';
import type { Offer } from '../../api/types';
import { formatDay } from '../figures';
import { ageWords } from './offerWords';

interface PriceAgeProps {
  offer: Pick<Offer, 'ageDays' | 'tooOld' | 'pricedOn'>;
  /** In a column of ages: "40 days" rather than "40 days old", "today" rather than "of today". */
  short?: boolean;
}

/** How long ago the supplier stated the price; one older than the house rule allows says so. */
export function PriceAge({ offer: { ageDays, tooOld, pricedOn }, short = false }: PriceAgeProps) {
  return (
    <Box
      component="span"
      title={`Priced on ${formatDay(pricedOn)}`}
      sx={{ whiteSpace: 'nowrap', ...(tooOld ? { color: 'warning.main', fontWeight: 600 } : {}) }}
    >
      {short ? ageWords(ageDays).replace(/^of | old$/, '') : ageWords(ageDays)}
      {tooOld && ', too old'}
    </Box>
  );
}
