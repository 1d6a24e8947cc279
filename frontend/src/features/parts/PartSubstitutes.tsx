import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import TextField from '@mui/material/TextField';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { Link as RouterLink } from 'react-router-dom';
import { useMe } from '../../api/hooks/useMe';
import { usePartSubstitutes } from '../../api/hooks/usePartSubstitutes';
import type { Part, Substitute } from '../../api/types';
import { CopyTable } from '../../components/CopyTable';
import { EmptyState } from '../../components/EmptyState';
import { ErrorState } from '../../components/ErrorState';
import { formatQuantity, NOTHING } from '../../components/figures';
import { LoadingRows } from '../../components/LoadingRows';
import { moneyWords } from '../../components/moneyText';
import { numberOrNull, numberProblem } from '../../components/NumberField';
import { Sheet } from '../../components/Sheet';
import { ToCheck } from '../../components/substitutes/SubstituteLine';
import { arrivalWords } from '../../components/substitutes/substituteWords';
import { useSettled } from '../../components/useSettled';

/** Parts that drop in for this one, the soonest here first; price and supplier for those who see prices. */
export function PartSubstitutes({ part }: { part: Pick<Part, 'number' | 'unit'> }) {
  const { can } = useMe();
  const limits = { required: true, min: 0, above: true, max: 1_000_000, whole: part.unit === 'pcs' };
  const [typed, setTyped] = useState('1');
  const settled = useSettled(typed, 250);
  const [asked, setAsked] = useState(1);
  const quantity = numberProblem(settled, limits) === null ? numberOrNull(settled) : null;
  // A figure that cannot be read leaves the last answer on the screen.
  if (quantity !== null && quantity !== asked) setAsked(quantity);
  const { substitutes, problem, mutate } = usePartSubstitutes(part.number, asked);
  const wrong = numberProblem(typed, limits, part.unit);
  const items = substitutes?.items ?? [];
  return (
    <Sheet title="Substitutes" flush>
      {substitutes === undefined && problem === null && (
        <LoadingRows rows={3} label="Loading the substitutes" />
      )}
      {substitutes === undefined && problem !== null && (
        <ErrorState problem={problem} onRetry={() => void mutate()} what="the substitutes" />
      )}
      {substitutes && items.length === 0 && (
        <EmptyState title="No other part drops in">
          None of the cleared parts fits in its place: same kind, same fit, material at least as strong.
        </EmptyState>
      )}
      {items.length > 0 && (
        <>
          <Box sx={{ px: 1.25, pb: 1, display: 'flex', gap: 2, alignItems: 'flex-end', flexWrap: 'wrap' }}>
            <TextField
              id="substitutes-quantity"
              label={`At quantity, ${part.unit}`}
              value={typed}
              onChange={(event) => setTyped(event.target.value)}
              error={wrong !== null}
              helperText={wrong}
              autoComplete="off"
              sx={{ width: 132 }}
              slotProps={{ htmlInput: { inputMode: 'decimal', className: 'number', maxLength: 20 } }}
            />
            <Typography variant="body2" color="textSecondary" sx={{ flex: '1 1 220px', pb: 0.5 }}>
              They fit in its place; look at what differs before ordering.
            </Typography>
          </Box>
          <TableContainer>
            <CopyTable label="Substitutes">
              <TableHead>
                <TableRow>
                  <TableCell>Part</TableCell>
                  <TableCell>Here</TableCell>
                  <TableCell align="right" sx={WIDE}>{`Shelf, ${part.unit}`}</TableCell>
                  {can('prices.read') && <TableCell align="right">Price</TableCell>}
                  <TableCell sx={WIDE}>What differs, what to check</TableCell>
                </TableRow>
              </TableHead>
              <TableBody>
                {items.map((item) => (
                  <SubstituteRow
                    key={item.part.number}
                    item={item}
                    unit={part.unit}
                    priced={can('prices.read')}
                  />
                ))}
              </TableBody>
            </CopyTable>
          </TableContainer>
          {substitutes && substitutes.leftOut > 0 && (
            <Typography variant="body2" color="textSecondary" sx={{ px: 1.25, py: 1 }}>
              {`${substitutes.leftOut} more drop in; they come later or cost more.`}
            </Typography>
          )}
        </>
      )}
    </Sheet>
  );
}

interface SubstituteRowProps {
  item: Substitute;
  unit: string;
  priced: boolean;
}

function SubstituteRow({ item, unit, priced }: SubstituteRowProps) {
  const { part, offer, differences, toCheck, onShelf, successor } = item;
  return (
    <TableRow sx={{ verticalAlign: 'top' }}>
      <TableCell>
        <Link component={RouterLink} to={`/parts/${encodeURIComponent(part.number)}`} className="part-number">
          {part.number}
        </Link>
        <Box sx={quietSx}>
          {part.description}
          {successor && ' · named as the successor'}
        </Box>
        <Box sx={{ display: { sm: 'none' } }}>
          <Box sx={quietSx}>{differences.join(' · ')}</Box>
          <ToCheck toCheck={toCheck} />
        </Box>
      </TableCell>
      <TableCell sx={{ whiteSpace: 'nowrap' }}>{arrivalWords(item)}</TableCell>
      <TableCell align="right" sx={WIDE}>
        {formatQuantity(onShelf)}
      </TableCell>
      {priced && (
        <TableCell align="right">
          {offer === null ? (
            NOTHING
          ) : (
            <>
              <Box sx={{ whiteSpace: 'nowrap' }}>{moneyWords(offer.lineTotal, offer.currency)}</Box>
              <Box sx={quietSx}>{`${formatQuantity(offer.orderQuantity)} ${unit}, ${offer.supplier}`}</Box>
            </>
          )}
        </TableCell>
      )}
      <TableCell sx={WIDE}>
        <Box sx={quietSx}>
          {differences.length + toCheck.length === 0 ? 'nothing' : differences.join(' · ')}
        </Box>
        <ToCheck toCheck={toCheck} />
      </TableCell>
    </TableRow>
  );
}

/** On a narrow screen these stand under the part. */
const WIDE = { display: { xs: 'none', sm: 'table-cell' } } as const;
const quietSx = { color: 'text.secondary', fontSize: '0.8125rem' } as const;
