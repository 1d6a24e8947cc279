import { readDecimal } from '../../components/decimalText';
import { formatPlain } from '../../components/figures';
import { moneyProblem } from '../../components/MoneyField';
import { numberProblem } from '../../components/NumberField';
import { isBlankBreak, type BreakRow } from './offerForm';

/** As the server allows. */
export const MOST_BREAKS = 20;

/**
 * What is wrong with the quantity of one row; null when nothing is. Rows left blank do not count, except that one
 * price at least must be given.
 */
export function breakQuantityProblem(rows: readonly BreakRow[], index: number): string | null {
  const row = rows[index];
  if (row === undefined) return null;
  if (isBlankBreak(row)) return rows.every(isBlankBreak) && index === 0 ? 'Give at least one price.' : null;
  const wrong = numberProblem(row.quantity, { required: true, min: 0, above: true, max: 1_000_000 });
  if (wrong !== null) return wrong;
  const quantity = valueOf(row);
  const before = rows
    .slice(0, index)
    .filter((each) => !isBlankBreak(each))
    .at(-1);
  const least = before === undefined ? null : valueOf(before);
  if (quantity === null || least === null || quantity > least) return null;
  return quantity === least
    ? `There are two prices from ${formatPlain(quantity, 3)}. Keep one of them.`
    : `Must be above ${formatPlain(least, 3)}, the quantity before it.`;
}

/** What is wrong with the price of one row; null when nothing is. Rows left blank do not count. */
export function breakPriceProblem(rows: readonly BreakRow[], index: number, currency: string): string | null {
  const row = rows[index];
  if (row === undefined) return null;
  if (isBlankBreak(row)) return rows.every(isBlankBreak) && index === 0 ? 'Give a price.' : null;
  return moneyProblem(row.price, currency, true);
}

function valueOf({ quantity }: BreakRow): number | null {
  const reading = readDecimal(quantity);
  return reading.kind === 'number' ? reading.value : null;
}
