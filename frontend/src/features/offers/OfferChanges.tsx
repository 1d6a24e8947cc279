import { useState } from 'react';
import { useOfferChanges } from '../../api/hooks/useOfferChanges';
import type { Offer } from '../../api/types';
import { ChangeHistory } from '../../components/ChangeHistory';
import { offerDifferences } from './offerDifferences';

/** Who changed what of an offer, newest first. */
export function OfferChanges({ offer }: { offer: Offer }) {
  const [page, setPage] = useState(1);
  const { changes, problem, mutate } = useOfferChanges(offer.id, page, offer.version);
  return (
    <ChangeHistory
      changes={changes}
      problem={problem}
      onRetry={() => void mutate()}
      differences={(before, after) => offerDifferences(before, after, offer)}
      page={page}
      onPage={setPage}
    />
  );
}
