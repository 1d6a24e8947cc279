import { currencyDecimals } from './currencies.js';
import { fieldError } from './errors.js';
import { ratioToFixed } from './ratio-figures.js';
import { ratio, toRatio, type Ratio } from './ratio.js';

/** An amount in whole minor units (cents, yen, fils) of an ISO 4217 currency. Never a floating amount. */
export interface Money {
  readonly minor: number;
  readonly currency: string;
}

const AMOUNT = /^([-\u2212]?)([1-9]\d{0,2}(?:,\d{3})+|\d+)(?:\.(\d+))?$/;

/**
 * @param minor whole minor units, a safe integer; 1,250 means 12.50 EUR or 1,250 JPY
 * @throws InputError for an unknown currency or an amount that is not whole
 */
export function money(minor: number, currency: string): Money {
  decimalsOf(currency);
  if (!Number.isSafeInteger(minor)) {
    const message = 'An amount is a whole number of minor units, below 9,007,199,254,740,992.';
    throw fieldError('minor', String(minor), message);
  }
  return { minor: minor === 0 ? 0 : minor, currency };
}

/** Sum of amounts of one currency. @throws InputError when currencies differ or the sum is out of range */
export function addMoney(first: Money, ...others: Money[]): Money {
  let minor = BigInt(money(first.minor, first.currency).minor);
  for (const other of others) {
    if (other.currency !== first.currency) {
      const message = `${other.currency} cannot be added to ${first.currency}. Total each currency by itself.`;
      throw fieldError('currency', other.currency, message, first.currency);
    }
    minor += BigInt(money(other.minor, other.currency).minor);
  }
  return money(Number(minor), first.currency);
}

/**
 * Amount times a quantity. Whole quantities are exact; a decimal or fraction rounds once, half away from zero.
 * @param factor a safe whole number, a decimal literal such as `2.5`, or a fraction; a floating number is refused
 * @throws InputError when the factor is a fractional `number` or the product is out of range
 */
export function multiplyMoney(amount: Money, factor: number | string | Ratio): Money {
  if (typeof factor === 'number' && !Number.isSafeInteger(factor)) {
    const message = 'Multiply money by a whole number, or by a decimal written as text such as “2.5”.';
    throw fieldError('factor', String(factor), message);
  }
  const exactFactor = toRatio(factor, 'factor');
  const { minor } = money(amount.minor, amount.currency);
  const product = ratio(BigInt(minor) * exactFactor.numerator, exactFactor.denominator);
  return money(Number(ratioToFixed(product, 0).replace('\u2212', '-')), amount.currency);
}

/** `1,234.50 EUR`, `1,235 JPY`, `−0.125 KWD`. */
export function formatMoney(amount: Money): string {
  const decimals = decimalsOf(amount.currency);
  const digits = String(Math.abs(amount.minor)).padStart(decimals + 1, '0');
  const whole = digits.slice(0, digits.length - decimals).replace(/\B(?=(\d{3})+$)/g, ',');
  const cents = decimals === 0 ? '' : `.${digits.slice(-decimals)}`;
  return `${amount.minor < 0 ? '\u2212' : ''}${whole}${cents} ${amount.currency}`;
}

/**
 * Reads `1,234.50 EUR`, `EUR 1234.5`, or a bare figure when `currency` is given. The point is the decimal mark and
 * the comma groups thousands; anything ambiguous, such as `1,5`, is refused rather than guessed.
 * @throws InputError when the text is no amount, the currency is unknown or another, or there are too many decimals
 */
export function parseMoney(text: string, currency?: string, field = 'amount'): Money {
  const trimmed = text.trim();
  const code = /^[A-Za-z]{3}(?=\s)|(?<=\s)[A-Za-z]{3}$/.exec(trimmed)?.[0];
  const found = code?.toUpperCase() ?? currency;
  if (found === undefined) {
    throw fieldError(field, shorten(text), 'The amount has no currency. Write it like 12.50 EUR.');
  }
  const decimals = decimalsOf(found, field);
  if (currency !== undefined && found !== currency) {
    decimalsOf(currency);
    const message = `The amount is in ${found}, but ${currency} is expected here.`;
    throw fieldError(field, shorten(text), message, currency);
  }
  const figure = code === undefined ? trimmed : trimmed.replace(code, '').trim();
  const match = figure.length <= 40 ? AMOUNT.exec(figure) : null;
  if (!match) {
    const message = `“${shorten(text)}” is not an amount. Write it like 1234.50, with a point before the decimals.`;
    throw fieldError(field, shorten(text), message);
  }
  const [, sign = '', whole = '', cents = ''] = match;
  if (cents.length > decimals) {
    const message = `${found} has ${decimals} decimals; “${shorten(text)}” has more. Round the amount first.`;
    throw fieldError(field, shorten(text), message, decimals);
  }
  const minor = Number(`${whole.replaceAll(',', '')}${cents.padEnd(decimals, '0')}`);
  return money(sign === '' ? minor : -minor, found);
}

function decimalsOf(currency: string, field = 'currency'): 0 | 2 | 3 {
  const decimals = currencyDecimals(currency);
  if (decimals === undefined) {
    const message = `“${shorten(currency)}” is not a currency known here. Use an ISO 4217 code such as EUR.`;
    throw fieldError(field, shorten(currency), message);
  }
  return decimals;
}

function shorten(text: string): string {
  return text.length > 40 ? `${text.slice(0, 40)}…` : text;
}
