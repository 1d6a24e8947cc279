import type { PartSummary } from '../../api/types';
import { formatDay, NOTHING } from '../../components/figures';
import { CodeLink } from './CodeLink';
import { RowTable, type RowColumn } from './RowTable';

const pathOf = (part: PartSummary) => `/parts/${encodeURIComponent(part.number)}`;

const COLUMNS: RowColumn<PartSummary>[] = [
  { name: 'Number', cell: (part) => <CodeLink to={pathOf(part)} code={part.number} /> },
  { name: 'Description', cell: (part) => part.description },
  { name: 'Material', wideOnly: true, cell: (part) => part.material ?? NOTHING },
  { name: 'By', wideOnly: true, cell: (part) => part.updatedBy },
  { name: 'Changed', figure: true, cell: (part) => formatDay(part.updatedAt) },
];

export function DraftRows({ parts }: { parts: readonly PartSummary[] }) {
  return (
    <RowTable
      label="Drafts to clear"
      columns={COLUMNS}
      rows={parts}
      keyOf={(part) => part.id}
      pathOf={pathOf}
    />
  );
}
