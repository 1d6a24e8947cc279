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
import { FirstSteps } from './FirstSteps';
import { LatestChanges } from './LatestChanges';
import { LatestTrains } from './LatestTrains';
import { LowStock } from './LowStock';
import { MoreLink } from './MoreLink';
import { PricesToRenew } from './PricesToRenew';
import { TrainRows } from './TrainRows';
import { WithdrawnParts } from './WithdrawnParts';

/** Today's work. A list that is not this person's daily business stands here only when something is in it. */
export default function HomePage() {
  const { me, can } = useMe();
  const { overview, problem, mutate } = useOverview();
  const first = me?.name.split(' ')[0] ?? '';
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
  const { counts, briefs, trains, draftParts } = overview;
  const roles = me?.roles ?? [];
  const [designs, keeps] = [roles.includes('designer'), roles.includes('librarian')];
  const newBrief = designs && (
    <Button variant="contained" component={Link} to="/briefs/new">
      New brief
    </Button>
  );
  return (
    <>
      <PageHeader title={first === '' ? 'Today' : `Today, ${first}`} actions={newBrief || undefined} />
      <Box sx={{ display: 'flex', flexDirection: 'column', gap: 2 }}>
        {can('people.manage') && counts.parts + counts.briefs === 0 && <FirstSteps />}
        {(designs || briefs.length > 0) && (
          <Sheet title="My briefs" aside={<MoreLink to="/briefs" text="All briefs" />} flush>
            {briefs.length > 0 ? (
              <BriefRows briefs={briefs} />
            ) : (
              <EmptyState title="You have no briefs yet">
                A brief states the ratio, the room and the duty; its search then shows every sensible train.
                Start one, or open a colleague’s.
              </EmptyState>
            )}
          </Sheet>
        )}
        {(designs || trains.length > 0) && (
          <Sheet title="My trains" aside={<MoreLink to="/trains" text="All trains" />} flush>
            {trains.length > 0 ? (
              <TrainRows label="My trains" trains={trains} />
            ) : (
              <EmptyState title="You have adopted no train yet">
                Search a brief, compare its options, and adopt the best one as a train.
              </EmptyState>
            )}
          </Sheet>
        )}
        {(keeps || draftParts.length > 0) && (
          <Sheet
            title="Drafts to clear"
            aside={<MoreLink to="/parts?standing=draft" text="All drafts" />}
            flush
          >
            {draftParts.length > 0 ? (
              <DraftRows parts={draftParts} />
            ) : (
              <EmptyState title="No draft waits to be cleared">
                Parts that are added as drafts stand here until somebody clears them for use.
              </EmptyState>
            )}
          </Sheet>
        )}
        {(keeps || roles.includes('purchaser')) && <LowStock />}
        {(keeps || roles.includes('purchaser')) && <PricesToRenew />}
        {keeps && <WithdrawnParts />}
        {!designs && !keeps && <LatestTrains />}
        {can('people.manage') && <LatestChanges />}
      </Box>
    </>
  );
}
