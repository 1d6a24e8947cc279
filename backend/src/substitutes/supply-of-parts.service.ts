import { Injectable } from '@nestjs/common';
import { type PricedOffer, priceNeed } from '@stageyard/libs/bill-of-materials';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Clock } from '../common/clock.js';
import { HOUSE_RULES } from '../house-rules/house-rules.js';
import { type Preference } from '../offers/offer-terms.js';
import { OffersFinder, type PartOffer } from '../offers/offers-finder.service.js';
import { StockLevels } from '../stock/stock-levels.service.js';

/** How soon a quantity of a part is there, and what it costs. */
export interface PartSupplyFigures {
  /** null: never lay on a shelf. */
  onShelf: number | null;
  /** The offer to order from; null: none is valid, or the person may not see prices. */
  offer: PricedOffer<PartOffer> | null;
  /** Calendar days: 0 when the shelf covers the quantity; null: not known. */
  arrivalDays: number | null;
}

/** Which of a part's offers counts. */
export interface SupplyRule {
  prefer: Preference;
  /** Offer ids that people chose, by part number; they come before the rule. */
  choices?: Readonly<Record<string, number>>;
}

/** Shelf and offers of many parts at once. */
@Injectable()
export class SupplyOfParts {
  constructor(
    private readonly levels: StockLevels,
    private readonly offers: OffersFinder,
    private readonly clock: Clock,
  ) {}

  /**
   * @param numbers as the library writes them
   * @param quantity needed of each, in its unit
   * @returns every number that was asked for
   */
  async of(
    numbers: readonly string[],
    quantity: number,
    user: Pick<SignedInUser, 'permissions'>,
    { prefer, choices = {} }: SupplyRule,
  ): Promise<Map<string, PartSupplyFigures>> {
    const shelves = await this.levels.ofParts(numbers);
    const mayPrice = user.permissions.includes('prices.read');
    const offers = mayPrice ? await this.offers.forParts(numbers) : new Map<string, PartOffer[]>();
    const rules = { on: this.clock.today(), prefer, currency: HOUSE_RULES.currency };
    return new Map(
      numbers.map((number) => {
        const onShelf = shelves.get(number)?.total ?? null;
        const chosenId = choices[number]?.toString() ?? null;
        const { offer } = priceNeed(
          { needed: quantity, candidates: offers.get(number) ?? [], chosenId },
          rules,
        );
        const covered = onShelf !== null && onShelf >= quantity;
        return [number, { onShelf, offer, arrivalDays: covered ? 0 : (offer?.arrivalDays ?? null) }];
      }),
    );
  }
}
