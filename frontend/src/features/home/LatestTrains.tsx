import Link from '@mui/material/Link';
import { useMe } from '../../api/hooks/useMe';
import { bomWorkbookUrl } from '../../api/hooks/useTrainBom';
import { useTrains } from '../../api/hooks/useTrains';
import { asProblem } from '../../api/problem';
import type { TrainSummary } from '../../api/types';
import { EmptyState } from '../../components/EmptyState';
import { ErrorState } from '../../components/ErrorState';
import { LoadingRows } from '../../components/LoadingRows';
import { Sheet } from '../../components/Sheet';
import { MoreLink } from './MoreLink';
import { TrainRows } from './TrainRows';

const QUERY = { sort: '-updatedAt', size: 10 } as const;

/** The trains changed last, for who buys or looks up rather than designs; the workbook is one click away. */
export function LatestTrains() {
  const { can } = useMe();
  const { data, error, mutate } = useTrains(QUERY);
  const takes = can('bom.export');
  return (
    <Sheet
      title={takes ? 'Trains and their bills of materials' : 'Trains'}
      aside={<MoreLink to="/trains" text="All trains" />}
      flush
    >
      {data === undefined && error !== undefined && (
        <ErrorState problem={asProblem(error)} onRetry={() => void mutate()} what="the trains" />
      )}
      {data === undefined && error === undefined && <LoadingRows rows={4} label="Loading the trains" />}
      {data?.items.length === 0 && (
        <EmptyState title="No train yet">A designer adopts one from a brief; it then stands here.</EmptyState>
      )}
      {data !== undefined && data.items.length > 0 && (
        <TrainRows label="Trains" trains={data.items} last={takes ? WORKBOOK : undefined} />
      )}
    </Sheet>
  );
}

const WORKBOOK = {
  name: 'BOM',
  figure: true,
  wideOnly: true,
  cell: ({ code }: TrainSummary) => (
    <Link href={bomWorkbookUrl(code)} download aria-label={`Download the BOM of ${code}`}>
      Download
    </Link>
  ),
};
