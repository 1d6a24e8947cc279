import Box from '@mui/material/Box';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import { useTrainChanges } from '../../../api/hooks/useTrain';
import { asProblem } from '../../../api/problem';
import { CopyTable } from '../../../components/CopyTable';
import { EmptyState } from '../../../components/EmptyState';
import { ErrorState } from '../../../components/ErrorState';
import { formatWhen } from '../../../components/figures';
import { LoadingRows } from '../../../components/LoadingRows';
import { Sheet } from '../../../components/Sheet';

/** Who changed the train, when, and what. */
export function ChangesList({ code }: { code: string }) {
  const { data, error, mutate } = useTrainChanges(code);
  return (
    <Sheet title="Changes" flush>
      {!data && error === undefined && <LoadingRows rows={4} label="Loading the changes" />}
      {!data && error !== undefined && (
        <ErrorState problem={asProblem(error)} what="the changes" onRetry={() => void mutate()} />
      )}
      {data?.items.length === 0 && <EmptyState title="Nothing has been changed yet" />}
      {data && data.items.length > 0 && (
        <Box sx={{ overflowX: 'auto' }}>
          <CopyTable label="Changes">
            <TableHead>
              <TableRow>
                <TableCell>When</TableCell>
                <TableCell>Who</TableCell>
                <TableCell>What</TableCell>
              </TableRow>
            </TableHead>
            <TableBody>
              {data.items.map((change) => (
                <TableRow key={change.id}>
                  <TableCell sx={{ whiteSpace: 'nowrap' }}>{formatWhen(change.at)}</TableCell>
                  <TableCell sx={{ whiteSpace: 'nowrap' }}>{change.by}</TableCell>
                  <TableCell>{change.summary}</TableCell>
                </TableRow>
              ))}
            </TableBody>
          </CopyTable>
        </Box>
      )}
    </Sheet>
  );
}
