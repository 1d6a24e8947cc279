import { addDays } from '@stageyard/libs/bill-of-materials';
import { useOffers } from '../../api/hooks/useOffers';
import type { Offer } from '../../api/types';
import { EmptyState } from '../../components/EmptyState';
import { formatCount } from '../../components/figures';
import { validityWords } from '../../components/offers/offerWords';
import { PriceAge } from '../../components/offers/PriceAge';
import { Sheet } from '../../components/Sheet';
import { todayIso } from '../../components/today';
import { CodeLink } from './CodeLink';
import { MoreLink } from './MoreLink';
import { RowTable, type RowColumn } from './RowTable';

/** Days ahead within which the end of an offer is worth a word. */
const SOON = 30;
/** Most of each of the two kinds. */
const SHOWN = 5;

const pathOf = (offer: Offer) => `/offers/${encodeURIComponent(offer.id)}`;

const COLUMNS: RowColumn<Offer>[] = [
  { name: 'Part', cell: (offer) => <CodeLink to={pathOf(offer)} code={offer.part.number} /> },
  { name: 'Description', wideOnly: true, cell: ({ part }) => part.description },
  { name: 'Supplier', cell: ({ supplier }) => supplier.name },
  { name: 'Holds', wideOnly: true, cell: validityWords },
  { name: 'Price age', figure: true, wideOnly: true, cell: (offer) => <PriceAge offer={offer} short /> },
  {
    name: 'Why',
    phoneOnly: true,
    cell: (offer) => (offer.tooOld ? <PriceAge offer={offer} /> : validityWords(offer)),
  },
];

/** Offers to ask for again: those that end soon, then the oldest prices beyond the house rule. */
export function PricesToRenew() {
  const ending = useOffers({ endsBy: addDays(todayIso(), SOON), sort: 'validUntil', size: SHOWN });
  const old = useOffers({ tooOld: true, state: 'valid', sort: 'pricedOn', size: SHOWN });
  if (ending.page === undefined || old.page === undefined) return null;
  // One that is both stands once.
  const known = new Set(ending.page.items.map(({ id }) => id));
  const rows = [...ending.page.items, ...old.page.items.filter(({ id }) => !known.has(id))];
  return (
    <Sheet
      title="Prices too old or ending soon"
      aside={
        rows.length > 0 && (
          <>
            <MoreLink
              to={`/offers?ends=${SOON}&sort=validUntil`}
              text={`${formatCount(ending.page.total)} ending`}
            />
            <MoreLink
              to="/offers?tooOld=true&state=valid&sort=pricedOn"
              text={`${formatCount(old.page.total)} too old`}
            />
          </>
        )
      }
      flush
    >
      {rows.length > 0 ? (
        <RowTable
          label="Prices too old or ending soon"
          columns={COLUMNS}
          rows={rows}
          keyOf={(offer) => offer.id}
          pathOf={pathOf}
        />
      ) : (
        <EmptyState title="Every price is fresh">
          No offer ends within {SOON} days and no price is older than the house rule allows. Those that do
          stand here.
        </EmptyState>
      )}
    </Sheet>
  );
}
