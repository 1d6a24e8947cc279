import { useMe } from '../../api/hooks/useMe';
import { useStock } from '../../api/hooks/useStock';
import type { StockItem } from '../../api/types';
import { EmptyState } from '../../components/EmptyState';
import { NOTHING } from '../../components/figures';
import { Sheet } from '../../components/Sheet';
import { quantityWords, shortWords } from '../../components/stock/stockWords';
import { CodeLink } from './CodeLink';
import { MoreLink } from './MoreLink';
import { RowTable, type RowColumn } from './RowTable';

const QUERY = { low: true, sort: '-shortBy', size: 10 } as const;

const pathOf = (item: StockItem) => `/parts/${encodeURIComponent(item.number)}`;

const COLUMNS: RowColumn<StockItem>[] = [
  { name: 'Number', cell: (item) => <CodeLink to={pathOf(item)} code={item.number} /> },
  { name: 'Description', cell: (item) => item.description },
  { name: 'On shelf', figure: true, cell: (item) => quantityWords(item.quantity, item.unit) },
  {
    name: 'Least',
    figure: true,
    wideOnly: true,
    cell: ({ leastStock, unit }) => (leastStock === null ? NOTHING : quantityWords(leastStock, unit)),
  },
  { name: 'Short by', figure: true, cell: shortWords },
];

/** Parts of which less than the least stock lies on the shelf, what is missing most first. */
export function LowStock() {
  const { can } = useMe();
  const { page } = useStock(can('stock.book') ? QUERY : null);
  if (page === undefined) return null;
  return (
    <Sheet title="Low stock" aside={<MoreLink to="/stock?low=true" text="All low stock" />} flush>
      {page.items.length > 0 ? (
        <RowTable
          label="Low stock"
          columns={COLUMNS}
          rows={page.items}
          keyOf={(item) => item.number}
          pathOf={pathOf}
        />
      ) : (
        <EmptyState title="Nothing is low">
          Set the least stock on a part’s page; the part stands here once less than that lies on the shelf.
        </EmptyState>
      )}
    </Sheet>
  );
}
