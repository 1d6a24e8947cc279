import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { In, Repository, type SelectQueryBuilder } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { type Change } from '../audit/dto/change.js';
import { notFound } from '../common/errors.js';
import { type ListQueryDto, type Page, pageOf, parseListQuery, type SortKey } from '../common/list-query.js';
import { hasStock, isLow } from '../stock/shelf-conditions.js';
import { StockLevels } from '../stock/stock-levels.service.js';
import { type PartFacetsDto } from './dto/part-facets.dto.js';
import { PART_SORTS, type PartListQueryDto, type PartSort } from './dto/part-list-query.dto.js';
import { type PartSummaryDto, toPartSummaryDto } from './dto/part-summary.dto.js';
import { type PartDto, toPartDto } from './dto/part.dto.js';
import { Part } from './entities/part.entity.js';
import { type PartStanding } from './part-kinds.js';
import { narrowToAnyOf, narrowToText } from './part-text-search.js';

/** Most materials offered in the filter bar. */
const MOST_MATERIALS = 200;

/** Sorts after every sign that a part number may hold. */
const LAST_SIGN = '\uffff';

/** Columns that may be empty: parts without the figure come last whichever way the list is sorted. */
const MAY_BE_EMPTY: ReadonlySet<PartSort> = new Set(['teeth', 'module', 'faceWidth', 'bore', 'mass']);

/** Fields of few values, each with an index that goes on with the number. */
const THEN_BY_NUMBER: ReadonlySet<PartSort> = new Set(['kind', 'standing']);

/** Everything that reads the library. */
@Injectable()
export class PartsReader {
  constructor(
    @InjectRepository(Part) private readonly parts: Repository<Part>,
    private readonly audit: AuditService,
    private readonly levels: StockLevels,
  ) {}

  /** One page of the library; sorted by number when nothing else is asked for. */
  async list(query: PartListQueryDto): Promise<Page<PartSummaryDto>> {
    const list = parseListQuery(query, PART_SORTS);
    const rows = this.filtered(query);
    if (list.text) await narrowToText(rows, list.text);
    const total = await rows.getCount();
    order(rows, list.sorts.length > 0 ? list.sorts : [{ field: 'number', direction: 'ASC' }]);
    // Sorting ids alone keeps the sort small: whole rows are read for this page only.
    const ids = await rows
      .select('part.id', 'id')
      .offset(list.skip)
      .limit(list.size)
      .getRawMany<{ id: number }>();
    return pageOf(await this.withShelf(await this.byIds(ids.map(({ id }) => id))), total, list);
  }

  /** What the library holds, counted for the choices of the filter bar. */
  async facets(): Promise<PartFacetsDto> {
    const counts = <T>(column: string, limit?: number) =>
      this.parts
        .createQueryBuilder('part')
        .select(`part.${column}`, 'value')
        .addSelect('COUNT(*)', 'count')
        .where(`part.${column} IS NOT NULL`)
        .groupBy(`part.${column}`)
        .orderBy(limit ? 'count' : 'value', limit ? 'DESC' : 'ASC')
        .limit(limit)
        .getRawMany<{ value: T; count: number }>();
    const materials = await counts<string>('material', MOST_MATERIALS);
    return {
      kinds: await counts<string>('kind'),
      standings: await counts<string>('standing'),
      modules: await counts<number>('module'),
      materials: materials.sort((a, b) => a.value.localeCompare(b.value, 'en')),
    };
  }

  /** @throws ProblemError 404 */
  async get(number: string): Promise<PartDto> {
    const part = await this.entity(number);
    return toPartDto(part, await this.levels.totalOf(part.id));
  }

  /** @throws ProblemError 404 */
  async changes(number: string, query: ListQueryDto): Promise<Page<Change>> {
    const part = await this.entity(number);
    return this.audit.changesOf('part', part.number, query);
  }

  /** Parts whose number begins with the text, then others whose number or description holds it; at most `limit`. */
  async find(text: string, limit: number): Promise<Pick<PartSummaryDto, 'number' | 'description'>[]> {
    const brief = (rows: SelectQueryBuilder<Part>) =>
      rows.select(['part.id', 'part.number', 'part.description']).limit(limit).getMany();
    const named = await brief(
      this.parts
        .createQueryBuilder('part')
        .where('part.number >= :text AND part.number < :end', { text, end: `${text}${LAST_SIGN}` })
        .orderBy('part.number'),
    );
    const anywhere = this.parts.createQueryBuilder('part');
    narrowToAnyOf(anywhere, text, limit);
    const others = named.length < limit ? await brief(anywhere) : [];
    const found = new Map([...named, ...others].map((part) => [part.id, part]));
    return [...found.values()].slice(0, limit).map(({ number, description }) => ({ number, description }));
  }

  count(standing?: PartStanding): Promise<number> {
    return this.parts.countBy(standing ? { standing } : {});
  }

  /** Parts of one standing, the last changed first. */
  async latest(standing: PartStanding, limit: number): Promise<PartSummaryDto[]> {
    const rows = await this.parts.find({ where: { standing }, order: { updatedAt: 'DESC' }, take: limit });
    return this.withShelf(rows);
  }

  private async withShelf(parts: Part[]): Promise<PartSummaryDto[]> {
    const shelves = await this.levels.ofPartIds(parts.map(({ id }) => id));
    return parts.map((part) => toPartSummaryDto(part, shelves.get(part.id)?.total ?? null));
  }

  /** Parts in the order of the ids. */
  private async byIds(ids: number[]): Promise<Part[]> {
    const found = new Map((await this.parts.findBy({ id: In(ids) })).map((part) => [part.id, part]));
    return ids.flatMap((id) => found.get(id) ?? []);
  }

  private async entity(number: string): Promise<Part> {
    const part = await this.parts.findOneBy({ number: number.trim() });
    if (!part) throw notFound('part', number);
    return part;
  }

  private filtered(query: PartListQueryDto): SelectQueryBuilder<Part> {
    const rows = this.parts.createQueryBuilder('part');
    for (const [field, condition] of CONDITIONS) {
      const value = query[field];
      if (value !== undefined) rows.andWhere(`part.${condition} :${field}`, { [field]: value });
    }
    if (query.onShelf) hasStock(rows);
    if (query.low) isLow(rows);
    return rows;
  }
}

/** Each filter with the column and comparison it stands for. */
const CONDITIONS = [
  ['kind', 'kind ='],
  ['standing', 'standing ='],
  ['teethMin', 'teeth >='],
  ['teethMax', 'teeth <='],
  ['module', 'module ='],
  ['pressureAngleDeg', 'pressureAngleDeg ='],
  ['helixAngleDeg', 'helixAngleDeg ='],
  ['hand', 'hand ='],
  ['material', 'material ='],
  ['boreMin', 'bore >='],
  ['boreMax', 'bore <='],
  ['faceWidthMin', 'faceWidth >='],
  ['faceWidthMax', 'faceWidth <='],
] as const;

/**
 * Sorts, with the number and then the row id as last keys so that pages never overlap. They follow the direction of the
 * key before them, so that one index serves them all.
 */
function order(rows: SelectQueryBuilder<Part>, sorts: SortKey<PartSort>[]): void {
  for (const { field, direction } of sorts) {
    rows.addOrderBy(`part.${field}`, direction, MAY_BE_EMPTY.has(field) ? 'NULLS LAST' : undefined);
  }
  const last = sorts.at(-1);
  const [only] = sorts.length === 1 ? sorts : [];
  if (only && THEN_BY_NUMBER.has(only.field)) rows.addOrderBy('part.number', only.direction);
  rows.addOrderBy('part.id', last?.direction ?? 'ASC');
}
