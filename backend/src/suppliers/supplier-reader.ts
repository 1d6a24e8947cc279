import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, In, Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { type Change } from '../audit/dto/change.js';
import { Clock } from '../common/clock.js';
import { notFound } from '../common/errors.js';
import { containing } from '../common/like-text.js';
import { type ListQueryDto, type Page, pageOf, parseListQuery } from '../common/list-query.js';
import { statementOf } from '../database/list-statement.js';
import { ReadThreads } from '../database/read-threads.js';
import { type SupplierOffersDto } from './dto/supplier-offers.dto.js';
import { SUPPLIER_SORTS, type SupplierQueryDto } from './dto/supplier-query.dto.js';
import { NO_OFFERS, type SupplierDto, toSupplierDto } from './dto/supplier.dto.js';
import { Supplier } from './entities/supplier.entity.js';

/** Where the text of a list is looked for. Of contacts only what people typed: the names of their fields are no text. */
const HOLDS_TEXT = [
  ...['code', 'name', 'address', 'note'].map((field) => `supplier.${field} LIKE :text ESCAPE '\\'`),
  `EXISTS (SELECT 1 FROM json_tree(supplier.contacts) "typed" WHERE "typed"."atom" LIKE :text ESCAPE '\\')`,
].join(' OR ');

/** Open offers that have not ended, of the supplier of the row. */
const OPEN_OFFERS = `(SELECT COUNT(*) FROM "offer" "o" WHERE "o"."supplierId" = supplier.id
  AND "o"."standing" = 'open' AND ("o"."validUntil" IS NULL OR "o"."validUntil" >= :today))`;

type OfferCount = { supplierId: number } & SupplierOffersDto;

/** Reads suppliers; their offers are counted by one query a page. */
@Injectable()
export class SupplierReader {
  constructor(
    @InjectRepository(Supplier) private readonly suppliers: Repository<Supplier>,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly threads: ReadThreads,
  ) {}

  /** One page; sorted by name when nothing else is asked for. */
  async page(query: SupplierQueryDto): Promise<Page<SupplierDto>> {
    const list = parseListQuery(query, SUPPLIER_SORTS);
    const rows = this.suppliers.createQueryBuilder('supplier');
    if (query.standing) rows.andWhere('supplier.standing = :standing', { standing: query.standing });
    if (query.currency)
      rows.andWhere('supplier.currency = :currency', { currency: query.currency.toUpperCase() });
    if (list.text) rows.andWhere(`(${HOLDS_TEXT})`, { text: containing(list.text) });
    const count = statementOf(rows.clone().select('COUNT(*)', 'count'), { keep: true });
    for (const { field, direction } of list.sorts) {
      if (field === 'offers') {
        rows.addOrderBy(OPEN_OFFERS, direction).setParameter('today', this.clock.today());
      } else {
        rows.addOrderBy(`supplier.${field}`, direction, field === 'leadTimeDays' ? 'NULLS LAST' : undefined);
      }
    }
    if (list.sorts.length === 0) rows.addOrderBy('supplier.name', 'ASC');
    const page = rows.select('supplier.id', 'id').addOrderBy('supplier.id', 'ASC');
    const [counted, found] = await this.threads.read(
      count,
      statementOf(page.offset(list.skip).limit(list.size)),
    );
    const ids = (found ?? []).map(({ id }) => Number(id));
    return pageOf(await this.byIds(ids), Number(counted?.[0]?.count ?? 0), list);
  }

  /** @throws ProblemError 404 */
  async get(code: string): Promise<SupplierDto> {
    return this.describe(this.suppliers.manager, await this.load(this.suppliers.manager, code));
  }

  /** @throws ProblemError 404 */
  async changes(code: string, query: ListQueryDto): Promise<Page<Change>> {
    const supplier = await this.load(this.suppliers.manager, code);
    return this.audit.changesOf('supplier', supplier.code, query);
  }

  /** The row, whatever the case of the code's letters; within a write too. @throws ProblemError 404 */
  async load(manager: EntityManager, code: string): Promise<Supplier> {
    const supplier = await manager.findOneBy(Supplier, { code: code.trim().toUpperCase() });
    if (!supplier) throw notFound('supplier', code);
    return supplier;
  }

  /** A supplier with its offers counted, as a manager sees it. */
  async describe(manager: EntityManager, supplier: Supplier): Promise<SupplierDto> {
    const { sql, params } = this.offersCounted([supplier.id]);
    const offers = offersById(await manager.query<OfferCount[]>(sql, params));
    return toSupplierDto(supplier, offers.get(supplier.id) ?? NO_OFFERS);
  }

  /** Suppliers whose code or name holds the text, active ones first. */
  async find(text: string, limit: number): Promise<Pick<Supplier, 'code' | 'name'>[]> {
    const found = await this.suppliers
      .createQueryBuilder('supplier')
      .select(['supplier.id', 'supplier.code', 'supplier.name'])
      .where("(supplier.code LIKE :text ESCAPE '\\' OR supplier.name LIKE :text ESCAPE '\\')", {
        text: containing(text),
      })
      .orderBy('supplier.standing')
      .addOrderBy('supplier.name')
      .take(limit)
      .getMany();
    return found.map(({ code, name }) => ({ code, name }));
  }

  /** How many are asked and ordered from. */
  count(): Promise<number> {
    return this.suppliers.countBy({ standing: 'active' });
  }

  /** Suppliers in the order of the ids, with their offers counted. */
  private async byIds(ids: number[]): Promise<SupplierDto[]> {
    const { sql, params } = this.offersCounted(ids);
    const [counts] = await this.threads.read({ sql, params, keep: true });
    const offers = offersById((counts ?? []) as unknown as OfferCount[]);
    const suppliers = new Map((await this.suppliers.findBy({ id: In(ids) })).map((row) => [row.id, row]));
    return ids.flatMap((id) => {
      const supplier = suppliers.get(id);
      return supplier ? [toSupplierDto(supplier, offers.get(id) ?? NO_OFFERS)] : [];
    });
  }

  private offersCounted(ids: number[]): { sql: string; params: unknown[] } {
    return {
      sql: `SELECT "supplierId", SUM("lasts") AS "open", SUM(NOT "lasts") AS "expired",
              MIN(CASE WHEN "lasts" THEN "pricedOn" END) AS "oldestPricedOn"
       FROM (SELECT "supplierId", "pricedOn", ("validUntil" IS NULL OR "validUntil" >= ?) AS "lasts"
             FROM "offer" WHERE "supplierId" IN (SELECT "value" FROM json_each(?)) AND "standing" = 'open')
       GROUP BY "supplierId"`,
      params: [this.clock.today(), JSON.stringify(ids)],
    };
  }
}

function offersById(counts: OfferCount[]): Map<number, SupplierOffersDto> {
  return new Map(counts.map(({ supplierId, ...offers }) => [supplierId, offers]));
}
