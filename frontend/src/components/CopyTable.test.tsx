import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it, vi } from 'vitest';
import { renderAt } from '../testing/renderAt';
import { CopyTable } from './CopyTable';

const SUPPLIERS = [
  { name: 'Tarn Gearworks', total: '1,234.50 EUR', minor: '1234.50' },
  { name: 'Inlet Bearings', total: '80.00 EUR', minor: '80.00' },
  { name: '=cmd', total: '–', minor: '' },
];

function show(opens = false, onOpen = vi.fn<(name: string) => void>()) {
  const user = userEvent.setup();
  renderAt(
    '/',
    '/',
    <CopyTable label="Totals" opens={opens}>
      <TableHead>
        <TableRow>
          <TableCell>Supplier</TableCell>
          <TableCell>Total EUR</TableCell>
        </TableRow>
      </TableHead>
      <TableBody>
        {SUPPLIERS.map(({ name, total, minor }) => (
          <TableRow key={name} onClick={() => onOpen(name)}>
            <TableCell>
              {name}
              <div>{name === 'Tarn Gearworks' && 'closed'}</div>
              <button type="button">Edit</button>
            </TableCell>
            <TableCell data-copy={minor}>{total}</TableCell>
          </TableRow>
        ))}
      </TableBody>
    </CopyTable>,
  );
  return { user, onOpen };
}

const copied = () => navigator.clipboard.readText();
const row = (name: RegExp) => screen.getByRole('row', { name });

it('copies the rows that were clicked, heads first, money as plain figures', async () => {
  const { user } = show();
  await user.click(screen.getByText('80.00 EUR'));
  await user.keyboard('{Control>}');
  await user.click(screen.getByText('1,234.50 EUR'));
  await user.keyboard('{/Control}');
  const bar = screen.getByRole('toolbar', { name: 'Selected rows' });
  expect(within(bar).getByText('2 rows selected')).toBeVisible();
  await user.click(within(bar).getByRole('button', { name: 'Copy' }));
  // In the order of the table, a line inside a cell parted by a blank, the button left out.
  expect(await copied()).toBe('Supplier\tTotal EUR\nTarn Gearworks closed\t1234.50\nInlet Bearings\t80.00');
  expect(await screen.findByText('2 rows copied; paste into a spreadsheet.')).toBeVisible();
  await user.click(within(bar).getByRole('button', { name: 'Clear' }));
  expect(screen.queryByRole('toolbar')).toBeNull();
});

it('is reached and used by keyboard alone, and runs no formula in a spreadsheet', async () => {
  const { user } = show();
  await user.tab();
  expect(row(/Tarn Gearworks/)).toHaveFocus();
  await user.keyboard('{ArrowDown}{Shift>}{ArrowDown}{/Shift}');
  expect(row(/=cmd/)).toHaveFocus();
  expect(row(/=cmd/)).toHaveAttribute('aria-selected', 'true');
  expect(row(/Inlet/)).toHaveAttribute('aria-selected', 'true');
  expect(row(/Tarn/)).toHaveAttribute('aria-selected', 'false');
  await user.keyboard('{Control>}c{/Control}');
  expect(await copied()).toBe("Supplier\tTotal EUR\nInlet Bearings\t80.00\n'=cmd\t");
  await user.keyboard('{Escape}');
  expect(row(/Inlet/)).toHaveAttribute('aria-selected', 'false');
});

it('leads on with a plain click or Enter and selects with Ctrl, where rows lead on', async () => {
  const { user, onOpen } = show(true);
  await user.click(screen.getByText('80.00 EUR'));
  expect(onOpen).toHaveBeenLastCalledWith('Inlet Bearings');
  expect(row(/Inlet/)).toHaveAttribute('aria-selected', 'false');
  await user.keyboard('{Control>}');
  await user.click(screen.getByText('1,234.50 EUR'));
  await user.keyboard('{/Control}');
  expect(onOpen).toHaveBeenCalledTimes(1);
  expect(row(/Tarn/)).toHaveAttribute('aria-selected', 'true');
  row(/=cmd/).focus();
  await user.keyboard('{Enter}');
  expect(onOpen).toHaveBeenLastCalledWith('=cmd');
});

it('lets go of the selection when something else on the page is pressed', async () => {
  const { user } = show();
  await user.click(screen.getByText('80.00 EUR'));
  expect(screen.getByRole('toolbar')).toBeVisible();
  await user.click(screen.getByTestId('address'));
  expect(screen.queryByRole('toolbar')).toBeNull();
});
