import Button from '@mui/material/Button';
import TextField from '@mui/material/TextField';
import useMediaQuery from '@mui/material/useMediaQuery';
import { useNavigate } from 'react-router-dom';
import { useMovements, type MovementQuery } from '../../api/hooks/useMovements';
import { usePlaces } from '../../api/hooks/usePlaces';
import type { Movement } from '../../api/types';
import { DataTable } from '../../components/DataTable';
import { EmptyState } from '../../components/EmptyState';
import { formatCount } from '../../components/figures';
import { FilterBar } from '../../components/FilterBar';
import { ChoiceFilter, TypedFilter } from '../../components/FilterFields';
import { MOVEMENT_KINDS } from '../../components/stock/stockWords';
import { useListState, writeSort, type ListState } from '../../components/useListState';
import { COPY_HEAD, copyRow, MIDDLE_HIDDEN, movementColumns, NARROW_HIDDEN } from './movementColumns';

const FILTERS = ['text', 'part', 'place', 'kind', 'from', 'until'] as const;
const SORTS = ['at'] as const;
const DAY = /^\d{4}-\d{2}-\d{2}$/;

/** What the address holds; a day that is none is left out rather than sent. */
function queryOf(state: ListState<(typeof FILTERS)[number]>): MovementQuery {
  const { text, part, place, kind, from, until } = state.filters;
  const known = MOVEMENT_KINDS.find((each) => each === kind);
  return {
    page: state.page,
    size: state.size,
    ...(state.sort.length > 0 ? { sort: writeSort(state.sort) } : {}),
    ...(text ? { text } : {}),
    ...(part ? { part } : {}),
    ...(place ? { place } : {}),
    ...(known ? { kind: known } : {}),
    ...(from && DAY.test(from) ? { from } : {}),
    ...(until && DAY.test(until) ? { until } : {}),
  };
}

/** The ledger: every change of a shelf quantity, the newest first. */
export function MovementsTab() {
  const navigate = useNavigate();
  const state = useListState(FILTERS, SORTS);
  const { page, problem, isLoading, mutate } = useMovements(queryOf(state));
  const places = usePlaces();
  const narrow = useMediaQuery('(max-width: 600px)');
  const middle = useMediaQuery('(max-width: 1399px)');
  const bind = (name: (typeof FILTERS)[number]) => ({
    value: state.filters[name] ?? '',
    onSet: (value: string) => {
      if (value !== (state.filters[name] ?? '')) state.setFilters({ [name]: value });
    },
  });
  const day = (name: 'from' | 'until', label: string) => (
    <TextField
      type="date"
      label={label}
      value={state.filters[name] ?? ''}
      onChange={(event) => state.setFilters({ [name]: event.target.value })}
      sx={{ width: 136 }}
    />
  );
  return (
    <>
      <FilterBar
        filterCount={state.filterCount}
        onClear={state.clearFilters}
        result={page && `${formatCount(page.total)} ${page.total === 1 ? 'movement' : 'movements'}`}
      >
        <TypedFilter label="Words" width={120} {...bind('text')} />
        <TypedFilter label="Part number" width={120} {...bind('part')} />
        <ChoiceFilter
          label="What"
          width={112}
          choices={MOVEMENT_KINDS.map((kind) => ({ value: kind, name: kind }))}
          {...bind('kind')}
        />
        <ChoiceFilter
          label="Place"
          width={124}
          choices={places.map(({ place }) => ({ value: place, name: place }))}
          {...bind('place')}
        />
        {day('from', 'From')}
        {day('until', 'Until')}
      </FilterBar>
      <DataTable<Movement>
        label="Movements"
        height="calc(100dvh - 242px)"
        columns={movementColumns(narrow)}
        rowHeight={narrow ? 52 : 32}
        hidden={narrow ? NARROW_HIDDEN : middle ? MIDDLE_HIDDEN : undefined}
        rows={page?.items}
        total={page?.total}
        getRowId={(movement) => movement.id}
        state={state}
        loading={isLoading}
        problem={problem}
        onRetry={() => void mutate()}
        onOpen={(movement) => void navigate(`/parts/${encodeURIComponent(movement.number)}`)}
        copied={(movements) => [COPY_HEAD, ...movements.map(copyRow)]}
        empty={
          state.filterCount > 0 ? (
            <EmptyState
              title="No movement meets these filters"
              action={
                <Button variant="outlined" onClick={state.clearFilters}>
                  Clear the filters
                </Button>
              }
            >
              Loosen one of them, or clear them all.
            </EmptyState>
          ) : (
            <EmptyState title="No movement yet">
              Every delivery, issue, count and correction stands here once it is booked, and stays.
            </EmptyState>
          )
        }
      />
    </>
  );
}
