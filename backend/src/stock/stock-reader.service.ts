import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { In, Repository, type SelectQueryBuilder } from 'typeorm';
import { notFound } from '../common/errors.js';
import { type Page, pageOf, parseListQuery, type SortKey } from '../common/list-query.js';
import { statementOf } from '../database/list-statement.js';
import { ReadThreads } from '../database/read-threads.js';
import { Part } from '../parts/entities/part.entity.js';
import { narrowToText } from '../parts/part-text-search.js';
import type { PlaceCountDto } from './dto/place-count.dto.js';
import { type StockItemDto, toStockItem } from './dto/stock-item.dto.js';
import { STOCK_SORTS, type StockQueryDto, type StockSort } from './dto/stock-query.dto.js';
import { isLow, isOnShelf, ON_SHELF } from './shelf-conditions.js';
import { StockLevels } from './stock-levels.service.js';

/** Most places that the choices of a filter show. */
const MOST_PLACES = 2000;

/** What the list is sorted by, over the alias `part`. */
const SORT_COLUMNS: Record<StockSort, string> = {
  number: 'part.number',
  description: 'part.description',
  quantity: ON_SHELF,
  leastStock: 'part.leastStock',
  shortBy: `part.leastStock - ${ON_SHELF}`,
};

/** Everything that reads the shelf. */
@Injectable()
export class StockReader {
  constructor(
    @InjectRepository(Part) private readonly parts: Repository<Part>,
    private readonly levels: StockLevels,
    private readonly threads: ReadThreads,
  ) {}

  /** Parts that lay on a shelf or are watched; sorted by number when nothing else is asked for. */
  async list(query: StockQueryDto): Promise<Page<StockItemDto>> {
    const list = parseListQuery(query, STOCK_SORTS);
    const rows = this.parts.createQueryBuilder('part');
    if (query.low) isLow(rows);
    else isOnShelf(rows, query.place);
    if (query.low && query.place) isOnShelf(rows, query.place);
    if (query.kind) rows.andWhere('part.kind = :kind', { kind: query.kind });
    if (list.text) await narrowToText(rows, list.text);
    const count = statementOf(rows.clone().select('COUNT(*)', 'count'), { keep: true });
    order(rows, list.sorts.length > 0 ? list.sorts : [{ field: 'number', direction: 'ASC' }]);
    // Counting and sorting hundreds of thousands of shelves takes longer than the server's loop may be held.
    const page = rows.select('part.id', 'id').offset(list.skip).limit(list.size);
    const [counted, found] = await this.threads.read(count, statementOf(page));
    const ids = (found ?? []).map(({ id }) => Number(id));
    return pageOf(await this.byIds(ids), Number(counted?.[0]?.count ?? 0), list);
  }

  /** @throws ProblemError 404 */
  async item(number: string): Promise<StockItemDto> {
    const part = await this.parts.findOneBy({ number: number.trim() });
    if (!part) throw notFound('part', number);
    return toStockItem(part, (await this.levels.ofPartIds([part.id])).get(part.id));
  }

  /** Every place the ledger knows, in alphabetical order; at most 2,000. */
  async places(): Promise<PlaceCountDto[]> {
    const sql = `SELECT MIN("place") AS "place", SUM("quantity" > 0) AS "parts" FROM "stock_level"
      GROUP BY "place" ORDER BY "place" LIMIT ?`;
    const [found] = await this.threads.read({ sql, params: [MOST_PLACES], keep: true });
    return (found ?? []).map(({ place, parts }) => ({ place: String(place), parts: Number(parts) }));
  }

  /** Items in the order of the ids. */
  private async byIds(ids: number[]): Promise<StockItemDto[]> {
    const shelves = await this.levels.ofPartIds(ids);
    const found = new Map((await this.parts.findBy({ id: In(ids) })).map((part) => [part.id, part]));
    return ids.flatMap((id) => {
      const part = found.get(id);
      return part ? toStockItem(part, shelves.get(id)) : [];
    });
  }
}

/** Parts without the figure come last whichever way the list is sorted; the row id keeps pages apart. */
function order(rows: SelectQueryBuilder<Part>, sorts: SortKey<StockSort>[]): void {
  for (const { field, direction } of sorts) {
    const mayBeEmpty = field === 'leastStock' || field === 'shortBy';
    rows.addOrderBy(SORT_COLUMNS[field], direction, mayBeEmpty ? 'NULLS LAST' : undefined);
  }
  rows.addOrderBy('part.id', sorts.at(-1)?.direction ?? 'ASC');
}
