import { currencyDecimals } from '@stageyard/libs/units';
import { HOUSE_RULES } from '../house-rules/house-rules.js';
import { type LinePriceDto } from '../train-prices/dto/line-price.dto.js';
import { type TrainPriceLineDto, type TrainPricesDto } from '../train-prices/dto/train-prices.dto.js';
import { type BomDto, type BomLineDto } from '../trains/dto/bom.dto.js';

/** One line of the sheet: what it is, what it costs, and what became of a choice that cannot be used. */
export interface PricedLine {
  line: BomLineDto;
  /** Quantity of the line × build quantity. */
  needed: number;
  price: LinePriceDto | null;
  reason: TrainPriceLineDto['reason'];
  lostChoice: string | null;
}

/** Every line of the bill of materials with its price, in its order. */
export function pricedLines({ lines }: Pick<BomDto, 'lines'>, prices: TrainPricesDto): PricedLine[] {
  const priced = new Map(prices.lines.map((line) => [line.key, line]));
  const lost = new Map(prices.lostChoices.map(({ key, message }) => [key, message]));
  return lines.map((line) => {
    const own = priced.get(line.key);
    return {
      line,
      needed: own?.needed ?? line.quantity * prices.buildQuantity,
      price: own?.price ?? null,
      reason: own?.reason ?? null,
      lostChoice: lost.get(line.key) ?? null,
    };
  });
}

/** Decimals of a currency; those of the house currency where there is none. */
export function decimalsOf(currency: string | undefined): number {
  return currencyDecimals(currency ?? HOUSE_RULES.currency) ?? 2;
}

/** How a spreadsheet shows amounts of a currency: `#,##0`, `#,##0.00`, `#,##0.000`. */
export function moneyFormat(currency: string | undefined): string {
  const decimals = decimalsOf(currency);
  return decimals === 0 ? '#,##0' : `#,##0.${'0'.repeat(decimals)}`;
}

/** Whole minor units as the figure that stands in a cell: 12.5 for 1,250 EUR. Only spreadsheets get money like this. */
export function cellAmount(minor: number, currency: string): number {
  return minor / 10 ** decimalsOf(currency);
}
