import Box from '@mui/material/Box';
import MuiLink from '@mui/material/Link';
import FormControlLabel from '@mui/material/FormControlLabel';
import Switch from '@mui/material/Switch';
import useMediaQuery from '@mui/material/useMediaQuery';
import { useMemo } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { useTrains } from '../../api/hooks/useTrains';
import { asProblem } from '../../api/problem';
import type { TrainSummary } from '../../api/types';
import { DataTable } from '../../components/DataTable';
import { EmptyState } from '../../components/EmptyState';
import { FilterBar } from '../../components/FilterBar';
import { FilterText } from '../../components/FilterText';
import { formatDay, formatFixed } from '../../components/figures';
import type { DataColumn } from '../../components/gridText';
import { boxWords, errorWords, moduleWords, ratioWords } from '../../components/optionWords';
import { PageHeader } from '../../components/PageHeader';
import { useListState, writeSort } from '../../components/useListState';
import { VerdictWord } from '../../components/VerdictWord';
import { commonScale, TrainStrip } from '../../drawings/TrainStrip';
import { specTeethWords } from './trainWords';

const FILTERS = ['text', 'mine'] as const;
const SORTS = ['code', 'title', 'owner', 'updatedAt'] as const;
const STRIP = { width: 100, height: 36 };

const right = { align: 'right', headerAlign: 'right', sortable: false } as const;

function columnsFor(scale: number): DataColumn<TrainSummary>[] {
  return [
    {
      field: 'strip',
      headerName: 'One scale',
      width: 112,
      sortable: false,
      copied: false,
      renderCell: ({ row }) => (
        <Box sx={{ height: '100%', display: 'flex', alignItems: 'center' }}>
          <TrainStrip train={row.spec} {...STRIP} mmPerPixel={scale} />
        </Box>
      ),
    },
    { field: 'code', headerName: 'Train', width: 72, cellClassName: 'part-number' },
    {
      field: 'title',
      headerName: 'Title',
      flex: 2,
      minWidth: 140,
      renderCell: ({ value }) => <TitleCell title={String(value)} />,
    },
    {
      field: 'revision',
      headerName: 'Revision',
      width: 90,
      sortable: false,
      valueGetter: (_, row) => `${row.revision}, ${row.state}`,
    },
    {
      field: 'teeth',
      headerName: 'Teeth, module',
      width: 154,
      sortable: false,
      valueGetter: (_, { spec }) => `${specTeethWords(spec)} ${moduleWords(spec.stages)}`,
      renderCell: ({ row: { spec } }) => <TeethCell spec={spec} />,
    },
    {
      field: 'ratio',
      headerName: 'Ratio',
      width: 74,
      ...right,
      valueGetter: (_, { ratio }) => ratioWords(ratio.value),
    },
    {
      field: 'error',
      headerName: 'Error %',
      width: 74,
      ...right,
      valueGetter: (_, { ratio }) => errorWords(ratio.errorPercent),
    },
    { field: 'box', headerName: 'Box mm', width: 118, ...right, valueGetter: (_, { box }) => boxWords(box) },
    {
      field: 'mass',
      headerName: 'Mass kg',
      width: 74,
      ...right,
      valueGetter: (_, { mass }) => formatFixed(mass, 2),
    },
    {
      field: 'checks',
      headerName: 'Checks',
      width: 116,
      sortable: false,
      copied: ({ fails, marginals }) =>
        fails > 0 ? `${fails} fails` : marginals > 0 ? `${marginals} marginal` : 'passes',
      renderCell: ({ row }) => <ChecksCell fails={row.fails} marginals={row.marginals} />,
    },
    { field: 'owner', headerName: 'Owner', width: 96 },
    {
      field: 'updatedAt',
      headerName: 'Changed',
      width: 100,
      align: 'right',
      headerAlign: 'right',
      valueFormatter: (iso: string) => formatDay(iso),
    },
  ];
}

/** Left out where the screen is a laptop's: everything else then stands whole. */
const LAPTOP = { error: false, mass: false, owner: false };

/** Left out where the screen is a phone's. */
const NARROW = { ...LAPTOP, revision: false, box: false, updatedAt: false };

/** A long title takes a second line. */
function TitleCell({ title }: { title: string }) {
  return (
    <Box
      sx={{ lineHeight: 1.25, height: '100%', display: 'grid', alignContent: 'center', whiteSpace: 'normal' }}
    >
      <Box component="span" title={title} sx={{ maxHeight: '2.5em', overflow: 'hidden' }}>
        {title}
      </Box>
    </Box>
  );
}

/** Teeth over the module, as in the option table. */
function TeethCell({ spec }: { spec: TrainSummary['spec'] }) {
  return (
    <Box sx={{ lineHeight: 1.25, height: '100%', display: 'grid', alignContent: 'center' }}>
      <span>{specTeethWords(spec)}</span>
      <Box component="span" sx={{ color: 'text.secondary', fontSize: '0.6875rem' }}>
        {moduleWords(spec.stages)}
      </Box>
    </Box>
  );
}

function ChecksCell({ fails, marginals }: { fails: number; marginals: number }) {
  if (fails > 0)
    return (
      <>
        {fails}&nbsp;
        <VerdictWord verdict="fails" />
      </>
    );
  if (marginals > 0)
    return (
      <>
        {marginals}&nbsp;
        <VerdictWord verdict="marginal" />
      </>
    );
  return <VerdictWord verdict="passes" />;
}

/** Every adopted train, drawn on one scale; filters, order and page live in the address. */
export default function TrainsPage() {
  const navigate = useNavigate();
  const state = useListState(FILTERS, SORTS);
  const { text, mine } = state.filters;
  const { data, error, isLoading, mutate } = useTrains({
    page: state.page,
    size: state.size,
    sort: writeSort(state.sort) || '-updatedAt',
    ...(text ? { text } : {}),
    ...(mine ? { mine: true } : {}),
  });
  const narrow = useMediaQuery('(max-width: 600px)');
  const laptop = useMediaQuery('(max-width: 1399px)');
  const items = data?.items;
  const columns = useMemo(
    () =>
      columnsFor(
        commonScale(
          (items ?? []).map(({ spec }) => spec),
          STRIP.height,
          STRIP.width,
        ),
      ),
    [items],
  );
  return (
    <>
      <PageHeader
        title="Trains"
        facts="Adopted options, each with its drawing, stages and bill of materials"
      />
      <FilterBar
        filterCount={state.filterCount}
        onClear={state.clearFilters}
        result={data && (data.total === 1 ? '1 train' : `${data.total} trains`)}
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
        label="Trains"
        columns={columns}
        hidden={narrow ? NARROW : laptop ? LAPTOP : undefined}
        rows={items}
        total={data?.total}
        getRowId={(row) => row.code}
        state={state}
        loading={isLoading}
        rowHeight={38}
        problem={error === undefined ? null : asProblem(error)}
        onRetry={() => void mutate()}
        onOpen={(row) => void navigate(`/trains/${encodeURIComponent(row.code)}`)}
        empty={
          state.filterCount > 0 ? (
            <EmptyState title="No train fits these filters">
              Clear a filter, or look for less of the title.
            </EmptyState>
          ) : (
            <EmptyState title="No trains yet">
              Open a brief, search it, and adopt an option: it becomes a train.{' '}
              <MuiLink component={Link} to="/briefs">
                To the briefs
              </MuiLink>
            </EmptyState>
          )
        }
      />
    </>
  );
}
