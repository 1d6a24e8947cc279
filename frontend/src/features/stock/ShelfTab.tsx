import Button from '@mui/material/Button';
import useMediaQuery from '@mui/material/useMediaQuery';
import { Link, useNavigate } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { usePlaces } from '../../api/hooks/usePlaces';
import { useStock, type StockQuery } from '../../api/hooks/useStock';
import type { StockItem } from '../../api/types';
import { DataTable } from '../../components/DataTable';
import { EmptyState } from '../../components/EmptyState';
import { formatCount } from '../../components/figures';
import { FilterBar } from '../../components/FilterBar';
import { ChoiceFilter } from '../../components/FilterFields';
import { FilterText } from '../../components/FilterText';
import { useListState, writeSort, type ListState } from '../../components/useListState';
import { STOCK_KINDS } from './stockKinds';
import { COPY_HEAD, copyRow, NARROW_HIDDEN, MIDDLE_HIDDEN, shelfColumns } from './shelfColumns';

const FILTERS = ['text', 'place', 'kind', 'low'] as const;
const SORTS = ['number', 'description', 'quantity', 'leastStock', 'shortBy'] as const;

function queryOf(state: ListState<(typeof FILTERS)[number]>): StockQuery {
  const { text, place, kind, low } = state.filters;
  const known = STOCK_KINDS.find((each) => each === kind);
  return {
    page: state.page,
    size: state.size,
    // What is missing most comes first where the list is about what is missing.
    sort: writeSort(state.sort) || (low === 'true' ? '-shortBy' : 'number'),
    ...(text ? { text } : {}),
    ...(place ? { place } : {}),
    ...(known ? { kind: known } : {}),
    ...(low === 'true' ? { low: true } : {}),
  };
}

/** What lies where, part by part, and what is running low. */
export function ShelfTab({ onBook }: { onBook: () => void }) {
  const navigate = useNavigate();
  const { can } = useMe();
  const state = useListState(FILTERS, SORTS);
  const { page, problem, isLoading, mutate } = useStock(queryOf(state));
  const places = usePlaces();
  const narrow = useMediaQuery('(max-width: 600px)');
  const middle = useMediaQuery('(max-width: 1399px)');
  const onlyLow = state.filters.low === 'true';
  const count = page && `${formatCount(page.total)} ${page.total === 1 ? 'part' : 'parts'}`;
  return (
    <>
      <FilterBar filterCount={state.filterCount} onClear={state.clearFilters} result={count}>
        <FilterText
          label="Number or words"
          value={state.filters.text ?? ''}
          onChange={(text) => state.setFilters({ text })}
        />
        <ChoiceFilter
          label="Shelf"
          width={100}
          value={state.filters.low ?? ''}
          onSet={(low) => state.setFilters({ low })}
          choices={[{ value: 'true', name: 'low' }]}
        />
        <ChoiceFilter
          label="Place"
          width={124}
          value={state.filters.place ?? ''}
          onSet={(place) => state.setFilters({ place })}
          choices={places.map(({ place, parts }) => ({ value: place, name: place, count: parts }))}
        />
        <ChoiceFilter
          label="Kind"
          width={116}
          value={state.filters.kind ?? ''}
          onSet={(kind) => state.setFilters({ kind })}
          choices={STOCK_KINDS.map((kind) => ({ value: kind, name: kind.replaceAll('-', ' ') }))}
        />
      </FilterBar>
      <DataTable<StockItem>
        label="Parts on the shelf"
        height="calc(100dvh - 242px)"
        columns={shelfColumns(narrow)}
        rowHeight={narrow ? 48 : 32}
        hidden={narrow ? NARROW_HIDDEN : middle ? MIDDLE_HIDDEN : undefined}
        rows={page?.items}
        total={page?.total}
        getRowId={(item) => item.number}
        state={state}
        loading={isLoading}
        problem={problem}
        onRetry={() => void mutate()}
        onOpen={(item) => void navigate(`/parts/${encodeURIComponent(item.number)}`)}
        copied={(items) => [COPY_HEAD, ...items.map(copyRow)]}
        empty={
          onlyLow && state.filterCount === 1 ? (
            <EmptyState title="Nothing is low">
              A part stands here once less than its least stock lies on the shelf. Set the least stock on the
              part’s page.
            </EmptyState>
          ) : state.filterCount > 0 ? (
            <EmptyState
              title="No part on the shelf meets these filters"
              action={
                <Button variant="outlined" onClick={state.clearFilters}>
                  Clear the filters
                </Button>
              }
            >
              Loosen one of them, or clear them all.
            </EmptyState>
          ) : (
            <EmptyState
              title="Nothing was ever put on a shelf"
              action={
                can('stock.book') && (
                  <>
                    <Button variant="contained" component={Link} to="/stock/count" sx={{ mr: 1 }}>
                      Count
                    </Button>
                    <Button variant="outlined" onClick={onBook}>
                      Book a delivery
                    </Button>
                  </>
                )
              }
            >
              {can('stock.book')
                ? 'Count what lies there place by place, with a phone, or book what a delivery brings.'
                : 'A librarian or a purchaser counts what lies there and books deliveries.'}
            </EmptyState>
          )
        }
      />
    </>
  );
}
