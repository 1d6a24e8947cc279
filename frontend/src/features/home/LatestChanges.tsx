import Box from '@mui/material/Box';
import { useLatestChanges } from '../../api/hooks/useLatestChanges';
import type { Change } from '../../api/types';
import { ErrorState } from '../../components/ErrorState';
import { formatWhen } from '../../components/figures';
import { LoadingRows } from '../../components/LoadingRows';
import { Sheet } from '../../components/Sheet';
import { MoreLink } from './MoreLink';

/** Rows shown, out of the rows asked for: comings and goings are left out. */
const MOST = 12;
const ASKED = 60;

/** Where the changed thing stands; null for what has no page. */
function placeOf({ entity, entityId }: Change): string | null {
  if (entity === 'part') return `/parts/${encodeURIComponent(entityId)}`;
  if (entity === 'train') return `/trains/${encodeURIComponent(entityId)}`;
  if (entity === 'brief') return `/briefs/${encodeURIComponent(entityId)}`;
  return entity === 'user' ? '/people' : null;
}

/** For the administrator: who did what last. */
export function LatestChanges() {
  const { changes, problem, mutate } = useLatestChanges(true, ASKED);
  const shown = (changes?.items ?? []).filter(({ entity }) => entity !== 'session').slice(0, MOST);
  return (
    <Sheet title="Latest changes" aside={<MoreLink to="/people" text="People" />}>
      {changes === undefined && problem !== null && (
        <ErrorState problem={problem} onRetry={() => void mutate()} what="the changes" />
      )}
      {changes === undefined && problem === null && <LoadingRows rows={5} label="Loading the changes" />}
      <Box component="ol" sx={{ listStyle: 'none', m: 0, p: 0 }}>
        {shown.map((change) => {
          const place = placeOf(change);
          return (
            <Box component="li" key={change.id} sx={rowSx}>
              <Box component="time" dateTime={change.at} sx={{ color: 'text.secondary' }}>
                {formatWhen(change.at)}
              </Box>
              <span>{change.by}</span>
              <Box sx={{ minWidth: 0, overflowWrap: 'anywhere' }}>
                {place === null ? change.summary : <MoreLink to={place} text={change.summary} />}
              </Box>
            </Box>
          );
        })}
      </Box>
    </Sheet>
  );
}

const rowSx = {
  display: 'grid',
  gridTemplateColumns: { xs: '1fr auto', sm: '160px 130px 1fr' },
  columnGap: 2,
  py: 0.625,
  borderBottom: '1px solid',
  borderColor: 'line.rule',
  '& > :last-child': { gridColumn: { xs: '1 / -1', sm: 'auto' } },
  '& a': { fontWeight: 400, color: 'text.primary' },
  '&:last-of-type': { borderBottom: 0 },
} as const;
