import {
  cellDate,
  cellDecimal,
  cellMoney,
  cellWhole,
  type MappedRow,
  OFFER_LIMITS,
  type PriceBreak,
} from '@stageyard/libs/bill-of-materials';
import { currencyDecimals } from '@stageyard/libs/units';
import { RowReader } from '../../common/paste/row-reader.js';
import { PRICE_PER, type PricePer, SOURCE_LENGTH, SUPPLIER_NUMBER_LENGTH } from '../offer-terms.js';
import { OFFER_COLUMNS, type OfferColumn } from './paste-columns.js';

/** What a row may state beside its price; null where its cell is blank. */
export interface StatedTerms {
  per: PricePer | null;
  pack: number | null;
  leastQuantity: number | null;
  leadTimeDays: number | null;
  validFrom: string | null;
  validUntil: string | null;
  pricedOn: string | null;
  source: string | null;
  note: string | null;
}

/** One pasted row, read cell by cell. */
export interface StatedRow {
  reader: RowReader<OfferColumn>;
  /** As written; blank where the row names the part by the supplier's number only. */
  partNumber: string;
  supplierPartNumber: string;
  currency: string;
  /** Whether the row or the defaults say the currency; otherwise it is the supplier's usual one. */
  currencyStated: boolean;
  /** In the order of the columns. */
  breaks: PriceBreak[];
  terms: StatedTerms;
}

const NOTE_LENGTH = 10_000;
const CODE = /^[A-Za-z]{3}(?=\s)|(?<=\s)[A-Za-z]{3}$/;
const QUANTITY = { above: 0, max: OFFER_LIMITS.quantity };

/**
 * Reads the cells of one row; what is wrong stands with the reader.
 * @param currencies of bare figures: the defaults' and the supplier's
 */
export function readRow(
  source: MappedRow<OfferColumn>,
  currencies: { stated: string | undefined; usual: string },
): StatedRow {
  const reader = new RowReader(source, OFFER_COLUMNS);
  const partNumber = reader.bounded('partNumber', 200) ?? '';
  const supplierPartNumber = reader.bounded('supplierPartNumber', SUPPLIER_NUMBER_LENGTH) ?? '';
  if (reader.text('partNumber') === '' && reader.text('supplierPartNumber') === '') {
    reader.wrong('partNumber', 'The row names no part. Give the part number or the supplier part number.');
  }
  const own = currencyOf(reader);
  const currency = own ?? currencies.stated ?? currencies.usual;
  return {
    reader,
    partNumber,
    supplierPartNumber,
    currency,
    currencyStated: own !== null || currencies.stated !== undefined,
    breaks: breaksOf(reader, currency),
    terms: {
      per: perOf(reader),
      pack: reader.value('pack', (text) => cellDecimal(text, QUANTITY)),
      leastQuantity: reader.value('leastQuantity', (text) => cellDecimal(text, QUANTITY)),
      leadTimeDays: reader.value('leadTimeDays', (text) =>
        cellWhole(text, { min: 0, max: OFFER_LIMITS.leadTimeDays }),
      ),
      validFrom: reader.value('validFrom', cellDate),
      validUntil: reader.value('validUntil', cellDate),
      pricedOn: reader.value('pricedOn', cellDate),
      source: reader.bounded('source', SOURCE_LENGTH),
      note: reader.bounded('note', NOTE_LENGTH, 'kept'),
    },
  };
}

/** The currency that the row itself says, in its column or with its first price; null where it says none. */
function currencyOf(reader: RowReader<OfferColumn>): string | null {
  const stated = reader.text('currency').toUpperCase();
  if (stated !== '') {
    if (currencyDecimals(stated) !== undefined) return stated;
    return reader.wrong('currency', 'It is not a currency known here. Use an ISO 4217 code such as EUR.');
  }
  const prices = [reader.text('price'), ...reader.source.series.map(({ text }) => text)];
  const codes = prices.flatMap((price) => CODE.exec(price)?.[0].toUpperCase() ?? []);
  return codes.find((code) => currencyDecimals(code) !== undefined) ?? null;
}

function breaksOf(reader: RowReader<OfferColumn>, currency: string): PriceBreak[] {
  const price = reader.text('price');
  const breaks: PriceBreak[] = [];
  if (price !== '') {
    const from = reader.value('from', (text) => cellDecimal(text, QUANTITY));
    // A price without a quantity holds from the first one on; a quantity that is wrong is noted already.
    push(reader, breaks, 'price', reader.text('from') === '' ? 1 : from, price, currency);
  } else if (reader.text('from') !== '') {
    reader.wrong('price', 'The row has a quantity and no price. Give the price.');
  }
  for (const { key, figure, text } of reader.source.series) {
    const from = cellDecimal(figure, QUANTITY);
    if (from.problem !== null) reader.wrong(key, `The head of this column: ${from.problem}`, figure);
    push(reader, breaks, key, from.value, text, currency);
  }
  if (price === '' && reader.text('from') === '' && reader.source.series.length === 0) {
    reader.wrong('price', 'The row has no price. Give one, or leave the row out.');
  }
  return breaks;
}

function push(
  reader: RowReader<OfferColumn>,
  breaks: PriceBreak[],
  key: OfferColumn,
  quantity: number | null,
  text: string,
  currency: string,
): void {
  const cell = cellMoney(text, currency);
  if (cell.problem !== null) reader.wrong(key, cell.problem, text);
  else if (cell.value !== null && cell.value.minor === 0)
    reader.wrong(key, 'A price of nothing is not kept. Give the price.', text);
  else if (cell.value !== null && quantity !== null) breaks.push({ quantity, unitPrice: cell.value.minor });
}

function perOf(reader: RowReader<OfferColumn>): PricePer | null {
  const figure = reader.value('per', (text) => cellWhole(text, { min: 1, max: 1000 }));
  if (figure === null) return null;
  const per = PRICE_PER.find((known) => known === figure);
  return per ?? reader.wrong('per', 'Prices are for 1, 10, 100 or 1000. Give one of them.');
}
