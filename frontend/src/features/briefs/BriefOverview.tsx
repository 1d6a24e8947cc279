import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { isUnderWay } from '../../api/hooks/searchEvents';
import { startSearch, stopSearch, useBriefSearch } from '../../api/hooks/useBriefSearch';
import { useMe } from '../../api/hooks/useMe';
import { asProblem, type Problem } from '../../api/problem';
import type { Brief } from '../../api/types';
import { EmptyState } from '../../components/EmptyState';
import { ErrorState } from '../../components/ErrorState';
import { LoadingRows } from '../../components/LoadingRows';
import { PageHeader } from '../../components/PageHeader';
import { Sheet } from '../../components/Sheet';
import { BriefFacts } from './BriefFacts';
import { briefWords } from './briefWords';
import { OptionsView } from './results/OptionsView';
import { changedSince } from './search/changedSince';
import { RunningLine } from './search/SearchLine';

/** A saved brief: what it asks in one line, its latest search, and what that found. */
export function BriefOverview({ brief }: { brief: Brief }) {
  const { can } = useMe();
  const navigate = useNavigate();
  const canEdit = can('briefs.edit');
  const searchId = brief.latestSearch?.id ?? null;
  const { data: search, error, mutate, connected } = useBriefSearch(searchId);
  const [problem, setProblem] = useState<Problem | null>(null);
  const [busy, setBusy] = useState<'starting' | 'stopping' | null>(null);
  const [showFacts, setShowFacts] = useState(false);
  const running = isUnderWay(search);
  const changed = search && !running ? changedSince(search.request, brief.requirement) : [];
  const current = search?.state === 'done' && changed.length === 0;

  async function act(what: 'starting' | 'stopping', run: () => Promise<unknown>): Promise<void> {
    setBusy(what);
    setProblem(null);
    try {
      await run();
    } catch (refusal) {
      setProblem(asProblem(refusal));
    } finally {
      setBusy(null);
    }
  }

  const edit = (change?: object) =>
    void navigate(`/briefs/${encodeURIComponent(brief.id)}?edit=1`, { state: change ? { change } : null });

  return (
    <>
      <PageHeader
        title={brief.title}
        code={brief.code}
        facts={briefWords(brief.requirement).join(' · ')}
        actions={
          <>
            <Button variant="text" aria-expanded={showFacts} onClick={() => setShowFacts((shown) => !shown)}>
              {showFacts ? 'Hide the brief' : 'Brief in full'}
            </Button>
            {canEdit && (
              <Button variant="outlined" onClick={() => edit()}>
                Edit brief
              </Button>
            )}
            {canEdit && !running && (
              <Button
                variant={current && brief.pins.length > 0 ? 'outlined' : 'contained'}
                loading={busy === 'starting'}
                onClick={() => void act('starting', () => startSearch(brief.id))}
              >
                {search ? 'Search again' : 'Search'}
              </Button>
            )}
          </>
        }
      />
      {showFacts && <BriefFacts brief={brief} />}
      {problem && (
        <Alert severity="error" onClose={() => setProblem(null)} sx={{ mb: 1.5 }}>
          {problem.message}
        </Alert>
      )}
      {changed.length > 0 && (
        <Alert severity="warning" sx={{ mb: 1.5 }}>
          Since this search the brief changed: {changed.join(', ')}.
          {canEdit && ' Search again to see what it finds now.'}
        </Alert>
      )}
      {searchId === null && (
        <Sheet>
          <EmptyState title="Not searched yet">
            {canEdit
              ? 'Search settles every combination of teeth inside this brief and lists the best trains, with the reason for every stage count that is out.'
              : 'A designer can search this brief; what it finds then stands here.'}
          </EmptyState>
        </Sheet>
      )}
      {searchId !== null && !search && error !== undefined && (
        <ErrorState problem={asProblem(error)} what="the search" onRetry={() => void mutate()} />
      )}
      {searchId !== null && !search && error === undefined && (
        <LoadingRows rows={14} height={37} label="Loading the options" />
      )}
      {search && running && (
        <RunningLine
          search={search}
          connected={connected}
          stopping={busy === 'stopping'}
          onStop={canEdit ? () => void act('stopping', () => stopSearch(search.id)) : undefined}
        />
      )}
      {search?.state === 'failed' && (
        <Alert severity="error" sx={{ mb: 1.5 }}>
          The search failed. {search.message ?? 'Search again; if it stays, tell your administrator.'}
        </Alert>
      )}
      {search?.outcome && (
        <OptionsView
          brief={brief}
          search={search}
          canEdit={canEdit}
          canAdopt={can('trains.edit')}
          onTry={(change) => edit(change)}
        />
      )}
      {search && !search.outcome && search.state === 'stopped' && (
        <Sheet>
          <EmptyState title="Stopped before anything was found">
            Search again and let it run longer, or narrow the brief: fewer teeth to try, fewer stages.
          </EmptyState>
        </Sheet>
      )}
      {brief.pins.length > 0 && !search?.outcome && <Box sx={{ mt: 2 }} />}
    </>
  );
}
