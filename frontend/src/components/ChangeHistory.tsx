import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import type { Problem } from '../api/problem';
import type { ChangePage } from '../api/types';
import { DifferenceList, type Difference } from './DifferenceList';
import { ErrorState } from './ErrorState';
import { formatWhen } from './figures';
import { LoadingRows } from './LoadingRows';
import { Sheet } from './Sheet';

interface ChangeHistoryProps {
  changes: ChangePage | undefined;
  problem: Problem | null;
  onRetry: () => void;
  /** Field by field what differs between two states; either may hold only some fields. */
  differences: (before: object | null, after: object | null) => Difference[];
  page: number;
  onPage: (page: number) => void;
}

/** Who changed what of one thing, newest first, 25 at a time. */
export function ChangeHistory({ changes, problem, onRetry, differences, page, onPage }: ChangeHistoryProps) {
  const pages = changes === undefined ? 1 : Math.ceil(changes.total / changes.size);
  return (
    <Sheet title="Changes">
      {changes === undefined && problem !== null && (
        <ErrorState problem={problem} onRetry={onRetry} what="the changes" />
      )}
      {changes === undefined && problem === null && <LoadingRows rows={3} label="Loading the changes" />}
      <Box component="ol" sx={{ listStyle: 'none', m: 0, p: 0 }}>
        {changes?.items.map((change) => (
          <Box component="li" key={change.id} sx={rowSx}>
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
          <Button disabled={page === 1} onClick={() => onPage(page - 1)}>
            Newer
          </Button>
          <Button disabled={page >= pages} onClick={() => onPage(page + 1)}>
            Older
          </Button>
          <Box component="span" sx={{ color: 'text.secondary' }}>{`${page} of ${pages}`}</Box>
        </Box>
      )}
    </Sheet>
  );
}

const rowSx = {
  display: 'grid',
  gridTemplateColumns: { xs: '1fr', sm: '160px 130px 1fr' },
  columnGap: 2,
  py: 0.75,
  borderBottom: '1px solid',
  borderColor: 'line.rule',
  '&:last-of-type': { borderBottom: 0 },
} as const;
