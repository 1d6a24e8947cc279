import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useForm, useWatch } from 'react-hook-form';
import { describe, expect, it } from 'vitest';
import { BreakEditor } from './BreakEditor';
import { breakQuantityProblem } from './breakProblem';
import { newOfferForm, offerBody, type BreakRow, type OfferForm } from './offerForm';

function Form({ breaks }: { breaks?: BreakRow[] }) {
  const form = useForm<OfferForm>({ defaultValues: newOfferForm(breaks && { breaks }) });
  const typed = useWatch({ control: form.control }) as OfferForm;
  return (
    <form>
      <BreakEditor form={form} unit="pcs" />
      <output>{JSON.stringify(offerBody(typed).breaks)}</output>
    </form>
  );
}

describe('the price break editor', () => {
  it('adds, fills and removes rows by the keyboard alone, into whole minor units', async () => {
    const user = userEvent.setup({ delay: null });
    render(<Form />);
    await user.click(screen.getByLabelText('Price, row 1'));
    await user.keyboard('12.40{Enter}10{Enter}11,1{Enter}100{Enter}9.85{Enter}');
    expect(screen.getByLabelText('From quantity, row 4')).toHaveFocus();
    await user.keyboard('{Backspace}');
    expect(screen.queryByLabelText('From quantity, row 4')).toBeNull();
    expect(screen.getByLabelText('Price, row 3')).toHaveFocus();
    // Cents: 12.40, 11.10 and 9.85 EUR.
    expect(JSON.parse(screen.getByRole('status').textContent)).toEqual([
      { quantity: 1, unitPrice: 1240 },
      { quantity: 10, unitPrice: 1110 },
      { quantity: 100, unitPrice: 985 },
    ]);
    await user.click(screen.getByLabelText('Remove the price in row 2'));
    expect(JSON.parse(screen.getByRole('status').textContent)).toEqual([
      { quantity: 1, unitPrice: 1240 },
      { quantity: 100, unitPrice: 985 },
    ]);
  });

  it('keeps one row at least', () => {
    render(<Form />);
    expect(screen.getByLabelText('Remove the price in row 1')).toBeDisabled();
  });

  it('takes twenty rows at most', async () => {
    const user = userEvent.setup({ delay: null });
    render(
      <Form breaks={Array.from({ length: 19 }, (_, row) => ({ quantity: `${row + 1}`, price: '7' }))} />,
    );
    await user.click(screen.getByLabelText('Price, row 19'));
    await user.keyboard('{Enter}20{Enter}6{Enter}');
    expect(screen.getAllByLabelText(/^Price, row/)).toHaveLength(20);
    expect(screen.getByText('An offer has at most 20 price breaks.')).toBeVisible();
  });
});

describe('what is wrong with a quantity', () => {
  const rows = (...quantities: string[]): BreakRow[] =>
    quantities.map((quantity) => ({ quantity, price: '1' }));

  it('must rise from row to row', () => {
    expect(breakQuantityProblem(rows('1', '10', '100'), 2)).toBeNull();
    expect(breakQuantityProblem(rows('1', '100', '10'), 2)).toBe(
      'Must be above 100, the quantity before it.',
    );
    expect(breakQuantityProblem(rows('1', '10', '10'), 2)).toBe(
      'There are two prices from 10. Keep one of them.',
    );
  });

  it('must be above nothing, within bounds, and a number', () => {
    expect(breakQuantityProblem(rows('0'), 0)).toMatch(/above 0/);
    expect(breakQuantityProblem(rows('-1'), 0)).toMatch(/above 0/);
    expect(breakQuantityProblem(rows('1000001'), 0)).toMatch(/at most 1,000,000/);
    expect(breakQuantityProblem(rows('ten'), 0)).toMatch(/not a number/);
  });

  it('does not count rows left blank, unless every row is', () => {
    const blank = { quantity: '', price: '' };
    expect(breakQuantityProblem([...rows('1'), blank, ...rows('5')], 1)).toBeNull();
    expect(breakQuantityProblem([...rows('7'), blank, ...rows('5')], 2)).toMatch(/above 7/);
    expect(breakQuantityProblem([blank, blank], 0)).toBe('Give at least one price.');
  });
});
