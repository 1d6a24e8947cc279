import { Injectable } from '@nestjs/common';
import { chooseOffer } from '@stageyard/libs/bill-of-materials';
import { DataSource } from 'typeorm';
import { badInput, notFound } from '../common/errors.js';
import { HOUSE_RULES } from '../house-rules/house-rules.js';
import { Part } from '../parts/entities/part.entity.js';
import { isCountable, unitOf } from '../parts/part-unit.js';
import { StockLevels } from '../stock/stock-levels.service.js';
import { type PartOffersQueryDto } from './dto/part-offers-query.dto.js';
import { type PartOffersDto } from './dto/part-offers.dto.js';
import { OfferReader } from './offer-reader.js';
import { OffersFinder } from './offers-finder.service.js';

/** What a part costs where. */
@Injectable()
export class PartOffers {
  constructor(
    private readonly source: DataSource,
    private readonly finder: OffersFinder,
    private readonly reader: OfferReader,
    private readonly levels: StockLevels,
  ) {}

  /**
   * Every offer for a part, priced at the asked quantity and ranked.
   * @throws ProblemError 404; 400 for a fraction of a piece or more than three decimals
   */
  async of(number: string, query: PartOffersQueryDto): Promise<PartOffersDto> {
    const part = await this.source.manager.findOneBy(Part, { number: number.trim() });
    if (!part) throw notFound('part', number);
    const { quantity = 1, prefer = 'price' } = query;
    const unit = unitOf(part.kind);
    if (unit === 'pcs' && !isCountable(quantity, unit)) {
      const message = `${part.number} is counted in pieces; ${quantity} is not a whole number of them.`;
      throw badInput([{ field: 'quantity', value: quantity, message }]);
    }
    const candidates = (await this.finder.forParts([part.number])).get(part.number) ?? [];
    const rules = { on: this.reader.today(), prefer, currency: HOUSE_RULES.currency };
    const { chosen, priced, reason } = chooseOffer(candidates, quantity, rules);
    const offers = await this.reader.byIds(
      this.source.manager,
      priced.map(({ id }) => Number(id)),
    );
    const ranked = new Map(priced.map((offer) => [offer.id, offer]));
    return {
      quantity,
      unit,
      onShelf: await this.levels.totalOf(part.id),
      offers: offers.map((offer) => ({
        ...offer,
        price: ranked.get(offer.id)?.price ?? null,
        arrivalDays: ranked.get(offer.id)?.arrivalDays ?? null,
        chosen: offer.id === chosen?.id,
      })),
      reason,
    };
  }
}
