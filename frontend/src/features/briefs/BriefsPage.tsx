import Button from '@mui/material/Button';
import FormControlLabel from '@mui/material/FormControlLabel';
import Switch from '@mui/material/Switch';
import useMediaQuery from '@mui/material/useMediaQuery';
import type { GridColDef } from '@mui/x-data-grid';
import { Link, useNavigate } from 'react-router-dom';
import { useBriefs } from '../../api/hooks/useBriefs';
import { useMe } from '../../api/hooks/useMe';
import { asProblem } from '../../api/problem';
import type { BriefSummary } from '../../api/types';
import { DataTable } from '../../components/DataTable';
import { EmptyState } from '../../components/EmptyState';
import { FilterBar } from '../../components/FilterBar';
import { formatDay } from '../../components/figures';
import { PageHeader } from '../../components/PageHeader';
import { FilterText } from '../../components/FilterText';
import { useListState, writeSort } from '../../components/useListState';
import { OBJECTIVE_WORDS } from './choiceWords';
import { optionCount } from './search/searchWords';

const FILTERS = ['text', 'mine'] as const;
const SORTS = ['code', 'title', 'standing', 'owner', 'updatedAt'] as const;

const STANDING_WORDS: Record<BriefSummary['standing'], string> = {
  open: 'not searched',
  searched: 'searched',
  adopted: 'adopted',
};

const right = { align: 'right', headerAlign: 'right' } as const;

const COLUMNS: GridColDef<BriefSummary>[] = [
  { field: 'code', headerName: 'Brief', width: 80, cellClassName: 'part-number' },
  { field: 'title', headerName: 'Title', flex: 1, minWidth: 150 },
  {
    field: 'ratioTarget',
    headerName: 'Ratio',
    width: 136,
    ...right,
    sortable: false,
    valueGetter: (_, row) => `${row.ratioTarget} : 1 ± ${row.tolerancePercent} %`,
  },
  {
    field: 'stages',
    headerName: 'Stages',
    width: 72,
    ...right,
    sortable: false,
    valueGetter: (_, { stages }) => (stages.min === stages.max ? stages.min : `${stages.min}–${stages.max}`),
  },
  {
    field: 'objective',
    headerName: 'Best by',
    width: 176,
    sortable: false,
    valueGetter: (_, { objective }) => OBJECTIVE_WORDS[objective],
  },
  { field: 'standing', headerName: 'Standing', width: 112, valueGetter: (_, row) => standingWords(row) },
  {
    field: 'pinCount',
    headerName: 'Pinned',
    width: 70,
    ...right,
    sortable: false,
    valueFormatter: (count: number) => (count === 0 ? '' : String(count)),
  },
  { field: 'owner', headerName: 'Owner', width: 120 },
  {
    field: 'updatedAt',
    headerName: 'Changed',
    width: 110,
    ...right,
    valueFormatter: (iso: string) => formatDay(iso),
  },
];

/** Left out where the screen is a phone's. */
const NARROW = {
  ratioTarget: false,
  stages: false,
  objective: false,
  pinCount: false,
  owner: false,
  updatedAt: false,
};

function standingWords({ standing, latestSearch }: BriefSummary): string {
  if (latestSearch?.state === 'running' || latestSearch?.state === 'queued') return 'searching';
  const count = latestSearch?.optionCount;
  if (standing !== 'searched' || count == null) return STANDING_WORDS[standing];
  return count === 0 ? 'no option' : optionCount(count);
}

/** Every brief; filters, order and page live in the address. */
export default function BriefsPage() {
  const navigate = useNavigate();
  const { can } = useMe();
  const state = useListState(FILTERS, SORTS);
  const { text, mine } = state.filters;
  const { data, error, isLoading, mutate } = useBriefs({
    page: state.page,
    size: state.size,
    sort: writeSort(state.sort) || '-updatedAt',
    ...(text ? { text } : {}),
    ...(mine ? { mine: true } : {}),
  });
  const narrow = useMediaQuery('(max-width: 600px)');
  const newBrief = can('briefs.edit') && (
    <Button variant="contained" component={Link} to="/briefs/new">
      New brief
    </Button>
  );
  return (
    <>
      <PageHeader
        title="Briefs"
        facts="What a train must do, and the options found for it"
        actions={newBrief}
      />
      <FilterBar
        filterCount={state.filterCount}
        onClear={state.clearFilters}
        result={data && (data.total === 1 ? '1 brief' : `${data.total} briefs`)}
      >
        <FilterText
          label="Code, title or note"
          value={text ?? ''}
          onChange={(next) => state.setFilters({ text: next })}
        />
        <FormControlLabel
          control={
            <Switch
              size="small"
              checked={mine !== undefined}
              onChange={(_, on) => state.setFilters({ mine: on ? 'true' : '' })}
            />
          }
          label="Mine"
          sx={{ minHeight: 34, ml: 0.5 }}
        />
      </FilterBar>
      <DataTable
        label="Briefs"
        columns={COLUMNS}
        hidden={narrow ? NARROW : undefined}
        rows={data?.items}
        total={data?.total}
        getRowId={(row) => row.id}
        state={state}
        loading={isLoading}
        problem={error === undefined ? null : asProblem(error)}
        onRetry={() => void mutate()}
        onOpen={(row) => void navigate(`/briefs/${encodeURIComponent(row.id)}`)}
        empty={
          state.filterCount > 0 ? (
            <EmptyState title="No brief fits these filters">
              Clear a filter, or look for less of the title.
            </EmptyState>
          ) : (
            <EmptyState title="No briefs yet" action={newBrief}>
              A brief says which ratio, box and duty a train must meet; Stageyard then finds every sensible
              train.
            </EmptyState>
          )
        }
      />
    </>
  );
}
