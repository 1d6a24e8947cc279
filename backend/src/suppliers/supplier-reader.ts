import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { type Change } from '../audit/dto/change.js';
import { Clock } from '../common/clock.js';
import { notFound } from '../common/errors.js';
import { containing } from '../common/like-text.js';
import { type ListQueryDto, type Page, pageOf, parseListQuery } from '../common/list-query.js';
import { type SupplierOffersDto } from './dto/supplier-offers.dto.js';
import { SUPPLIER_SORTS, type SupplierQueryDto } from './dto/supplier-query.dto.js';
import { NO_OFFERS, type SupplierDto, toSupplierDto } from './dto/supplier.dto.js';
import { Supplier } from './entities/supplier.entity.js';

/** Where the text of a list is looked for. */
const SEARCHED = ['code', 'name', 'address', 'note', 'contacts'];

/** Open offers that have not ended, of the supplier of the row. */
const OPEN_OFFERS = `(SELECT COUNT(*) FROM "offer" "o" WHERE "o"."supplierId" = supplier.id
  AND "o"."standing" = 'open' AND ("o"."validUntil" IS NULL OR "o"."validUntil" >= :today))`;

/** Reads suppliers; their offers are counted by one query a page. */
@Injectable()
export class SupplierReader {
  constructor(
    @InjectRepository(Supplier) private readonly suppliers: Repository<Supplier>,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  /** One page; sorted by name when nothing else is asked for. */
  async page(query: SupplierQueryDto): Promise<Page<SupplierDto>> {
    const list = parseListQuery(query, SUPPLIER_SORTS);
    const rows = this.suppliers.createQueryBuilder('supplier');
    if (query.standing) rows.andWhere('supplier.standing = :standing', { standing: query.standing });
    if (query.currency)
      rows.andWhere('supplier.currency = :currency', { currency: query.currency.toUpperCase() });
    if (list.text) {
      const fields = SEARCHED.map((field) => `supplier.${field} LIKE :text ESCAPE '\\'`);
      rows.andWhere(`(${fields.join(' OR ')})`, { text: containing(list.text) });
    }
    for (const { field, direction } of list.sorts) {
      if (field === 'offers') {
        rows.addSelect(OPEN_OFFERS, 'open_offers').setParameter('today', this.today());
        rows.addOrderBy('open_offers', direction);
      } else {
        rows.addOrderBy(`supplier.${field}`, direction, field === 'leadTimeDays' ? 'NULLS LAST' : undefined);
      }
    }
    if (list.sorts.length === 0) rows.addOrderBy('supplier.name', 'ASC');
    rows.addOrderBy('supplier.id', 'ASC').offset(list.skip).limit(list.size);
    const [found, total] = await rows.getManyAndCount();
    return pageOf(await this.withOffers(this.suppliers.manager, found), total, list);
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
    const offers = await this.countOffers(manager, [supplier.id]);
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

  private async withOffers(manager: EntityManager, suppliers: Supplier[]): Promise<SupplierDto[]> {
    const offers = await this.countOffers(
      manager,
      suppliers.map(({ id }) => id),
    );
    return suppliers.map((supplier) => toSupplierDto(supplier, offers.get(supplier.id) ?? NO_OFFERS));
  }

  private async countOffers(manager: EntityManager, ids: number[]): Promise<Map<number, SupplierOffersDto>> {
    if (ids.length === 0) return new Map();
    const marks = ids.map(() => '?').join(', ');
    const counts = await manager.query<({ supplierId: number } & SupplierOffersDto)[]>(
      `SELECT "supplierId", SUM("lasts") AS "open", SUM(NOT "lasts") AS "expired",
              MIN(CASE WHEN "lasts" THEN "pricedOn" END) AS "oldestPricedOn"
       FROM (SELECT "supplierId", "pricedOn", ("validUntil" IS NULL OR "validUntil" >= ?) AS "lasts"
             FROM "offer" WHERE "supplierId" IN (${marks}) AND "standing" = 'open')
       GROUP BY "supplierId"`,
      [this.today(), ...ids],
    );
    return new Map(counts.map(({ supplierId, ...offers }) => [supplierId, offers]));
  }

  private today(): string {
    return this.clock.iso().slice(0, 10);
  }
}
