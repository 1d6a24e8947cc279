import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, Repository } from 'typeorm';
import { notFound } from '../common/errors.js';
import { containing } from '../common/like-text.js';
import { type Page, pageOf, parseListQuery } from '../common/list-query.js';
import { rowId } from '../common/row-id.js';
import { OptionSearchesService } from '../option-searches/option-searches.service.js';
import { Train } from '../trains/entities/train.entity.js';
import { type BriefDto, toBriefDto } from './dto/brief.dto.js';
import { BRIEF_SORTS, type BriefQueryDto, type BriefSort } from './dto/brief-query.dto.js';
import { type BriefSummaryDto, toBriefSummary } from './dto/brief-summary.dto.js';
import { toPinDto } from './dto/pin.dto.js';
import { Brief } from './entities/brief.entity.js';
import { Pin } from './entities/pin.entity.js';

const SORT_COLUMNS: Record<BriefSort, string> = {
  code: 'brief.code',
  title: 'brief.title',
  standing: 'brief.standing',
  owner: 'owner.name',
  createdAt: 'brief.createdAt',
  updatedAt: 'brief.updatedAt',
};

/** Reads briefs with what belongs to them; never one query a row. */
@Injectable()
export class BriefReader {
  constructor(
    @InjectRepository(Brief) private readonly briefs: Repository<Brief>,
    @InjectRepository(Pin) private readonly pins: Repository<Pin>,
    private readonly searches: OptionSearchesService,
  ) {}

  /** @param userId the person who asks, for `mine` */
  async page(query: BriefQueryDto, userId: string): Promise<Page<BriefSummaryDto>> {
    const list = parseListQuery(query, BRIEF_SORTS);
    const rows = this.briefs.createQueryBuilder('brief').innerJoinAndSelect('brief.owner', 'owner');
    if (query.mine) rows.andWhere('brief.ownerId = :userId', { userId });
    if (query.standing) rows.andWhere('brief.standing = :standing', { standing: query.standing });
    if (list.text) {
      const fields = ['code', 'title', 'note'].map((field) => `brief.${field} LIKE :text ESCAPE '\\'`);
      rows.andWhere(`(${fields.join(' OR ')})`, { text: containing(list.text) });
    }
    for (const { field, direction } of list.sorts) rows.addOrderBy(SORT_COLUMNS[field], direction);
    rows.addOrderBy('brief.id', 'DESC').skip(list.skip).take(list.size);
    const [found, total] = await rows.getManyAndCount();
    return pageOf(await this.summarise(found), total, list);
  }

  /** The latest changed briefs of one person. */
  async latestOf(ownerId: string, limit: number): Promise<BriefSummaryDto[]> {
    const order = { updatedAt: 'DESC', id: 'DESC' } as const;
    const found = await this.briefs.find({
      where: { ownerId },
      relations: { owner: true },
      order,
      take: limit,
    });
    return this.summarise(found);
  }

  /** Briefs whose code or title holds the text, latest changed first. */
  async find(text: string, limit: number): Promise<{ id: string; code: string; title: string }[]> {
    const found = await this.briefs
      .createQueryBuilder('brief')
      .select(['brief.id', 'brief.code', 'brief.title'])
      .where("(brief.code LIKE :text ESCAPE '\\' OR brief.title LIKE :text ESCAPE '\\')", {
        text: containing(text),
      })
      .orderBy('brief.updatedAt', 'DESC')
      .take(limit)
      .getMany();
    return found.map(({ id, code, title }) => ({ id: String(id), code, title }));
  }

  count(): Promise<number> {
    return this.briefs.count();
  }

  /** @throws ProblemError 404 */
  async get(id: string): Promise<BriefDto> {
    return this.describe(this.briefs.manager, rowId(id, 'brief'));
  }

  /** The brief as a manager sees it, within a write too. @throws ProblemError 404 */
  async describe(manager: EntityManager, id: number): Promise<BriefDto> {
    const brief = await manager.findOne(Brief, { where: { id }, relations: { owner: true } });
    if (!brief) throw notFound('brief', String(id));
    const [pins, trains, latest] = await Promise.all([
      manager.find(Pin, { where: { briefId: id }, relations: { pinnedBy: true }, order: { id: 'ASC' } }),
      manager.find(Train, {
        select: { code: true, title: true },
        where: { briefId: id },
        order: { id: 'ASC' },
      }),
      this.searches.latestOf([id]),
    ]);
    return toBriefDto(brief, {
      pins: pins.map(toPinDto),
      trains: trains.map(({ code, title }) => ({ code, title })),
      latestSearch: latest.get(id) ?? null,
    });
  }

  private async summarise(briefs: Brief[]): Promise<BriefSummaryDto[]> {
    const ids = briefs.map(({ id }) => id);
    const [latest, pinCounts] = await Promise.all([this.searches.latestOf(ids), this.countPins(ids)]);
    return briefs.map((brief) =>
      toBriefSummary(brief, {
        latestSearch: latest.get(brief.id) ?? null,
        pinCount: pinCounts.get(brief.id) ?? 0,
      }),
    );
  }

  private async countPins(briefIds: number[]): Promise<Map<number, number>> {
    if (briefIds.length === 0) return new Map();
    const counts = await this.pins
      .createQueryBuilder('pin')
      .select('pin.briefId', 'briefId')
      .addSelect('COUNT(*)', 'pins')
      .where('pin.briefId IN (:...briefIds)', { briefIds })
      .groupBy('pin.briefId')
      .getRawMany<{ briefId: number; pins: number }>();
    return new Map(counts.map(({ briefId, pins }) => [briefId, pins]));
  }
}
