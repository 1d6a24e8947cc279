import Link from '@mui/material/Link';
import { Link as RouterLink } from 'react-router-dom';
import type { Offer } from '../../api/types';
import { formatDay, NOTHING } from '../../components/figures';
import { FigureTable } from '../../components/FigureTable';
import { leadTimeWords, quantityWords, validityWords } from '../../components/offers/offerWords';
import { OfferStateWord } from '../../components/offers/OfferStateWord';
import { PriceAge } from '../../components/offers/PriceAge';
import { Sheet } from '../../components/Sheet';

/** What is offered by whom, in what packs, and how long it holds. */
export function OfferTerms({ offer }: { offer: Offer }) {
  const { part, supplier, leadTimeDays, effectiveLeadTimeDays } = offer;
  const usual = leadTimeDays === null && effectiveLeadTimeDays !== null;
  return (
    <Sheet title="Terms" flush>
      <FigureTable
        label="Terms"
        rows={[
          {
            label: 'Part',
            values: [
              <span key="part">
                <Link
                  component={RouterLink}
                  to={`/parts/${encodeURIComponent(part.number)}`}
                  className="part-number"
                >
                  {part.number}
                </Link>
                {part.standing === 'withdrawn' && ' (withdrawn)'}
              </span>,
            ],
          },
          {
            label: 'Supplier',
            values: [
              <span key="supplier">
                <Link component={RouterLink} to={`/suppliers/${encodeURIComponent(supplier.code)}`}>
                  {supplier.name}
                </Link>
                {supplier.standing === 'closed' && ' (closed)'}
              </span>,
            ],
          },
          { label: 'Their part number', values: [offer.supplierPartNumber || NOTHING] },
          { label: 'State', values: [<OfferStateWord key="state" state={offer.state} />] },
          {
            label: 'Holds',
            note: `from ${formatDay(offer.validFrom)}`,
            values: [validityWords(offer)],
          },
          { label: 'Priced on', note: <PriceAge offer={offer} />, values: [formatDay(offer.pricedOn)] },
          {
            label: 'Lead time',
            ...(usual ? { note: 'the supplier’s usual one' } : {}),
            values: [leadTimeWords(effectiveLeadTimeDays)],
          },
          { label: 'Sold in packs of', values: [quantityWords(offer.pack, part.unit)] },
          { label: 'Least order', values: [quantityWords(offer.leastQuantity, part.unit)] },
          { label: 'Source', values: [offer.source || NOTHING] },
        ]}
      />
    </Sheet>
  );
}
