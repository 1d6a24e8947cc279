import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { Link } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { useOverview } from '../../api/hooks/useOverview';
import { EmptyState } from '../../components/EmptyState';
import { ErrorState } from '../../components/ErrorState';
import { LoadingRows } from '../../components/LoadingRows';
import { PageHeader } from '../../components/PageHeader';
import { Sheet } from '../../components/Sheet';
import { BriefRows } from './BriefRows';
import { DraftRows } from './DraftRows';
import { TrainRows } from './TrainRows';

/** Today's work: own briefs and trains, and for the librarian the drafts to clear. */
export default function HomePage() {
  const { me, can } = useMe();
  const { overview, problem, mutate } = useOverview();
  const first = me?.name.split(' ')[0] ?? '';

  const newBrief = can('briefs.edit') ? (
    <Button variant="contained" component={Link} to="/briefs/new">
      New brief
    </Button>
  ) : undefined;

  if (overview === undefined) {
    return (
      <>
        <PageHeader title="Today" />
        <Sheet>
          {problem === null ? (
            <LoadingRows rows={8} label="Loading your work" />
          ) : (
            <ErrorState problem={problem} onRetry={() => void mutate()} what="your work" />
          )}
        </Sheet>
      </>
    );
  }
  const makes = can('briefs.edit') || can('trains.edit');
  return (
    <>
      <PageHeader title={first === '' ? 'Today' : `Today, ${first}`} actions={newBrief} />
      <Box sx={{ display: 'flex', flexDirection: 'column', gap: 2 }}>
        {can('parts.edit') && (
          <Sheet
            title="Drafts to clear"
            aside={<MoreLink to="/parts?standing=draft" text="All drafts" />}
            flush
          >
            {overview.draftParts.length > 0 ? (
              <DraftRows parts={overview.draftParts} />
            ) : (
              <EmptyState title="No draft waits to be cleared">
                Parts that are added as drafts stand here until somebody clears them for use.
              </EmptyState>
            )}
          </Sheet>
        )}
        {(makes || overview.briefs.length > 0) && (
          <Sheet title="My briefs" aside={<MoreLink to="/briefs" text="All briefs" />} flush>
            {overview.briefs.length > 0 ? (
              <BriefRows briefs={overview.briefs} />
            ) : (
              <EmptyState title="You have no briefs yet">
                A brief states the ratio, the room and the duty; its search then shows every sensible train.
                Start one, or open a colleague’s.
              </EmptyState>
            )}
          </Sheet>
        )}
        {(makes || overview.trains.length > 0) && (
          <Sheet title="My trains" aside={<MoreLink to="/trains" text="All trains" />} flush>
            {overview.trains.length > 0 ? (
              <TrainRows trains={overview.trains} />
            ) : (
              <EmptyState title="You have adopted no train yet">
                Search a brief, compare its options, and adopt the best one as a train.
              </EmptyState>
            )}
          </Sheet>
        )}
        {!makes && !can('parts.edit') && overview.trains.length === 0 && overview.briefs.length === 0 && (
          <Sheet flush>
            <EmptyState
              title="Nothing waits for you"
              action={
                <Box sx={{ display: 'flex', gap: 1 }}>
                  <Button variant="outlined" component={Link} to="/trains">
                    Look up a train
                  </Button>
                  <Button variant="outlined" component={Link} to="/parts">
                    Look up a part
                  </Button>
                </Box>
              }
            >
              {can('bom.export')
                ? 'Open a train to take its bill of materials as a spreadsheet.'
                : 'You can look up trains, parts and briefs, and print them.'}{' '}
              Press / to search.
            </EmptyState>
          </Sheet>
        )}
      </Box>
    </>
  );
}

function MoreLink({ to, text }: { to: string; text: string }) {
  return (
    <Box
      component={Link}
      to={to}
      sx={{
        color: 'primary.main',
        fontWeight: 500,
        textDecoration: 'none',
        '&:hover': { textDecoration: 'underline' },
      }}
    >
      {text}
    </Box>
  );
}
