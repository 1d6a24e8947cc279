import { chooseOffer, type PricedOffer, totalsByCurrency } from '@stageyard/libs/bill-of-materials';
import { HOUSE_RULES } from '../house-rules/house-rules.js';
import { type PartOffer } from '../offers/offers-finder.service.js';
import { type MatchedGear } from '../trains/stock-gears.service.js';
import { type OptionSupplyDto } from './dto/search-supply.dto.js';

/** A gear line of an option: how many pieces, and the stock gear for it; null: it is to be made. */
export interface SuppliedLine {
  wanted: number;
  gear: MatchedGear | null;
}

/** Adds up options; a gear in a quantity is priced once, however many options share it. */
export class OptionPricer {
  private readonly priced = new Map<string, PricedOffer<PartOffer> | null>();

  /**
   * @param offers by part number
   * @param on the day that offers are held against, ISO 8601 date
   */
  constructor(
    private readonly offers: ReadonlyMap<string, readonly PartOffer[]>,
    private readonly on: string,
  ) {}

  supplyOf(key: string, lines: readonly SuppliedLine[]): OptionSupplyDto {
    const stock = stockLines(lines);
    const toMake = lines.filter(({ gear }) => gear === null).length;
    const chosen = stock.flatMap(({ gear, wanted }) => this.best(gear.number, wanted) ?? []);
    const amounts = chosen.flatMap(({ price }) => price?.lineTotal ?? []);
    const leadTimes = chosen.flatMap(({ arrivalDays }) => arrivalDays ?? []);
    const gears = stock.length + toMake;
    return {
      key,
      gears,
      fromStock: stock.length,
      onShelf: stock.filter(({ gear, wanted }) => (gear.onShelf ?? 0) >= wanted).length,
      toMake,
      costs: totalsByCurrency(amounts, HOUSE_RULES.currency).map(({ total }) => ({ ...total })),
      priced: amounts.length,
      unpriced: gears - amounts.length,
      longestLeadTimeDays: leadTimes.length > 0 ? Math.max(...leadTimes) : null,
    };
  }

  private best(number: string, wanted: number): PricedOffer<PartOffer> | null {
    const key = `${number} ${wanted}`;
    let best = this.priced.get(key);
    if (best === undefined) {
      const rules = { on: this.on, prefer: 'price', currency: HOUSE_RULES.currency } as const;
      best = chooseOffer(this.offers.get(number) ?? [], wanted, rules).chosen;
      this.priced.set(key, best);
    }
    return best;
  }
}

/** Lines that the same stock gear serves are one, as on the bill of materials. */
function stockLines(lines: readonly SuppliedLine[]): { gear: MatchedGear; wanted: number }[] {
  const found = new Map<string, { gear: MatchedGear; wanted: number }>();
  for (const { gear, wanted } of lines) {
    if (!gear) continue;
    const before = found.get(gear.number)?.wanted ?? 0;
    found.set(gear.number, { gear, wanted: before + wanted });
  }
  return [...found.values()];
}
