import { Injectable } from '@nestjs/common';
import { type EntityManager } from 'typeorm';
import { type AuditRecord } from '../audit/audit.service.js';
import { badInput, ChangedMeanwhileError, conflict } from '../common/errors.js';
import { WriteQueue } from '../database/write-queue.js';
import { Part } from '../parts/entities/part.entity.js';
import { Supplier } from '../suppliers/entities/supplier.entity.js';
import { type OfferInputDto } from './dto/offer-input.dto.js';
import { type OfferPatchDto } from './dto/offer-patch.dto.js';
import { type OfferDto, toOfferDto } from './dto/offer.dto.js';
import { Offer } from './entities/offer.entity.js';
import { offerChange, type OfferContent, storedContent } from './offer-changes.js';
import { checkContent, closedReasons } from './offer-content.js';
import { OfferReader } from './offer-reader.js';
import { type NewOffer, OfferWriter } from './offer-writer.js';
import { resolvedOffer } from './resolved-offer.js';

type Actor = AuditRecord['actor'];

/** Everything that changes single offers; each change writes one row of the record of changes. */
@Injectable()
export class OffersService {
  constructor(
    private readonly queue: WriteQueue,
    private readonly reader: OfferReader,
    private readonly writer: OfferWriter,
  ) {}

  /**
   * Adds an offer.
   * @throws ProblemError 400 for terms that make no sense, an unknown or withdrawn part, an unknown or closed supplier;
   * 409 `offer-doubled` when the very same offer is open already
   */
  async create(actor: Actor, input: OfferInputDto): Promise<OfferDto> {
    return this.queue.run(async (manager) => {
      const offer = await this.resolve(manager, input);
      await this.refuseDouble(manager, offer);
      const ids = await this.writer.insert(manager, actor, [offer]);
      const [added] = await this.reader.byIds(manager, ids);
      if (!added) throw new Error('The offer that was added is not there.');
      return added;
    });
  }

  /**
   * Changes an offer if it is still as the person saw it.
   * @throws ProblemError 404; 400 for what makes no sense; 409 with `current` when it changed meanwhile
   */
  async update(actor: Actor, id: string, { version, ...patch }: OfferPatchDto): Promise<OfferDto> {
    return this.queue.run(async (manager) => {
      const row = await this.reader.load(manager, id);
      const { offer: before, part, supplier } = row;
      if (before.version !== version) throw new ChangedMeanwhileError(toOfferDto(row, this.reader.today()));
      const content = patched(before, patch);
      if (before.standing === 'closed' && content.standing === 'open') {
        const reasons = closedReasons(part, supplier);
        if (reasons.length > 0) throw badInput(reasons.map((issue) => ({ ...issue, field: 'standing' })));
      }
      checkContent(content, part, this.reader.today());
      // Nothing changed: nothing to count up or to put on record.
      if (offerChange(before, content).fields.length > 0) {
        await this.writer.change(manager, actor, [{ before, content, part, supplier }]);
      }
      return toOfferDto(await this.reader.load(manager, id), this.reader.today());
    });
  }

  private async resolve(manager: EntityManager, input: OfferInputDto): Promise<NewOffer> {
    const [part, supplier] = await Promise.all([
      manager.findOneBy(Part, { number: input.partNumber.trim() }),
      manager.findOneBy(Supplier, { code: input.supplierCode.trim().toUpperCase() }),
    ]);
    return resolvedOffer(input, part, supplier, this.reader.today());
  }

  /** A form sent twice must not become two offers. */
  private async refuseDouble(manager: EntityManager, { part, supplier, content }: NewOffer): Promise<void> {
    const others = await manager.find(Offer, {
      where: { partId: part.id, supplierId: supplier.id, standing: 'open' },
    });
    const same = others.find((other) => offerChange(other, content).fields.length === 0);
    if (!same) return;
    const [current] = await this.reader.byIds(manager, [same.id]);
    const message = `${supplier.code} has this very offer for ${part.number} already, so nothing was added. Change that one if its terms changed.`;
    throw conflict('offer-doubled', message, { current });
  }
}

function patched(before: Offer, { breaks, ...patch }: Omit<OfferPatchDto, 'version'>): OfferContent {
  const given = Object.fromEntries(Object.entries(patch).filter(([, value]) => value !== undefined));
  return {
    ...storedContent(before),
    ...(given as Partial<OfferContent>),
    // Plain objects, as they come back from the database, so that the two can be compared.
    ...(breaks && { breaks: breaks.map(({ quantity, unitPrice }) => ({ quantity, unitPrice })) }),
  };
}
