import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Box from '@mui/material/Box';
import TextField from '@mui/material/TextField';
import { priceAt } from '@stageyard/libs/bill-of-materials';
import { formatMoney } from '@stageyard/libs/units';
import { useState } from 'react';
import type { Offer } from '../../api/types';
import { CopyTable } from '../../components/CopyTable';
import { formatQuantity } from '../../components/figures';
import { amountWords } from '../../components/moneyText';
import { numberOrNull, numberProblem } from '../../components/NumberField';
import { priceUnitWords } from '../../components/offers/offerWords';
import { PricedWords } from '../../components/offers/PricedWords';
import { Sheet } from '../../components/Sheet';

const Nowrap = ({ children }: { children: string }) => (
  <span style={{ whiteSpace: 'nowrap' }}>{children}</span>
);

/** The breaks of one offer, what an order at each comes to, and any other quantity on trial. */
export function OfferPrices({ offer }: { offer: Offer }) {
  const { unit } = offer.part;
  const [quantity, setQuantity] = useState('');
  const wrong = numberProblem(quantity, { min: 0, above: true, max: 1_000_000 }, unit);
  const needed = wrong === null ? numberOrNull(quantity) : null;
  return (
    <Sheet title="Prices" flush>
      <TableContainer>
        <CopyTable label="Prices">
          <TableHead>
            <TableRow>
              <TableCell align="right">From quantity, {unit}</TableCell>
              <TableCell align="right">Price, {priceUnitWords(offer)}</TableCell>
              <TableCell align="right">Least order at it</TableCell>
            </TableRow>
          </TableHead>
          <TableBody>
            {offer.breaks.map((each) => {
              const { lineTotal, orderQuantity } = priceAt(each.quantity, offer);
              return (
                <TableRow key={each.quantity}>
                  <TableCell align="right">{formatQuantity(each.quantity)}</TableCell>
                  <TableCell align="right">{amountWords(each.unitPrice, offer.currency)}</TableCell>
                  <TableCell align="right">
                    <Nowrap>{`${formatQuantity(orderQuantity)} ${unit},`}</Nowrap>{' '}
                    <Nowrap>{formatMoney(lineTotal)}</Nowrap>
                  </TableCell>
                </TableRow>
              );
            })}
          </TableBody>
        </CopyTable>
      </TableContainer>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 1.5, px: 1.25, py: 1.25 }}>
        <TextField
          label={`Try a quantity, ${unit}`}
          value={quantity}
          onChange={(event) => setQuantity(event.target.value)}
          error={wrong !== null}
          helperText={wrong}
          autoComplete="off"
          sx={{ width: 150 }}
          slotProps={{ htmlInput: { inputMode: 'decimal', className: 'number', maxLength: 20 } }}
        />
        <Box role="status" sx={{ flex: '1 1 240px', pt: { xs: 0, sm: 3 } }}>
          {needed !== null && <PricedWords price={priceAt(needed, offer)} unit={unit} />}
        </Box>
      </Box>
    </Sheet>
  );
}
