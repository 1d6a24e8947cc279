import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, In, Repository } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { type Change } from '../audit/dto/change.js';
import { Clock } from '../common/clock.js';
import { notFound } from '../common/errors.js';
import { type ListQueryDto, type Page, pageOf, parseListQuery } from '../common/list-query.js';
import { rowId } from '../common/row-id.js';
import { statementOf } from '../database/list-statement.js';
import { ReadThreads } from '../database/read-threads.js';
import { OFFER_SORTS, type OfferQueryDto } from './dto/offer-query.dto.js';
import { type OfferDto, type OfferRow, toOfferDto } from './dto/offer.dto.js';
import { Offer } from './entities/offer.entity.js';
import { narrowOffers, orderOffers } from './offer-filters.js';

/** Reads offers; never one query a row. */
@Injectable()
export class OfferReader {
  constructor(
    @InjectRepository(Offer) private readonly offers: Repository<Offer>,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly threads: ReadThreads,
  ) {}

  /** One page of the offers, the last changed first when nothing else is asked for. */
  async page(query: OfferQueryDto): Promise<Page<OfferDto>> {
    const list = parseListQuery(query, OFFER_SORTS);
    const rows = this.offers.createQueryBuilder('offer');
    narrowOffers(rows, query, list.text, this.today());
    const count = statementOf(rows.clone().select('COUNT(*)', 'count'), { keep: true });
    orderOffers(rows, list.sorts);
    // Sorting ids alone keeps the sort small: whole rows are read for this page only.
    const page = statementOf(rows.select('offer.id', 'id').offset(list.skip).limit(list.size));
    const [counted, found] = await this.threads.read(count, page);
    const ids = (found ?? []).map(({ id }) => Number(id));
    return pageOf(await this.byIds(this.offers.manager, ids), Number(counted?.[0]?.count ?? 0), list);
  }

  /** @throws ProblemError 404 */
  async get(id: string): Promise<OfferDto> {
    return toOfferDto(await this.load(this.offers.manager, id), this.today());
  }

  /** @throws ProblemError 404 */
  async changes(id: string, query: ListQueryDto): Promise<Page<Change>> {
    const { offer } = await this.load(this.offers.manager, id);
    return this.audit.changesOf('offer', String(offer.id), query);
  }

  /** An offer with its part and supplier as a manager sees them, within a write too. @throws ProblemError 404 */
  async load(manager: EntityManager, id: string): Promise<OfferRow> {
    const found = await manager.findOne(Offer, {
      where: { id: rowId(id, 'offer') },
      relations: { part: true, supplier: true },
    });
    if (!found) throw notFound('offer', id);
    return toRow(found);
  }

  /** Offers in the order of the ids, within a write too. */
  async byIds(manager: EntityManager, ids: readonly number[]): Promise<OfferDto[]> {
    if (ids.length === 0) return [];
    const rows = await manager.find(Offer, {
      where: { id: In([...ids]) },
      relations: { part: true, supplier: true },
    });
    const found = new Map(rows.map((offer) => [offer.id, toOfferDto(toRow(offer), this.today())]));
    return ids.flatMap((id) => found.get(id) ?? []);
  }

  /** The day that states and ages are counted from, ISO 8601. */
  today(): string {
    return this.clock.today();
  }
}

function toRow({ part, supplier, ...offer }: Offer): OfferRow {
  if (!part || !supplier) throw new Error(`Offer ${offer.id} was read without its part and supplier.`);
  return { offer, part, supplier };
}
