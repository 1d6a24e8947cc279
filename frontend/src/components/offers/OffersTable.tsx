import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import useMediaQuery from '@mui/material/useMediaQuery';
import { useMemo, type ReactNode } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { useOffers } from '../../api/hooks/useOffers';
import type { Offer } from '../../api/types';
import { DataTable } from '../DataTable';
import { EmptyState } from '../EmptyState';
import { formatCount } from '../figures';
import { FilterBar } from '../FilterBar';
import { FilterText } from '../FilterText';
import { useListState } from '../useListState';
import { hiddenOfferColumns, offerColumnsFor, type OffersRoom } from './offerColumns';
import { OfferFilterFields } from './OfferFilterFields';
import { OFFER_FILTERS, OFFER_SORTS, offerQuery } from './offerFilters';

interface OffersTableProps {
  /** Code of the one supplier whose offers these are; all suppliers' where it is left out. */
  supplier?: string;
  height?: string;
  /** Filters that only the whole list has. */
  more?: ReactNode;
}

/** Offers with their filters; filters, order and page live in the address. */
export function OffersTable({ supplier, height, more }: OffersTableProps) {
  const navigate = useNavigate();
  const { can } = useMe();
  const state = useListState(OFFER_FILTERS, OFFER_SORTS);
  const query = useMemo(() => offerQuery(state, supplier), [state, supplier]);
  const { page, problem, isLoading, mutate } = useOffers(query);
  const narrow = useMediaQuery('(max-width: 600px)');
  const laptop = useMediaQuery('(max-width: 1399px)');
  const full = useMediaQuery('(min-width: 1700px)');
  const room: OffersRoom = narrow ? 'narrow' : laptop ? 'laptop' : full ? 'full' : 'wide';
  const ofOne = supplier !== undefined;
  const { filters, setFilters } = state;
  return (
    <>
      <FilterBar
        filterCount={state.filterCount}
        onClear={state.clearFilters}
        result={page && (page.total === 1 ? '1 offer' : `${formatCount(page.total)} offers`)}
      >
        <FilterText
          label={ofOne ? 'Part or their number' : 'Part or supplier'}
          width={200}
          value={filters.text ?? ''}
          onChange={(text) => setFilters({ text })}
        />
        <OfferFilterFields state={state} narrow={narrow} more={more} />
      </FilterBar>
      <Box sx={ofOne ? { border: '1px solid', borderColor: 'line.rule' } : undefined}>
        <DataTable<Offer>
          label="Offers"
          columns={offerColumnsFor(room, ofOne)}
          hidden={hiddenOfferColumns(room, ofOne)}
          rowHeight={narrow ? 62 : 32}
          height={height}
          rows={page?.items}
          total={page?.total}
          getRowId={(row) => row.id}
          state={state}
          loading={isLoading}
          problem={problem}
          onRetry={() => void mutate()}
          onOpen={(row) => void navigate(`/offers/${encodeURIComponent(row.id)}`)}
          empty={
            <NoOffers
              filtered={state.filterCount > 0}
              onClear={state.clearFilters}
              supplier={supplier}
              mayAdd={can('prices.edit')}
            />
          }
        />
      </Box>
    </>
  );
}

interface NoOffersProps {
  filtered: boolean;
  onClear: () => void;
  supplier: string | undefined;
  mayAdd: boolean;
}

function NoOffers({ filtered, onClear, supplier, mayAdd }: NoOffersProps) {
  if (filtered) {
    return (
      <EmptyState
        title="No offer meets these filters"
        action={
          <Button variant="outlined" onClick={onClear}>
            Clear the filters
          </Button>
        }
      >
        Loosen one of them, or clear them all.
      </EmptyState>
    );
  }
  if (!mayAdd) return <EmptyState title="No offers yet">A purchaser or a librarian adds them.</EmptyState>;
  const query = supplier === undefined ? '' : `?supplier=${encodeURIComponent(supplier)}`;
  const paste = supplier === undefined ? '/offers?paste=1' : `/offers?paste=${encodeURIComponent(supplier)}`;
  return (
    <EmptyState
      title="No offers yet"
      action={
        <Box sx={{ display: 'flex', gap: 1, flexWrap: 'wrap' }}>
          <Button variant="outlined" component={Link} to={`/add-offer${query}`}>
            Add an offer
          </Button>
          <Button variant="outlined" component={Link} to={paste}>
            Paste rows
          </Button>
        </Box>
      }
    >
      Add one by hand, or paste the rows of a price list from a spreadsheet.
    </EmptyState>
  );
}
