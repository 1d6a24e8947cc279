import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { Repository } from 'typeorm';
import { DEFAULT_BUILD_QUANTITY } from '../briefs/requirement.js';
import { Clock } from '../common/clock.js';
import { OffersFinder } from '../offers/offers-finder.service.js';
import { StockLevels } from '../stock/stock-levels.service.js';
import { BomService } from '../trains/bom.service.js';
import { type BomDto } from '../trains/dto/bom.dto.js';
import { Train } from '../trains/entities/train.entity.js';
import { TrainReader } from '../trains/train-reader.js';
import { type PriceQueryDto } from './dto/price-query.dto.js';
import { type TrainPricesDto } from './dto/train-prices.dto.js';
import { priceTrain } from './price-train.js';

/** What trains cost, computed on the way out and never stored. */
@Injectable()
export class TrainPricesService {
  constructor(
    @InjectRepository(Train) private readonly trains: Repository<Train>,
    private readonly reader: TrainReader,
    private readonly boms: BomService,
    private readonly offers: OffersFinder,
    private readonly levels: StockLevels,
    private readonly clock: Clock,
  ) {}

  /** @throws ProblemError 404 */
  async ofTrain(code: string, query: PriceQueryDto = {}): Promise<TrainPricesDto> {
    const { buildQuantity, offerChoices } = await this.reader.load(this.trains.manager, code);
    const quantity = query.quantity ?? buildQuantity ?? DEFAULT_BUILD_QUANTITY;
    return this.ofBom(await this.boms.ofTrain(code), quantity, offerChoices ?? {}, query.prefer);
  }

  /** Prices a bill of materials that was read already. @param choices offer ids by part number */
  async ofBom(
    bom: Pick<BomDto, 'lines'>,
    buildQuantity: number,
    choices: Readonly<Record<string, number>>,
    prefer: PriceQueryDto['prefer'] = 'price',
  ): Promise<TrainPricesDto> {
    const numbers = [...new Set(bom.lines.flatMap(({ partNumber }) => partNumber ?? []))];
    const [offers, levels] = await Promise.all([this.offers.forParts(numbers), this.levels.ofParts(numbers)]);
    const on = this.clock.today();
    return priceTrain(bom.lines, { buildQuantity, on, prefer, offers, levels, choices });
  }
}
