import Button from '@mui/material/Button';
import useMediaQuery from '@mui/material/useMediaQuery';
import { Link, useNavigate } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { useSuppliers, type SupplierQuery } from '../../api/hooks/useSuppliers';
import { CURRENCY_CHOICES } from '../../components/currencyChoices';
import { DataTable } from '../../components/DataTable';
import { EmptyState } from '../../components/EmptyState';
import { formatCount } from '../../components/figures';
import { FilterBar } from '../../components/FilterBar';
import { ChoiceFilter } from '../../components/FilterFields';
import { FilterText } from '../../components/FilterText';
import { NoPrices } from '../../components/NoPermission';
import { PageHeader } from '../../components/PageHeader';
import { useListState, writeSort, type ListState } from '../../components/useListState';
import { LAPTOP_HIDDEN, NARROW_HIDDEN, supplierColumns, WIDE_HIDDEN } from './supplierColumns';

const FILTERS = ['text', 'standing', 'currency'] as const;
const SORTS = ['code', 'name', 'currency', 'leadTimeDays', 'offers', 'updatedAt'] as const;

function queryOf(state: ListState<(typeof FILTERS)[number]>): SupplierQuery {
  const { text, standing, currency } = state.filters;
  return {
    page: state.page,
    size: state.size,
    sort: writeSort(state.sort) || 'name',
    ...(text ? { text } : {}),
    ...(standing === 'active' || standing === 'closed' ? { standing } : {}),
    ...(currency ? { currency } : {}),
  };
}

/** Every firm that parts are bought from; filters, order and page live in the address. */
export default function SuppliersPage() {
  const navigate = useNavigate();
  const { can } = useMe();
  const state = useListState(FILTERS, SORTS);
  const allowed = can('prices.read');
  const { page, problem, isLoading, mutate } = useSuppliers(queryOf(state), allowed);
  const narrow = useMediaQuery('(max-width: 600px)');
  const laptop = useMediaQuery('(max-width: 1399px)');
  const full = useMediaQuery('(min-width: 1700px)');
  const add = can('prices.edit') ? (
    <Button variant="contained" component={Link} to="/add-supplier">
      Add supplier
    </Button>
  ) : undefined;
  if (!allowed) {
    return (
      <>
        <PageHeader title="Suppliers" />
        <NoPrices />
      </>
    );
  }
  return (
    <>
      <PageHeader title="Suppliers" actions={add} />
      <FilterBar
        filterCount={state.filterCount}
        onClear={state.clearFilters}
        result={page && (page.total === 1 ? '1 supplier' : `${formatCount(page.total)} suppliers`)}
      >
        <FilterText
          label="Name, code or contact"
          value={state.filters.text ?? ''}
          onChange={(text) => state.setFilters({ text })}
        />
        <ChoiceFilter
          label="Standing"
          width={116}
          value={state.filters.standing ?? ''}
          onSet={(standing) => state.setFilters({ standing })}
          choices={['active', 'closed'].map((value) => ({ value, name: value }))}
        />
        <ChoiceFilter
          label="Currency"
          width={104}
          value={state.filters.currency ?? ''}
          onSet={(currency) => state.setFilters({ currency })}
          choices={CURRENCY_CHOICES}
        />
      </FilterBar>
      <DataTable
        label="Suppliers"
        columns={supplierColumns(narrow)}
        rowHeight={narrow ? 46 : 32}
        hidden={narrow ? NARROW_HIDDEN : laptop ? LAPTOP_HIDDEN : full ? undefined : WIDE_HIDDEN}
        rows={page?.items}
        total={page?.total}
        getRowId={(row) => row.code}
        state={state}
        loading={isLoading}
        problem={problem}
        onRetry={() => void mutate()}
        onOpen={(row) => void navigate(`/suppliers/${encodeURIComponent(row.code)}`)}
        empty={
          state.filterCount > 0 ? (
            <EmptyState
              title="No supplier meets these filters"
              action={
                <Button variant="outlined" onClick={state.clearFilters}>
                  Clear the filters
                </Button>
              }
            >
              Loosen one of them, or clear them all.
            </EmptyState>
          ) : (
            <EmptyState title="No suppliers yet" action={add}>
              {can('prices.edit')
                ? 'Add the firms that you buy from; then their offers give parts a price.'
                : 'A purchaser or a librarian adds the firms that you buy from.'}
            </EmptyState>
          )
        }
      />
    </>
  );
}
