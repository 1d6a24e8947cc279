import type { Search, SearchOutcome } from '../../../api/types';
import { formatCount } from '../../../components/figures';
import type { SearchProgress } from '../../../api/hooks/searchEvents';

/** `Two stages: 1,204,331 of 41,208,113 combinations settled, 37 options so far`. */
export function progressWords(progress: SearchProgress | null): string {
  if (!progress) return 'Waiting for a free worker…';
  // A phase may settle more than it first counted on; then its total says nothing.
  const counts =
    progress.total >= progress.settled && progress.total > 0
      ? `${formatCount(progress.settled)} of ${formatCount(progress.total)} combinations settled`
      : `${formatCount(progress.settled)} combinations settled`;
  const stages = ['', 'One stage', 'Two stages', 'Three stages'][progress.stages] ?? progress.phase;
  return `${stages ? `${stages}: ` : ''}${counts}, ${optionCount(progress.found)} so far`;
}

/** Share of the work done, per cent; null while the total is not known. */
export function progressPercent(progress: SearchProgress | null): number | null {
  if (!progress || progress.total <= 0) return null;
  return Math.min(100, (100 * progress.settled) / progress.total);
}

export const optionCount = (count: number): string =>
  count === 1 ? '1 option' : `${formatCount(count)} options`;

export type SearchAsked = Pick<Search, 'state'> & {
  request: Pick<Search['request'], 'bestOf' | 'limit' | 'stages'>;
};

/** The sentence after the count: how much was settled, and what that says about anything better. */
export function outcomeWords(search: SearchAsked, outcome: SearchOutcome): string {
  const { complete, combinations, elapsedMs } = outcome.search;
  const settled = `${formatCount(combinations)} in ${seconds(elapsedMs)}`;
  if (complete) {
    return `Every combination settled: ${settled}. ${claim(search.request, outcome)}`;
  }
  const why = search.state === 'stopped' ? 'Stopped' : 'Stopped at the time limit';
  return `${why} after ${settled}. These are the best so far; better ones may exist.`;
}

/** What a settled search may claim; with a list for each stage count it claims it for each. */
function claim({ bestOf, limit, stages }: SearchAsked['request'], { options }: SearchOutcome): string {
  if (options.length === 0) return 'No train meets every limit of this brief.';
  if (bestOf !== 'each-count' || stages.min === stages.max) return 'Nothing better exists inside this brief.';
  return `The best ${limit ?? 50} of each stage count; nothing better inside this brief.`;
}

function seconds(ms: number): string {
  return ms < 100 ? `${Math.max(1, Math.round(ms))} ms` : `${(ms / 1000).toFixed(1)} s`;
}
