import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import { Link as RouterLink } from 'react-router-dom';
import type { PartOffers } from '../../api/types';
import { CopyTable } from '../../components/CopyTable';
import { formatQuantity, NOTHING } from '../../components/figures';
import { amountWords } from '../../components/moneyText';
import {
  breaksWords,
  leadTimeWords,
  priceUnitWords,
  validityWords,
} from '../../components/offers/offerWords';
import { OfferStateWord } from '../../components/offers/OfferStateWord';
import { PriceAge } from '../../components/offers/PriceAge';

type Row = PartOffers['offers'][number];

/** Every offer for the part, ranked by the rule: what must be ordered, what it comes to, when it arrives. */
export function PartOfferTable({ offers: { unit, offers } }: { offers: PartOffers }) {
  return (
    <TableContainer>
      <CopyTable label="Offers">
        <TableHead>
          <TableRow>
            <TableCell>Supplier</TableCell>
            <TableCell align="right">Order, {unit}</TableCell>
            <TableCell align="right" sx={WIDE_ONLY}>
              Price
            </TableCell>
            <TableCell align="right">Total</TableCell>
            <TableCell align="right" sx={WIDE_ONLY}>
              Here in
            </TableCell>
            <TableCell sx={WIDE_ONLY}>State</TableCell>
          </TableRow>
        </TableHead>
        <TableBody>
          {offers.map((offer) => (
            <OfferRow key={offer.id} offer={offer} />
          ))}
        </TableBody>
      </CopyTable>
    </TableContainer>
  );
}

function OfferRow({ offer }: { offer: Row }) {
  const { price, supplier, currency } = offer;
  return (
    <TableRow
      sx={{
        '&:last-of-type > *': { borderBottom: 0 },
        '& > td': { verticalAlign: 'top' },
        ...(offer.chosen
          ? { boxShadow: (theme) => `inset 3px 0 0 ${theme.vars.palette.secondary.main}` }
          : {}),
      }}
    >
      <TableCell>
        <Link component={RouterLink} to={`/offers/${encodeURIComponent(offer.id)}`}>
          {supplier.name}
        </Link>
        {offer.chosen && <b> · taken by the rule</b>}
        {supplier.standing === 'closed' && ' · closed supplier'}
        <Box sx={SMALL}>
          {offer.supplierPartNumber !== '' && `${offer.supplierPartNumber} · `}
          {breaksWords(offer)}
        </Box>
        <Box sx={{ ...SMALL, display: { sm: 'none' } }}>
          <OfferStateWord state={offer.state} />, {validityWords(offer)}, price <PriceAge offer={offer} />
        </Box>
      </TableCell>
      <TableCell align="right" sx={{ whiteSpace: 'nowrap' }}>
        {price === null ? NOTHING : formatQuantity(price.orderQuantity)}
        {price !== null && price.surplus > 0 && (
          <Box sx={SMALL}>{formatQuantity(price.surplus)} left over</Box>
        )}
      </TableCell>
      <TableCell align="right" sx={{ ...WIDE_ONLY, whiteSpace: 'nowrap' }}>
        {price === null ? NOTHING : amountWords(price.unitPrice, currency)}
        {price !== null && <Box sx={SMALL}>{priceUnitWords(offer)}</Box>}
      </TableCell>
      <TableCell align="right" sx={{ whiteSpace: 'nowrap' }}>
        {price === null ? NOTHING : amountWords(price.lineTotal.minor, price.lineTotal.currency)}
        {price !== null && <Box sx={SMALL}>{price.lineTotal.currency}</Box>}
      </TableCell>
      <TableCell align="right" sx={{ ...WIDE_ONLY, whiteSpace: 'nowrap' }}>
        {leadTimeWords(offer.arrivalDays)}
      </TableCell>
      <TableCell sx={WIDE_ONLY}>
        <OfferStateWord state={offer.state} />
        <Box sx={SMALL}>{validityWords(offer)}</Box>
        <Box sx={SMALL}>
          price <PriceAge offer={offer} />
        </Box>
      </TableCell>
    </TableRow>
  );
}

const SMALL = { color: 'text.secondary', fontSize: '0.75rem' } as const;
const WIDE_ONLY = { display: { xs: 'none', sm: 'table-cell' } } as const;
