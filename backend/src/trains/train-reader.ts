import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type TrainFigures } from '@stageyard/libs/train-planner';
import { type EntityManager, Repository } from 'typeorm';
import { notFound } from '../common/errors.js';
import { containing } from '../common/like-text.js';
import { type Page, pageOf, parseListQuery } from '../common/list-query.js';
import { type TrainDto, toTrainDto } from './dto/train.dto.js';
import { TRAIN_SORTS, type TrainQueryDto, type TrainSort } from './dto/train-query.dto.js';
import { toTrainSummary, type TrainSummaryDto } from './dto/train-summary.dto.js';
import { Train } from './entities/train.entity.js';
import { StockGears } from './stock-gears.service.js';
import { trainFigures } from './train-figures.js';

const SORT_COLUMNS: Record<TrainSort, string> = {
  code: 'train.code',
  title: 'train.title',
  owner: 'owner.name',
  createdAt: 'train.createdAt',
  updatedAt: 'train.updatedAt',
};

/** Reads trains; their figures are computed on the way out and never stored. */
@Injectable()
export class TrainReader {
  constructor(
    @InjectRepository(Train) private readonly trains: Repository<Train>,
    private readonly stock: StockGears,
  ) {}

  /** @param userId the person who asks, for `mine` */
  async page(query: TrainQueryDto, userId: string): Promise<Page<TrainSummaryDto>> {
    const list = parseListQuery(query, TRAIN_SORTS);
    const rows = this.trains
      .createQueryBuilder('train')
      .innerJoinAndSelect('train.owner', 'owner')
      .leftJoinAndSelect('train.brief', 'brief');
    if (query.mine) rows.andWhere('train.ownerId = :userId', { userId });
    if (query.revisionState) rows.andWhere('train.state = :state', { state: query.revisionState });
    if (list.text) {
      const fields = ['code', 'title', 'note'].map((field) => `train.${field} LIKE :text ESCAPE '\\'`);
      rows.andWhere(`(${fields.join(' OR ')})`, { text: containing(list.text) });
    }
    for (const { field, direction } of list.sorts) rows.addOrderBy(SORT_COLUMNS[field], direction);
    rows.addOrderBy('train.id', 'DESC').skip(list.skip).take(list.size);
    const [found, total] = await rows.getManyAndCount();
    return pageOf(await this.summarise(found), total, list);
  }

  /** The latest changed trains of one person. */
  async latestOf(ownerId: string, limit: number): Promise<TrainSummaryDto[]> {
    const order = { updatedAt: 'DESC', id: 'DESC' } as const;
    const relations = { owner: true, brief: true };
    return this.summarise(await this.trains.find({ where: { ownerId }, relations, order, take: limit }));
  }

  /** Trains whose code or title holds the text, latest changed first. */
  async find(text: string, limit: number): Promise<{ code: string; title: string }[]> {
    const found = await this.trains
      .createQueryBuilder('train')
      .select(['train.id', 'train.code', 'train.title'])
      .where("(train.code LIKE :text ESCAPE '\\' OR train.title LIKE :text ESCAPE '\\')", {
        text: containing(text),
      })
      .orderBy('train.updatedAt', 'DESC')
      .take(limit)
      .getMany();
    return found.map(({ code, title }) => ({ code, title }));
  }

  count(): Promise<number> {
    return this.trains.count();
  }

  /** @throws ProblemError 404 */
  async get(code: string): Promise<TrainDto> {
    return this.describe(await this.load(this.trains.manager, code));
  }

  /** The row, to be changed or looked at as a whole. @throws ProblemError 404 */
  row(code: string): Promise<Train> {
    return this.load(this.trains.manager, code);
  }

  /** @throws ProblemError 404 */
  async load(manager: EntityManager, code: string): Promise<Train> {
    const train = await manager.findOne(Train, { where: { code }, relations: { owner: true, brief: true } });
    if (!train) throw notFound('train', code);
    return train;
  }

  /** @param train with its `owner` and `brief` loaded */
  async describe(train: Train): Promise<TrainDto> {
    return toTrainDto(train, await this.figures(train));
  }

  async figures({ spec }: Pick<Train, 'spec'>): Promise<TrainFigures> {
    return trainFigures(spec, await this.stock.chosenIn([spec]));
  }

  private async summarise(trains: Train[]): Promise<TrainSummaryDto[]> {
    const stock = await this.stock.chosenIn(trains.map((train) => train.spec));
    return trains.map((train) => toTrainSummary(train, trainFigures(train.spec, stock)));
  }
}
