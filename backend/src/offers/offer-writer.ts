import { Injectable } from '@nestjs/common';
import { type EntityManager } from 'typeorm';
import { type AuditRecord, AuditService } from '../audit/audit.service.js';
import { Clock } from '../common/clock.js';
import { type Part } from '../parts/entities/part.entity.js';
import { type Supplier } from '../suppliers/entities/supplier.entity.js';
import { Offer } from './entities/offer.entity.js';
import { offerChange, type OfferContent, pricesText } from './offer-changes.js';

type Actor = AuditRecord['actor'];

/** Offers written by one statement: few statements, and none that keeps others waiting. */
const ROWS_AT_ONCE = 50;

/** What an offer belongs to. */
export interface OfferOwner {
  part: Pick<Part, 'id' | 'number'>;
  supplier: Pick<Supplier, 'id' | 'code'>;
}

export interface NewOffer extends OfferOwner {
  content: OfferContent;
}

export interface ChangedOffer extends OfferOwner {
  before: Offer;
  content: OfferContent;
}

/** Writes offers and their rows of the record inside a running transaction; what it is given is checked already. */
@Injectable()
export class OfferWriter {
  constructor(
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  /**
   * Adds offers.
   * @param pause called after each statement, so that others get their turn
   * @returns their ids, in the order given
   */
  async insert(
    manager: EntityManager,
    actor: Actor,
    offers: readonly NewOffer[],
    pause: () => Promise<void> = () => Promise.resolve(),
  ): Promise<number[]> {
    const first = (await lastId(manager)) + 1;
    const now = this.clock.iso();
    for (let start = 0; start < offers.length; start += ROWS_AT_ONCE) {
      const chunk = offers.slice(start, start + ROWS_AT_ONCE);
      const rows = chunk.map(({ part, supplier, content }, index) => ({
        ...content,
        id: first + start + index,
        partId: part.id,
        supplierId: supplier.id,
        version: 1,
        createdAt: now,
        updatedAt: now,
        updatedBy: actor.name,
      }));
      await manager.createQueryBuilder().insert().into(Offer).values(rows).updateEntity(false).execute();
      await this.audit.recordMany(
        manager,
        chunk.map(({ part, supplier, content }, index) => ({
          actor,
          action: 'added',
          entity: 'offer' as const,
          entityId: String(first + start + index),
          summary: `Added an offer of ${supplier.code} for ${part.number}: ${pricesText(content)}`,
          after: { part: part.number, supplier: supplier.code, ...content },
        })),
      );
      await pause();
    }
    return offers.map((_, index) => first + index);
  }

  /** Changes offers that are still as `before` says; the caller looked in this transaction. */
  async change(
    manager: EntityManager,
    actor: Actor,
    offers: readonly ChangedOffer[],
    pause: () => Promise<void> = () => Promise.resolve(),
  ): Promise<void> {
    const now = this.clock.iso();
    for (let start = 0; start < offers.length; start += ROWS_AT_ONCE) {
      const chunk = offers.slice(start, start + ROWS_AT_ONCE);
      const rows = chunk.map(({ before, content }) => ({
        id: before.id,
        partId: before.partId,
        supplierId: before.supplierId,
        ...content,
        version: before.version + 1,
        createdAt: before.createdAt,
        updatedAt: now,
        updatedBy: actor.name,
      }));
      await manager.upsert(Offer, rows, ['id']);
      await this.audit.recordMany(
        manager,
        chunk.map((offer) => changeRecord(actor, offer)),
      );
      await pause();
    }
  }
}

/** Offers are never deleted, so the next id follows the last one. */
async function lastId(manager: EntityManager): Promise<number> {
  const [row] = await manager.query<{ last: number | null }[]>('SELECT MAX("id") AS "last" FROM "offer"');
  return row?.last ?? 0;
}

function changeRecord(actor: Actor, { before, content, part, supplier }: ChangedOffer): AuditRecord {
  const { fields, ...change } = offerChange(before, content);
  const action =
    before.standing === content.standing
      ? 'changed'
      : content.standing === 'closed'
        ? 'closed'
        : 'opened again';
  const whose = `the offer of ${supplier.code} for ${part.number}`;
  const priced = fields.some((field) => ['breaks', 'currency', 'per'].includes(field));
  const summary =
    action === 'changed'
      ? `Changed ${fields.join(', ')} of ${whose}${priced ? `: ${pricesText(content)}` : ''}`
      : `${action === 'closed' ? 'Closed' : 'Opened again'} ${whose}`;
  return { actor, action, entity: 'offer', entityId: String(before.id), summary, ...change };
}
