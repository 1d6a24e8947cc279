import type { BriefSummary } from '../../api/types';
import { formatDay, NOTHING } from '../../components/figures';
import { CodeLink } from './CodeLink';
import { RowTable, type RowColumn } from './RowTable';

const pathOf = (brief: BriefSummary) => `/briefs/${encodeURIComponent(brief.id)}`;

/** Where the brief stands, in a few words. */
function state(brief: BriefSummary): string {
  const search = brief.latestSearch;
  if (search === null) return 'not searched yet';
  if (search.state === 'queued' || search.state === 'running') return 'searching now';
  if (search.state === 'failed') return 'search failed';
  const pins = brief.pinCount === 0 ? '' : `, ${brief.pinCount} pinned`;
  const count = search.optionCount;
  const found =
    count === null ? 'searched' : count === 0 ? 'no option' : count === 1 ? '1 option' : `${count} options`;
  return `${found}${pins}${brief.standing === 'adopted' ? ', adopted' : ''}`;
}

const COLUMNS: RowColumn<BriefSummary>[] = [
  { name: 'Brief', cell: (brief) => <CodeLink to={pathOf(brief)} code={brief.code} /> },
  { name: 'Title', cell: (brief) => brief.title },
  { name: 'Ratio', figure: true, cell: (brief) => `${brief.ratioTarget} : 1` },
  { name: 'Within ± %', figure: true, wideOnly: true, cell: (brief) => brief.tolerancePercent },
  {
    name: 'Stages',
    figure: true,
    wideOnly: true,
    cell: ({ stages }) => (stages.min === stages.max ? stages.min : `${stages.min}–${stages.max}`),
  },
  { name: 'Search', cell: state },
  {
    name: 'Changed',
    figure: true,
    wideOnly: true,
    cell: (brief) => (brief.updatedAt === '' ? NOTHING : formatDay(brief.updatedAt)),
  },
];

export function BriefRows({ briefs }: { briefs: readonly BriefSummary[] }) {
  return (
    <RowTable label="My briefs" columns={COLUMNS} rows={briefs} keyOf={(brief) => brief.id} pathOf={pathOf} />
  );
}
