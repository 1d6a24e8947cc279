import { useState } from 'react';
import { usePartChanges } from '../../api/hooks/usePartChanges';
import { ChangeHistory } from '../../components/ChangeHistory';
import { differences } from './differences';

/** Who changed what, newest first. `version` makes it ask again after an edit. */
export function PartChanges({ number, version }: { number: string; version: number }) {
  const [page, setPage] = useState(1);
  const { changes, problem, mutate } = usePartChanges(number, page, version);
  return (
    <ChangeHistory
      changes={changes}
      problem={problem}
      onRetry={() => void mutate()}
      differences={differences}
      page={page}
      onPage={setPage}
    />
  );
}
