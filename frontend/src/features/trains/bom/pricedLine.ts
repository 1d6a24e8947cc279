import { daysBetween } from '@stageyard/libs/bill-of-materials';
import type { BomLine, LinePrice, TrainPriceLine, TrainPrices } from '../../../api/types';
import { formatPlain } from '../../../components/figures';
import { amountWords, moneyWords } from '../../../components/moneyText';

/** One line of the bill of materials with what is known of its price; null while that is on its way. */
export interface PricedLine {
  line: BomLine;
  priced: TrainPriceLine | null;
}

/** Lines of the bill with their prices, matched by key: find numbers shift when lines come and go. */
export function pricedLines(lines: readonly BomLine[], prices: TrainPrices | undefined): PricedLine[] {
  const byKey = new Map(prices?.lines.map((priced) => [priced.key, priced] as const));
  return lines.map((line) => ({ line, priced: byKey.get(line.key) ?? null }));
}

/** An offer whose last day is at most so many days away ends soon. */
const SOON_DAYS = 30;

/** Days until the offer ends when that is soon; null otherwise. `on` and `validUntil`: ISO 8601 dates. */
export function endsSoonDays({ validUntil }: Pick<LinePrice, 'validUntil'>, on: string): number | null {
  if (validUntil === null) return null;
  const days = daysBetween(on, validUntil);
  return days <= SOON_DAYS ? days : null;
}

/** `ends today`, `ends tomorrow`, `ends in 12 days` */
export function endsSoonWords(days: number): string {
  if (days <= 0) return 'ends today';
  return days === 1 ? 'ends tomorrow' : `ends in ${days} days`;
}

/** `12.40`, `48.00 per 100`; the currency stands with the line's total. */
export function unitPriceWords({ unitPrice, currency, per }: LinePrice): string {
  return `${amountWords(unitPrice, currency)}${per === 1 ? '' : ` per ${per}`}`;
}

/** Why a line has no price; null where it has one, or needs none. */
export function noPriceWords(reason: TrainPriceLine['reason']): string | null {
  if (reason === null) return null;
  return {
    made: 'made here',
    'no-part': 'no part chosen',
    'no-offers': 'no offers',
    'none-valid': 'no valid offer',
  }[reason];
}

/** `30 pcs` where it is more than needed, blank otherwise: only a difference is worth a look. */
export function orderWords({ needed, unit, price }: TrainPriceLine): string {
  return price === null || price.orderQuantity === needed
    ? ''
    : `${formatPlain(price.orderQuantity, 3)} ${unit}`;
}

/** Heads of the copied table. */
export const PRICED_HEADS = [
  'Find',
  'Part number',
  'Description',
  'Quantity each',
  'Needed',
  'Unit',
  'On the shelf',
  'Supplier',
  'Supplier part number',
  'Order quantity',
  'Currency',
  'Unit price',
  'Price for',
  'Line total',
  'Lead time days',
  'Priced on',
  'Marks',
  'Used in',
  'Note',
  'Look at',
];

const plain = (minor: number, currency: string): string => amountWords(minor, currency).replaceAll(',', '');

/** One line as cells of the copied table: amounts as plain figures with their currency beside them. */
export function pricedCells({ line, priced }: PricedLine, on: string): string[] {
  const price = priced?.price ?? null;
  return [
    String(line.findNumber),
    line.partNumber ?? '',
    line.description,
    String(line.quantity),
    priced ? String(priced.needed) : '',
    line.unit,
    priced?.onShelf == null ? '' : String(priced.onShelf),
    ...(price
      ? [
          price.supplier.name,
          price.supplierPartNumber,
          String(price.orderQuantity),
          price.currency,
          plain(price.unitPrice, price.currency),
          String(price.per),
          plain(price.lineTotal, price.currency),
          price.leadTimeDays === null ? '' : String(price.leadTimeDays),
          price.pricedOn,
        ]
      : [line.supplier ?? '', '', '', '', '', '', '', '', '']),
    priced ? marksOf(priced, on).join('; ') : '',
    line.source.join(', '),
    line.note,
    line.flags.join('; '),
  ];
}

/** What a purchaser should look at before ordering this line, in words. */
export function marksOf({ price, reason }: TrainPriceLine, on: string): string[] {
  if (price === null) return [noPriceWords(reason) ?? ''].filter(Boolean);
  const ends = endsSoonDays(price, on);
  return [
    price.chosenBy === 'person' ? 'chosen by hand' : '',
    price.tooOld ? 'price too old' : '',
    ends === null ? '' : endsSoonWords(ends),
    price.cheaperAt === null
      ? ''
      : `ordering ${formatPlain(price.cheaperAt.orderQuantity, 3)} costs less: ${moneyWords(price.cheaperAt.lineTotal, price.currency)}`,
  ].filter(Boolean);
}
