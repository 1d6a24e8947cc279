import { currencyDecimals, type FieldIssue, InputError } from '../../units/index.js';
import { isCalendarDate } from './calendar-date.js';
import { type OfferTerms, type PriceBreak } from './offer-terms.js';
import { isInThousandths } from './thousandths.js';

/** Bounds of an offer; quantities in the part's unit, prices in minor units, lead time in calendar days. */
export const OFFER_LIMITS = {
  quantity: 1_000_000,
  unitPrice: 1_000_000_000,
  breaks: 20,
  leadTimeDays: 3650,
} as const;

const PER = [1, 10, 100, 1000];
const DATE_LABELS = { validFrom: 'Valid from', validUntil: 'Valid until', pricedOn: 'Priced on' } as const;

/**
 * Checks what an offer says; everything wrong is told at once.
 * @param path put before the field names, such as `offers.3`
 * @throws InputError listing every field at fault
 */
export function checkOfferTerms(terms: OfferTerms, path = ''): void {
  const issues = [
    ...currencyIssues(terms.currency),
    ...perIssues(terms.per),
    ...breakIssues(terms.breaks),
    ...quantityIssues('pack', terms.pack, 'The pack'),
    ...quantityIssues('leastQuantity', terms.leastQuantity, 'The least quantity'),
    ...leadTimeIssues(terms.leadTimeDays),
    ...dateIssues(terms),
  ];
  if (issues.length === 0) return;
  const under = (field: string) => (path === '' ? field : `${path}.${field}`);
  throw new InputError(issues.map((issue) => ({ ...issue, field: under(issue.field) })));
}

function currencyIssues(currency: unknown): FieldIssue[] {
  if (typeof currency === 'string' && currencyDecimals(currency) !== undefined) return [];
  const message = `${shown(currency)} is not a currency known here. Use an ISO 4217 code such as EUR.`;
  return [{ field: 'currency', value: given(currency), message }];
}

function perIssues(per: unknown): FieldIssue[] {
  if (typeof per === 'number' && PER.includes(per)) return [];
  const message = 'A price is for 1, 10, 100 or 1000. Choose one of them.';
  return [{ field: 'per', value: given(per), limit: PER.join(', '), message }];
}

function breakIssues(breaks: readonly PriceBreak[]): FieldIssue[] {
  if (!Array.isArray(breaks) || breaks.length === 0) {
    return [{ field: 'breaks', value: 'none', limit: 1, message: 'Give at least one price.' }];
  }
  if (breaks.length > OFFER_LIMITS.breaks) {
    const message = `An offer has at most ${OFFER_LIMITS.breaks} price breaks; ${breaks.length} are given.`;
    return [{ field: 'breaks', value: breaks.length, limit: OFFER_LIMITS.breaks, message }];
  }
  return (breaks as readonly PriceBreak[]).flatMap(({ quantity, unitPrice }, index, all) => {
    const field = `breaks.${index}.quantity`;
    const faults = quantityIssues(field, quantity, 'A price break');
    const before = all[index - 1]?.quantity;
    return [
      ...faults,
      ...(faults.length === 0 && before !== undefined ? orderIssues(field, before, quantity) : []),
      ...unitPriceIssues(`breaks.${index}.unitPrice`, unitPrice),
    ];
  });
}

function orderIssues(field: string, before: number, quantity: number): FieldIssue[] {
  if (quantity > before) return [];
  const message =
    quantity === before
      ? `There are two prices from ${quantity}. Keep one of them.`
      : `The break from ${quantity} comes after the one from ${before}. Put the smaller quantity first.`;
  return [{ field, value: quantity, limit: before, message }];
}

function unitPriceIssues(field: string, unitPrice: unknown): FieldIssue[] {
  const most = OFFER_LIMITS.unitPrice;
  if (typeof unitPrice === 'number' && Number.isInteger(unitPrice) && unitPrice >= 1 && unitPrice <= most) {
    return [];
  }
  const range = `from 1 to ${most.toLocaleString('en-GB')}`;
  const message = `A price is a whole number of minor units ${range}; ${shown(unitPrice)} is not.`;
  return [{ field, value: given(unitPrice), limit: 1, message }];
}

function quantityIssues(field: string, quantity: unknown, label: string): FieldIssue[] {
  const most = OFFER_LIMITS.quantity;
  if (typeof quantity !== 'number' || !(quantity > 0 && quantity <= most)) {
    const message = `${label} must be above 0 and at most ${most.toLocaleString('en-GB')}; ${shown(quantity)} is not.`;
    return [{ field, value: given(quantity), limit: most, message }];
  }
  if (isInThousandths(quantity)) return [];
  const message = `${label} has at most three decimals; ${quantity} has more.`;
  return [{ field, value: quantity, limit: 0.001, message }];
}

function leadTimeIssues(leadTimeDays: unknown): FieldIssue[] {
  const most = OFFER_LIMITS.leadTimeDays;
  if (leadTimeDays === null) return [];
  if (
    typeof leadTimeDays === 'number' &&
    Number.isInteger(leadTimeDays) &&
    leadTimeDays >= 0 &&
    leadTimeDays <= most
  ) {
    return [];
  }
  const message = `A lead time is a whole number of days from 0 to ${most}; ${shown(leadTimeDays)} is not.`;
  return [{ field: 'leadTimeDays', value: given(leadTimeDays), limit: most, message }];
}

function dateIssues(terms: OfferTerms): FieldIssue[] {
  const fields = ['validFrom', 'validUntil', 'pricedOn'] as const;
  const wrong = fields.filter((field) => {
    const date = terms[field];
    return !(field === 'validUntil' && date === null) && !isCalendarDate(date ?? '');
  });
  const issues: FieldIssue[] = wrong.map((field) => ({
    field,
    value: given(terms[field]),
    message: `${DATE_LABELS[field]}: ${shown(terms[field])} is not a day of the calendar. Write it like 2026-02-28.`,
  }));
  const { validFrom, validUntil } = terms;
  if (validUntil === null || wrong.includes('validFrom') || wrong.includes('validUntil')) return issues;
  if (validUntil >= validFrom) return issues;
  const message = `The offer ends on ${validUntil}, before it starts on ${validFrom}. Mend one of the days.`;
  return [...issues, { field: 'validUntil', value: validUntil, limit: validFrom, message }];
}

/** The value as it may be shown and sent: never a NaN, never longer than a line. */
function given(value: unknown): string | number | null {
  if (value === undefined || value === null) return null;
  if (typeof value === 'number' && Number.isFinite(value)) return value;
  const text = typeof value === 'string' ? value : typeof value === 'number' ? String(value) : typeof value;
  return text.length > 40 ? `${text.slice(0, 40)}…` : text;
}

function shown(value: unknown): string {
  const text = given(value);
  return text === null || text === '' ? 'nothing' : typeof text === 'number' ? String(text) : `“${text}”`;
}
