import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Link from '@mui/material/Link';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { Link as RouterLink } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { useStockItem } from '../../api/hooks/useStockItem';
import type { MovementKind, StockItem } from '../../api/types';
import { CopyTable } from '../../components/CopyTable';
import { EmptyState } from '../../components/EmptyState';
import { ErrorState } from '../../components/ErrorState';
import { formatDay } from '../../components/figures';
import { LoadingRows } from '../../components/LoadingRows';
import { Sheet } from '../../components/Sheet';
import { LeastStockDialog } from '../../components/stock/LeastStockDialog';
import { MovementDialog } from '../../components/stock/MovementDialog';
import { ACT_NAMES, figureWords, MOVEMENT_KINDS, quantityWords } from '../../components/stock/stockWords';
import { LastMovements } from './LastMovements';

/** Where the part lies and how much of it; booking and the least stock for those who may. */
export function PartShelf({ number }: { number: string }) {
  const { can } = useMe();
  const { item, problem, mutate } = useStockItem(number);
  const [act, setAct] = useState<MovementKind | null>(null);
  const [watching, setWatching] = useState(false);
  const mayBook = can('stock.book');
  if (!can('stock.read')) return null;
  const all = `/stock?tab=movements&part=${encodeURIComponent(number)}`;
  return (
    <Sheet
      title="Shelf"
      flush
      aside={
        item && item.places.length > 0 ? (
          <Link component={RouterLink} to={all}>
            All movements
          </Link>
        ) : null
      }
    >
      {item === undefined && problem === null && <LoadingRows rows={3} label="Loading the shelf" />}
      {item === undefined && problem !== null && (
        <ErrorState problem={problem} onRetry={() => void mutate()} what="the shelf" />
      )}
      {item && (
        <>
          <Box sx={headSx}>
            <Typography component="div" sx={{ flex: '1 1 160px' }}>
              <ShelfWords item={item} />
            </Typography>
            {mayBook && (
              <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 0.5 }}>
                {MOVEMENT_KINDS.map((kind) => (
                  <Button key={kind} onClick={() => setAct(kind)}>
                    {ACT_NAMES[kind]}
                  </Button>
                ))}
                <Button onClick={() => setWatching(true)}>Least stock</Button>
              </Box>
            )}
          </Box>
          {item.places.length > 0 ? (
            <>
              <Places item={item} />
              <LastMovements number={number} />
            </>
          ) : (
            <EmptyState title="It never lay on a shelf">
              {mayBook
                ? 'Book what a delivery brings, or count what lies there already.'
                : 'A librarian or a purchaser books deliveries and counts.'}
            </EmptyState>
          )}
        </>
      )}
      {act !== null && <MovementDialog number={number} kind={act} onClose={() => setAct(null)} />}
      {watching && item && <LeastStockDialog item={item} onClose={() => setWatching(false)} />}
    </Sheet>
  );
}

function ShelfWords({ item }: { item: StockItem }) {
  const { quantity, unit, leastStock, low } = item;
  return (
    <>
      <b className="number">{quantityWords(quantity, unit)}</b> on the shelf
      {leastStock !== null && ` · low below ${quantityWords(leastStock, unit)}`}
      {low && leastStock !== null && (
        <Box component="span" sx={{ color: 'error.main', fontWeight: 600 }}>
          {' '}
          · low, short by {quantityWords(leastStock - quantity, unit)}
        </Box>
      )}
    </>
  );
}

function Places({ item }: { item: StockItem }) {
  return (
    <TableContainer>
      <CopyTable label="Places">
        <TableHead>
          <TableRow>
            <TableCell>Place</TableCell>
            <TableCell align="right">There, {item.unit}</TableCell>
            <TableCell align="right">Counted</TableCell>
          </TableRow>
        </TableHead>
        <TableBody>
          {item.places.map(({ place, quantity, countedAt }) => (
            <TableRow key={place}>
              <TableCell>{place}</TableCell>
              <TableCell align="right">{figureWords(quantity)}</TableCell>
              <TableCell align="right">{countedAt === null ? 'never' : formatDay(countedAt)}</TableCell>
            </TableRow>
          ))}
        </TableBody>
      </CopyTable>
    </TableContainer>
  );
}

const headSx = {
  display: 'flex',
  flexWrap: 'wrap',
  alignItems: 'center',
  gap: 1,
  px: 1.25,
  pb: 0.75,
} as const;
