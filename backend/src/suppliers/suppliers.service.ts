import { Injectable } from '@nestjs/common';
import { type EntityManager } from 'typeorm';
import { AuditService, type AuditRecord } from '../audit/audit.service.js';
import { Clock } from '../common/clock.js';
import { ChangedMeanwhileError, ProblemError } from '../common/errors.js';
import { nextCode } from '../common/next-code.js';
import { updateVersioned } from '../database/update-versioned.js';
import { WriteQueue } from '../database/write-queue.js';
import { checkFreight } from './check-freight.js';
import { type SupplierInputDto } from './dto/supplier-input.dto.js';
import { type SupplierPatchDto } from './dto/supplier-patch.dto.js';
import { type SupplierDto } from './dto/supplier.dto.js';
import { Supplier } from './entities/supplier.entity.js';
import { supplierChange } from './supplier-changes.js';
import { SupplierReader } from './supplier-reader.js';

type Actor = AuditRecord['actor'];

/** Everything that changes suppliers; each change writes one row of the record of changes. */
@Injectable()
export class SuppliersService {
  constructor(
    private readonly queue: WriteQueue,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly reader: SupplierReader,
  ) {}

  /** @throws ProblemError 400 for what makes no sense, 409 when another supplier has the name */
  async create(actor: Actor, input: SupplierInputDto): Promise<SupplierDto> {
    const freight = checkFreight(input.freight ?? { kind: 'as-charged', charge: null, freeFrom: null });
    return this.queue.run(async (manager) => {
      await this.refuseTakenName(manager, input.name);
      const now = this.clock.iso();
      const supplier = await manager.save(Supplier, {
        code: await nextCode(manager, Supplier, 'S'),
        name: input.name,
        standing: 'active' as const,
        currency: input.currency,
        language: input.language ?? ('en' as const),
        contacts: plain(input.contacts ?? []),
        address: input.address ?? '',
        freight,
        leastOrderValue: input.leastOrderValue ?? null,
        leadTimeDays: input.leadTimeDays ?? null,
        note: input.note ?? '',
        version: 1,
        createdAt: now,
        updatedAt: now,
        updatedBy: actor.name,
      });
      await this.audit.record(manager, {
        actor,
        action: 'added',
        entity: 'supplier',
        entityId: supplier.code,
        summary: `Added the supplier ${supplier.code} “${supplier.name}”`,
        after: supplierChange({}, supplier).after,
      });
      return this.reader.describe(manager, supplier);
    });
  }

  /**
   * Changes what the patch names. Another currency is for new offers: those that are there keep theirs.
   * @throws ProblemError 404; 400; 409 with `current` when it changed meanwhile, 409 when the name is taken
   */
  async update(actor: Actor, code: string, { version, ...patch }: SupplierPatchDto): Promise<SupplierDto> {
    return this.queue.run(async (manager) => {
      const before = await this.reader.load(manager, code);
      if (before.version !== version) {
        throw new ChangedMeanwhileError(await this.reader.describe(manager, before));
      }
      const { freight, contacts, ...others } = patch;
      const change: Partial<Supplier> = {
        ...given(others),
        ...(freight && { freight: checkFreight(freight) }),
        ...(contacts && { contacts: plain(contacts) }),
      };
      if (change.name !== undefined) await this.refuseTakenName(manager, change.name, before.id);
      // Nothing changed: nothing to count up or to put on record.
      if (supplierChange(before, { ...before, ...change }).fields.length === 0) {
        return this.reader.describe(manager, before);
      }
      const after = await updateVersioned(manager, Supplier, { id: before.id }, version, {
        ...change,
        updatedAt: this.clock.iso(),
        updatedBy: actor.name,
      });
      await this.recordChange(manager, actor, before, after);
      return this.reader.describe(manager, after);
    });
  }

  private async recordChange(
    manager: EntityManager,
    actor: Actor,
    before: Supplier,
    after: Supplier,
  ): Promise<void> {
    const { fields, ...change } = supplierChange(before, after);
    const action =
      before.standing === after.standing
        ? 'changed'
        : after.standing === 'closed'
          ? 'closed'
          : 'opened again';
    const summary =
      action === 'changed'
        ? `Changed ${fields.join(', ')} of ${after.code} “${after.name}”`
        : `${action === 'closed' ? 'Closed' : 'Opened again'} ${after.code} “${after.name}”`;
    await this.audit.record(manager, {
      actor,
      action,
      entity: 'supplier',
      entityId: after.code,
      summary,
      ...change,
    });
  }

  private async refuseTakenName(manager: EntityManager, name: string, ownId?: number): Promise<void> {
    const other = await manager.findOneBy(Supplier, { name });
    if (!other || other.id === ownId) return;
    const message = `${other.code} is called “${other.name}” already. Choose another name, or use that supplier.`;
    throw new ProblemError(409, 'name-taken', message, {
      errors: [{ field: 'name', value: name, message }],
    });
  }
}

/** Plain objects, as they come back from the database, so that the two can be compared. */
function plain<T extends object>(things: readonly T[]): T[] {
  return things.map((thing) => ({ ...thing }));
}

/** The fields that a patch really holds. */
function given<T extends object>(patch: T): Partial<T> {
  return Object.fromEntries(Object.entries(patch).filter(([, value]) => value !== undefined)) as Partial<T>;
}
