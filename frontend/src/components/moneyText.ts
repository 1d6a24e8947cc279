import { formatMoney, InputError, money, parseMoney } from '@stageyard/libs/units';

/** What a person typed as an amount, read: whole minor units, nothing at all, or a reason to refuse it. */
export type MoneyReading =
  { kind: 'blank' } | { kind: 'money'; minor: number } | { kind: 'problem'; message: string };

const DECIMAL_COMMA = /^\d+,\d{1,2}$/;
const THOUSANDS_OR_DECIMALS = /^[1-9]\d{0,2},\d{3}$/;

/**
 * Reads a typed amount of a currency, above 0, into whole minor units; it never passes through a floating figure.
 * A decimal comma is welcome as in every other figure, and `1,400` is refused since it could mean 1400 or 1.4.
 * @param currency ISO 4217; decides how many decimals there may be
 */
export function readMoney(typed: string, currency: string): MoneyReading {
  const compact = typed.replace(/[\s\u00A0\u2009\u202F]/g, '');
  if (compact === '') return { kind: 'blank' };
  if (THOUSANDS_OR_DECIMALS.test(compact)) {
    const [whole = '', rest = ''] = compact.split(',');
    const asDecimal = `${whole}.${rest}`.replace(/\.?0+$/, '');
    return problem(
      `“${typed.trim()}” can be read as ${whole}${rest} or as ${asDecimal}. Write it without the comma.`,
    );
  }
  try {
    const { minor } = parseMoney(DECIMAL_COMMA.test(compact) ? compact.replace(',', '.') : compact, currency);
    return minor > 0 ? { kind: 'money', minor } : problem('An amount must be above 0.');
  } catch (error) {
    if (error instanceof InputError) return problem(error.errors[0]?.message ?? error.message);
    throw error;
  }
}

const problem = (message: string): MoneyReading => ({ kind: 'problem', message });

/** Whole minor units, or null when the text is blank or no amount. */
export function minorOrNull(typed: string, currency: string): number | null {
  const reading = readMoney(typed, currency);
  return reading.kind === 'money' ? reading.minor : null;
}

/** `1,234.50`: an amount without its currency, which stands beside it. */
export function amountWords(minor: number, currency: string): string {
  return formatMoney(money(minor, currency)).replace(` ${currency}`, '');
}

/** `1,234.50 EUR` */
export function moneyWords(minor: number, currency: string): string {
  return formatMoney(money(minor, currency));
}

/** `1234.50`: as it stands in a field, so that it reads back the same; blank for nothing. */
export function amountText(minor: number | null, currency: string): string {
  return minor === null ? '' : amountWords(minor, currency).replaceAll(',', '');
}
