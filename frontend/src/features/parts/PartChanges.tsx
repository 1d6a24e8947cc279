import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useState } from 'react';
import { usePartChanges } from '../../api/hooks/usePartChanges';
import { ErrorState } from '../../components/ErrorState';
import { formatWhen } from '../../components/figures';
import { LoadingRows } from '../../components/LoadingRows';
import { Sheet } from '../../components/Sheet';
import { differences } from './differences';
import { DifferenceList } from './DifferenceList';

/** Who changed what, newest first. `version` makes it ask again after an edit. */
export function PartChanges({ number, version }: { number: string; version: number }) {
  const [page, setPage] = useState(1);
  const { changes, problem, mutate } = usePartChanges(number, page, version);
  const pages = changes === undefined ? 1 : Math.ceil(changes.total / changes.size);
  return (
    <Sheet title="Changes">
      {changes === undefined && problem !== null && (
        <ErrorState problem={problem} onRetry={() => void mutate()} what="the changes" />
      )}
      {changes === undefined && problem === null && <LoadingRows rows={3} label="Loading the changes" />}
      <Box component="ol" sx={{ listStyle: 'none', m: 0, p: 0 }}>
        {changes?.items.map((change) => (
          <Box
            component="li"
            key={change.id}
            sx={{
              display: 'grid',
              gridTemplateColumns: { xs: '1fr', sm: '160px 130px 1fr' },
              columnGap: 2,
              py: 0.75,
              borderBottom: '1px solid',
              borderColor: 'line.rule',
              '&:last-of-type': { borderBottom: 0 },
            }}
          >
            <Box component="time" dateTime={change.at} sx={{ color: 'text.secondary' }}>
              {formatWhen(change.at)}
            </Box>
            <span>{change.by}</span>
            <Box sx={{ minWidth: 0 }}>
              {change.summary}
              {change.before !== null && change.after !== null && (
                <DifferenceList differences={differences(change.before, change.after)} />
              )}
            </Box>
          </Box>
        ))}
      </Box>
      {pages > 1 && (
        <Box sx={{ display: 'flex', gap: 1, alignItems: 'center', mt: 1 }}>
          <Button disabled={page === 1} onClick={() => setPage(page - 1)}>
            Newer
          </Button>
          <Button disabled={page >= pages} onClick={() => setPage(page + 1)}>
            Older
          </Button>
          <Box component="span" sx={{ color: 'text.secondary' }}>{`${page} of ${pages}`}</Box>
        </Box>
      )}
    </Sheet>
  );
}
