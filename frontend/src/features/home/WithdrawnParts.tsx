import { useParts } from '../../api/hooks/useParts';
import type { PartSummary } from '../../api/types';
import { formatDay } from '../../components/figures';
import { Sheet } from '../../components/Sheet';
import { CodeLink } from './CodeLink';
import { MoreLink } from './MoreLink';
import { RowTable, type RowColumn } from './RowTable';

const QUERY = { standing: 'withdrawn', sort: '-updatedAt', size: 5 } as const;

const pathOf = (number: string) => `/parts/${encodeURIComponent(number)}`;

const COLUMNS: RowColumn<PartSummary>[] = [
  { name: 'Number', cell: (part) => <CodeLink to={pathOf(part.number)} code={part.number} /> },
  { name: 'Description', cell: (part) => part.description },
  {
    name: 'Use instead',
    cell: ({ successorNumber }) =>
      successorNumber === null ? (
        'none named'
      ) : (
        <CodeLink to={pathOf(successorNumber)} code={successorNumber} />
      ),
  },
  { name: 'Changed', figure: true, wideOnly: true, cell: (part) => formatDay(part.updatedAt) },
];

/** Withdrawn last, and what stands in their place; nothing at all where nothing is withdrawn. */
export function WithdrawnParts() {
  const { page } = useParts(QUERY);
  if (page === undefined || page.items.length === 0) return null;
  return (
    <Sheet
      title="Lately withdrawn"
      aside={<MoreLink to="/parts?standing=withdrawn" text="All withdrawn" />}
      flush
    >
      <RowTable
        label="Lately withdrawn"
        columns={COLUMNS}
        rows={page.items}
        keyOf={(part) => part.id}
        pathOf={(part) => pathOf(part.number)}
      />
    </Sheet>
  );
}
