import Box from '@mui/material/Box';
import { formatMoney, type Money } from '@stageyard/libs/units';
import { quantityWords } from './offerWords';

/** What a quantity comes to at one offer, as the library and the server say it. */
export interface ShownPrice {
  needed: number;
  orderQuantity: number;
  surplus: number;
  lineTotal: Money;
  cheaperAt: { orderQuantity: number; lineTotal: Money; saves: Money } | null;
}

interface PricedWordsProps {
  price: ShownPrice;
  /** `pcs` or `l` */
  unit: string;
}

/** "At 30 pcs you order 50 pcs and pay 555.00 EUR; 20 pcs are left over.", and where ordering more costs less. */
export function PricedWords({ price, unit }: PricedWordsProps) {
  const { needed, orderQuantity, surplus, lineTotal } = price;
  return (
    <>
      <div>
        At {quantityWords(needed, unit)} you order <b>{quantityWords(orderQuantity, unit)}</b> and pay{' '}
        <b>{formatMoney(lineTotal)}</b>
        {surplus > 0 ? `; ${quantityWords(surplus, unit)} are left over.` : '.'}
      </div>
      <CheaperHint price={price} unit={unit} />
    </>
  );
}

/** "Ordering 100 pcs costs less: 985.00 EUR, 15.00 EUR saved." */
export function CheaperHint({ price: { cheaperAt }, unit }: PricedWordsProps) {
  if (cheaperAt === null) return null;
  return (
    <Box sx={{ color: 'info.main' }}>
      Ordering {quantityWords(cheaperAt.orderQuantity, unit)} costs less: {formatMoney(cheaperAt.lineTotal)},{' '}
      {formatMoney(cheaperAt.saves)} saved.
    </Box>
  );
}
