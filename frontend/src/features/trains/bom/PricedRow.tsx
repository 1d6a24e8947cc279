import Check from '@mui/icons-material/Check';
import PanTool from '@mui/icons-material/PanToolAltOutlined';
import TrendingDown from '@mui/icons-material/TrendingDown';
import WarningAmber from '@mui/icons-material/WarningAmberOutlined';
import Box from '@mui/material/Box';
import TableCell from '@mui/material/TableCell';
import TableRow from '@mui/material/TableRow';
import type { ComponentProps, ReactNode } from 'react';
import type { TrainPriceLine } from '../../../api/types';
import { formatDay, formatPlain, NOTHING } from '../../../components/figures';
import { moneyWords } from '../../../components/moneyText';
import { ageWords, leadTimeWords } from '../../../components/offers/offerWords';
import { PartLink } from '../PartLink';
import { partNumberWords, quantityWords } from './bomCells';
import { cellSx, NOT_ON_PHONE, PHONE_ONLY } from './pricedColumns';
import {
  endsSoonDays,
  endsSoonWords,
  marksOf,
  noPriceWords,
  orderWords,
  unitPriceWords,
  type PricedLine,
} from './pricedLine';

interface PricedRowProps {
  line: PricedLine;
  on: string;
  menu: ReactNode;
  rowProps: ComponentProps<typeof TableRow>;
}

const quiet = { color: 'text.secondary', fontSize: '0.75rem' } as const;
const mark = { fontSize: 15, verticalAlign: '-0.18em', ml: 0.5 } as const;

/** One line: on a laptop a single line of text, on a phone its part, words and price under each other. */
export function PricedRow({ line: { line, priced }, on, menu, rowProps }: PricedRowProps) {
  const price = priced?.price ?? null;
  const needed = priced ? quantityWords({ quantity: priced.needed, unit: line.unit }) : quantityWords(line);
  return (
    <TableRow hover {...rowProps} sx={{ verticalAlign: { xs: 'top', md: 'middle' } }}>
      <TableCell align="right" sx={cellSx('Find')}>
        {line.findNumber}
      </TableCell>
      <TableCell sx={cellSx('Part')}>
        <PartNumber line={line} />
      </TableCell>
      <TableCell sx={cellSx('Description')} title={line.description}>
        <Box sx={PHONE_ONLY}>
          <PartNumber line={line} />
        </Box>
        {line.flags.length > 0 && (
          <WarningAmber
            titleAccess={`Look at this before ordering: ${line.flags.join('; ')}`}
            sx={{ ...mark, ml: 0, mr: 0.5, color: 'warning.main' }}
          />
        )}
        <Box component="span" sx={{ whiteSpace: { xs: 'normal', md: 'nowrap' } }}>
          {line.description}
        </Box>
        {line.replaces !== null && (
          <Box component="span" sx={{ ...quiet, ml: 0.75 }}>
            {`instead of ${line.replaces.partNumber ?? line.replaces.description}`}
          </Box>
        )}
        {line.extraLineId !== null && (
          <Box component="span" sx={{ ...quiet, ml: 0.75 }}>
            added
          </Box>
        )}
        {priced && (
          <Box sx={{ ...PHONE_ONLY, ...quiet, whiteSpace: 'normal' }}>
            {[
              price?.supplier.name,
              price?.leadTimeDays != null && leadTimeWords(price.leadTimeDays),
              priced.onShelf !== null && `${formatPlain(priced.onShelf, 3)} on the shelf`,
              ...(price === null ? [] : marksOf(priced, on)),
            ]
              .filter(Boolean)
              .join(' · ')}
          </Box>
        )}
      </TableCell>
      <TableCell align="right" sx={cellSx('Needed')} title={`${quantityWords(line)} in each`}>
        {needed}
      </TableCell>
      <ShelfCell priced={priced} />
      <SupplierCell priced={priced} />
      <TableCell align="right" sx={cellSx('Order')}>
        {priced && orderWords(priced)}
        {price?.cheaperAt && (
          <TrendingDown
            titleAccess={`Ordering ${formatPlain(price.cheaperAt.orderQuantity, 3)} costs less: ${moneyWords(price.cheaperAt.lineTotal, price.currency)}`}
            sx={{ ...mark, color: 'info.main' }}
          />
        )}
      </TableCell>
      <TableCell align="right" sx={cellSx('Unit price')}>
        {price && unitPriceWords(price)}
      </TableCell>
      <TableCell align="right" sx={{ ...cellSx('Line total'), fontWeight: 600 }}>
        {price ? moneyWords(price.lineTotal, price.currency) : <NoPrice priced={priced} onPhone />}
        <Box sx={{ ...PHONE_ONLY, ...quiet, fontWeight: 400 }}>{needed}</Box>
      </TableCell>
      <TableCell align="right" sx={cellSx('Lead')}>
        {price && (price.leadTimeDays === null ? NOTHING : `${price.leadTimeDays} d`)}
      </TableCell>
      <TableCell sx={cellSx('Price age')}>{price && <AgeAndEnd price={price} on={on} />}</TableCell>
      <TableCell sx={{ ...cellSx('Actions'), '&&': { p: 0 } }}>{menu}</TableCell>
    </TableRow>
  );
}

function PartNumber({ line }: Pick<PricedLine, 'line'>) {
  if (line.partNumber !== null) return <PartLink number={line.partNumber} />;
  return (
    <Box component="span" sx={{ color: 'text.secondary' }}>
      {partNumberWords(line)}
    </Box>
  );
}

/** What lies there; that it is enough is said, not only coloured. */
function ShelfCell({ priced }: Pick<PricedLine, 'priced'>) {
  const { onShelf = null, needed = 0 } = priced ?? {};
  const enough = onShelf !== null && onShelf >= needed;
  return (
    <TableCell align="right" sx={cellSx('Shelf')} title={enough ? 'Enough for all' : undefined}>
      {formatPlain(onShelf, 3)}
      {enough && <Check titleAccess="enough for all" sx={{ ...mark, color: 'success.main' }} />}
    </TableCell>
  );
}

function SupplierCell({ priced }: Pick<PricedLine, 'priced'>) {
  const price = priced?.price ?? null;
  return (
    <TableCell sx={cellSx('Supplier')} title={price?.supplier.name}>
      {price ? price.supplier.name : <NoPrice priced={priced} />}
      {price?.chosenBy === 'person' && <PanTool titleAccess="chosen by hand" sx={mark} />}
    </TableCell>
  );
}

/** Why there is no price; what is made here needs none. */
function NoPrice({ priced, onPhone = false }: Pick<PricedLine, 'priced'> & { onPhone?: boolean }) {
  const words = priced && noPriceWords(priced.reason);
  if (!words) return null;
  const made = priced.reason === 'made';
  return (
    <Box
      component="span"
      sx={{
        ...(made ? { color: 'text.secondary' } : { color: 'warning.main' }),
        fontWeight: made ? 400 : 600,
        ...(onPhone
          ? { display: { xs: 'inline', md: 'none' }, displayPrint: 'none', whiteSpace: 'normal' }
          : NOT_ON_PHONE),
      }}
    >
      {words}
    </Box>
  );
}

/** How old the price is, and that its offer ends soon; the day itself on pointing at it. */
function AgeAndEnd({ price, on }: { price: NonNullable<TrainPriceLine['price']>; on: string }) {
  const ends = endsSoonDays(price, on);
  const marked = price.tooOld || ends !== null;
  const age = price.tooOld ? `${price.ageDays} d, too old` : `${price.ageDays} d`;
  return (
    <Box
      component="span"
      title={`Priced on ${formatDay(price.pricedOn)}, ${ageWords(price.ageDays)}`}
      sx={marked ? { color: 'warning.main', fontWeight: 600 } : undefined}
    >
      {ends === null ? age : price.tooOld ? `too old, ${endsSoonWords(ends)}` : endsSoonWords(ends)}
    </Box>
  );
}
