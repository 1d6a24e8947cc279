import Box from '@mui/material/Box';
import type { Supplier } from '../../api/types';
import { currencyWords } from '../../components/CurrencyField';
import { formatDay, NOTHING } from '../../components/figures';
import { FigureTable } from '../../components/FigureTable';
import { moneyWords } from '../../components/moneyText';
import { leadTimeWords } from '../../components/offers/offerWords';
import { Sheet } from '../../components/Sheet';
import { freightWords, languageName, offersWords } from './supplierWords';

/** On what terms they sell. */
export function SupplierTerms({ supplier }: { supplier: Supplier }) {
  const { currency, leastOrderValue, offers } = supplier;
  return (
    <Sheet title="Terms" flush>
      <FigureTable
        label="Terms"
        rows={[
          { label: 'Currency', values: [currencyWords(currency)] },
          { label: 'Usual lead time', values: [leadTimeWords(supplier.leadTimeDays)] },
          {
            label: 'Least order value',
            values: [leastOrderValue === null ? 'none' : moneyWords(leastOrderValue, currency)],
          },
          { label: 'Freight', values: [freightWords(supplier.freight, currency)] },
          { label: 'Language of enquiries', values: [languageName(supplier.language)] },
          { label: 'Offers', values: [offersWords(offers)] },
          {
            label: 'Oldest price',
            values: [offers.oldestPricedOn === null ? NOTHING : formatDay(offers.oldestPricedOn)],
          },
          {
            label: 'Address',
            values: [
              supplier.address === '' ? (
                NOTHING
              ) : (
                <Box key="address" component="span" sx={{ whiteSpace: 'pre-line', overflowWrap: 'anywhere' }}>
                  {supplier.address}
                </Box>
              ),
            ],
          },
        ]}
      />
    </Sheet>
  );
}
