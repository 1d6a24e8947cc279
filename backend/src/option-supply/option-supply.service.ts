import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { Repository } from 'typeorm';
import { Brief } from '../briefs/entities/brief.entity.js';
import { DEFAULT_BUILD_QUANTITY } from '../briefs/requirement.js';
import { Clock } from '../common/clock.js';
import { politePause } from '../common/polite-pause.js';
import { OffersFinder } from '../offers/offers-finder.service.js';
import { OptionSearchesService } from '../option-searches/option-searches.service.js';
import { specFromOption } from '../trains/adopt-option.js';
import { gearLinesOf } from '../trains/gear-lines.js';
import { type GearNeed, type MatchedGear, StockGears } from '../trains/stock-gears.service.js';
import { type SearchSupplyDto } from './dto/search-supply.dto.js';
import { type SuppliedLine, OptionPricer } from './option-pricer.js';

/** What the options of a search cost and what of them lies on the shelf; the same gears that adopting would take. */
@Injectable()
export class OptionSupplyService {
  constructor(
    @InjectRepository(Brief) private readonly briefs: Repository<Brief>,
    private readonly searches: OptionSearchesService,
    private readonly stock: StockGears,
    private readonly offers: OffersFinder,
    private readonly clock: Clock,
  ) {}

  /**
   * @param asked builds to count with; left out: the brief's build quantity, else 1
   * @throws ProblemError 404
   */
  async ofSearch(id: string, asked?: number): Promise<SearchSupplyDto> {
    const { briefId, request, outcome } = await this.searches.load(id);
    const quantity = asked ?? (await this.buildQuantityOf(briefId));
    // A search may keep hundreds of options: others get their turn in between.
    const pause = politePause();
    const options: { key: string; needs: GearNeed[] }[] = [];
    for (const option of outcome?.options ?? []) {
      const lines = gearLinesOf(specFromOption(option, request), quantity);
      options.push({ key: option.key, needs: lines.map(({ need }) => need) });
      await pause();
    }
    const gears = await this.match(options.flatMap(({ needs }) => needs));
    const numbers = [...new Set([...gears.values()].flatMap((gear) => gear?.number ?? []))];
    const on = this.clock.today();
    const pricer = new OptionPricer(await this.offers.forParts(numbers), on);
    const answer: SearchSupplyDto = { quantity, options: [] };
    for (const { key, needs } of options) {
      const lines = needs.map((need): SuppliedLine => {
        return { wanted: need.wanted, gear: gears.get(identity(need)) ?? null };
      });
      answer.options.push(pricer.supplyOf(key, lines));
      await pause();
    }
    return answer;
  }

  /** Options share many gears: each is looked up once. */
  private async match(needs: readonly GearNeed[]): Promise<Map<string, MatchedGear | null>> {
    const different = [...new Map(needs.map((need) => [identity(need), need]))];
    const found = await this.stock.matchMany(different.map(([, need]) => need));
    return new Map(different.map(([key], index) => [key, found[index] ?? null]));
  }

  private async buildQuantityOf(briefId: number): Promise<number> {
    const brief = await this.briefs.findOneBy({ id: briefId });
    return brief?.requirement.buildQuantity ?? DEFAULT_BUILD_QUANTITY;
  }
}

function identity(need: GearNeed): string {
  const { module, teeth, pressureAngleDeg, helixAngleDeg, hand, profileShift, faceWidth, wanted } = need;
  return [module, teeth, pressureAngleDeg, helixAngleDeg, hand, profileShift, faceWidth, wanted].join(' ');
}
