import Table from '@mui/material/Table';
import TableBody from '@mui/material/TableBody';
import TableRow from '@mui/material/TableRow';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it } from 'vitest';
import type { OptionSupply } from '../../../api/types';
import { renderAt } from '../../../testing/renderAt';
import { newSupply } from '../../../testing/supply';
import { supplyCells, supplyHeads } from './optionRows';
import { CostCell, StockCell } from './SupplyCells';

const TWO = [
  { currency: 'EUR', minor: 123450 },
  { currency: 'JPY', minor: 98000 },
];

function show(supply: OptionSupply | undefined, loading = false) {
  renderAt(
    '/',
    '/',
    <Table>
      <TableBody>
        <TableRow>
          <CostCell supply={supply} loading={loading} />
          <StockCell supply={supply} loading={loading} />
        </TableRow>
      </TableBody>
    </Table>,
  );
  const [cost, stock] = screen.getAllByRole('cell');
  return { cost, stock };
}

it('shows the first currency and how many more there are, all of them on pointing at it', async () => {
  const { cost } = show(newSupply({ costs: TWO }));
  expect(cost).toHaveTextContent(/^1,234.50 EUR\+1$/);
  const more = screen.getByRole('button', { name: 'In all 1,234.50 EUR and 98,000 JPY' });
  await userEvent.setup().hover(more);
  expect(await screen.findByRole('tooltip')).toHaveTextContent('1,234.50 EUR and 98,000 JPY');
});

it('says that a sum is only a part', () => {
  const { cost } = show(newSupply({ costs: TWO.slice(0, 1), priced: 3, unpriced: 1 }));
  expect(cost).toHaveTextContent('1,234.50 EUR3 of 4 priced');
});

it('shows no amount where nothing is priced, and none before the answer is there', () => {
  expect(show(newSupply({ costs: [], priced: 0, unpriced: 4 })).cost).toHaveTextContent(/^not priced$/);
});

it('waits without a figure', () => {
  const { cost, stock } = show(undefined, true);
  expect(cost).toHaveTextContent(/^…$/);
  expect(stock).toHaveTextContent(/^…$/);
});

it('says how much lies on the shelf and what is to be made', () => {
  const { stock } = show(newSupply({ gears: 6, onShelf: 4, toMake: 1 }));
  expect(stock).toHaveTextContent('4 of 6 on the shelf1 to make');
});

it('copies a column a currency, so that a spreadsheet can add them', () => {
  const currencies = ['EUR', 'JPY', 'USD'];
  const heads = supplyHeads(25, currencies);
  const cells = supplyCells(newSupply({ costs: TWO, priced: 3, unpriced: 1 }), currencies);
  expect(heads.slice(0, 4)).toEqual(['Cost of 25 EUR', 'Cost of 25 JPY', 'Cost of 25 USD', 'Priced']);
  expect(cells.slice(0, 4)).toEqual(['1234.50', '98000', '', '3 of 4 priced']);
  expect(supplyCells(undefined, currencies)).toHaveLength(heads.length);
});
