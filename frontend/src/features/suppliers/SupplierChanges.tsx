import { useState } from 'react';
import { useSupplierChanges } from '../../api/hooks/useSupplierChanges';
import type { Supplier } from '../../api/types';
import { ChangeHistory } from '../../components/ChangeHistory';
import { supplierDifferences } from './supplierDifferences';

/** Who changed what of a supplier, newest first. */
export function SupplierChanges({ supplier: { code, version, currency } }: { supplier: Supplier }) {
  const [page, setPage] = useState(1);
  const { changes, problem, mutate } = useSupplierChanges(code, page, version);
  return (
    <ChangeHistory
      changes={changes}
      problem={problem}
      onRetry={() => void mutate()}
      differences={(before, after) => supplierDifferences(before, after, currency)}
      page={page}
      onPage={setPage}
    />
  );
}
