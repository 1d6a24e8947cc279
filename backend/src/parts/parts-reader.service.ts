import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { Repository, type SelectQueryBuilder } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { type Change } from '../audit/dto/change.js';
import { notFound } from '../common/errors.js';
import { type ListQueryDto, type Page, pageOf, parseListQuery, type SortKey } from '../common/list-query.js';
import { statementOf } from '../database/list-statement.js';
import { type ReadStatement, type Row } from '../database/read-task.js';
import { ReadThreads } from '../database/read-threads.js';
import { hasStock, isLow } from '../stock/shelf-conditions.js';
import { fromThousandths } from '../stock/thousandths.js';
import { StockLevels } from '../stock/stock-levels.service.js';
import { type FigureCountDto, type PartFacetsDto, type TextCountDto } from './dto/part-facets.dto.js';
import { type PartAttributes } from './dto/attributes/part-attributes.js';
import { PART_SORTS, type PartListQueryDto, type PartSort } from './dto/part-list-query.dto.js';
import {
  type PartSummaryDto,
  SUMMARY_COLUMNS,
  type SummarizedPart,
  toPartSummaryDto,
} from './dto/part-summary.dto.js';
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
    private readonly threads: ReadThreads,
  ) {}

  /** One page of the library; sorted by number when nothing else is asked for. */
  async list(query: PartListQueryDto): Promise<Page<PartSummaryDto>> {
    const list = parseListQuery(query, PART_SORTS);
    const rows = this.filtered(query);
    if (list.text) await narrowToText(rows, list.text, { countOf: (statement) => this.countOf(statement) });
    const count = statementOf(rows.clone().select('COUNT(*)', 'count'), { keep: true });
    order(rows, list.sorts.length > 0 ? list.sorts : [{ field: 'number', direction: 'ASC' }]);
    // Sorting ids alone keeps the sort small: whole rows are read for this page only.
    const page = rows.select('part.id', 'id').offset(list.skip).limit(list.size);
    const [counted, found] = await this.threads.read(count, statementOf(page, { whole: WHOLE_PART }));
    return pageOf((found ?? []).map(summaryOf), countIn(counted), list);
  }

  /** What the library holds, counted for the choices of the filter bar. */
  async facets(): Promise<PartFacetsDto> {
    const counts = (column: keyof Part, limit?: number) => {
      const rows = this.parts
        .createQueryBuilder('part')
        .select(`part.${column}`, 'value')
        .addSelect('COUNT(*)', 'count')
        .where(`part.${column} IS NOT NULL`)
        .groupBy(`part.${column}`)
        .orderBy(limit ? 'count' : 'value', limit ? 'DESC' : 'ASC')
        .limit(limit);
      return statementOf(rows, { keep: true });
    };
    const [kinds, standings, modules, materials] = await this.threads.read(
      counts('kind'),
      counts('standing'),
      counts('module'),
      counts('material', MOST_MATERIALS),
    );
    return {
      kinds: kinds as unknown as TextCountDto[],
      standings: standings as unknown as TextCountDto[],
      modules: modules as unknown as FigureCountDto[],
      materials: (materials as unknown as TextCountDto[]).sort((a, b) =>
        a.value.localeCompare(b.value, 'en'),
      ),
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

  async count(standing?: PartStanding): Promise<number> {
    const rows = this.parts.createQueryBuilder('part').select('COUNT(*)', 'count');
    if (standing) rows.where({ standing });
    return this.countOf(statementOf(rows));
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

  private async countOf(statement: ReadStatement): Promise<number> {
    const [counted] = await this.threads.read({ ...statement, keep: true });
    return countIn(counted);
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

/** A part as a reading thread finds it by its id, with what lies on the shelf over all places. */
const WHOLE_PART = `SELECT ${SUMMARY_COLUMNS.map((column) => `"${column}"`).join(', ')},
  (SELECT SUM("quantity") FROM "stock_level" WHERE "partId" = "part"."id") AS "shelf" FROM "part" WHERE "id" = ?`;

function countIn(rows: Row[] | undefined): number {
  return Number(rows?.[0]?.count ?? 0);
}

/** The columns of the table are the entity's fields; only the attributes are text there. */
function summaryOf(row: Row): PartSummaryDto {
  const { shelf, attributes, ...columns } = row as unknown as Omit<SummarizedPart, 'attributes'> & {
    attributes: string;
    shelf: number | null;
  };
  const part = { ...columns, attributes: JSON.parse(attributes) as PartAttributes };
  return toPartSummaryDto(part, shelf === null ? null : fromThousandths(shelf));
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
