import { Injectable } from '@nestjs/common';
import { type EntityManager } from 'typeorm';
import { AuditService, type AuditRecord } from '../audit/audit.service.js';
import { Clock } from '../common/clock.js';
import { ChangedMeanwhileError, notFound } from '../common/errors.js';
import { updateVersioned } from '../database/update-versioned.js';
import { WriteQueue } from '../database/write-queue.js';
import { StockLevels } from '../stock/stock-levels.service.js';
import { checkAttributes } from './check-attributes.js';
import { type PartAttributes } from './dto/attributes/part-attributes.js';
import { type PartInputDto } from './dto/part-input.dto.js';
import { type PartPatchDto } from './dto/part-patch.dto.js';
import { type PartDto, toPartDto } from './dto/part.dto.js';
import { Part } from './entities/part.entity.js';
import { newPart } from './new-part.js';
import { partChange } from './part-changes.js';
import { indexColumns } from './part-columns.js';
import { PartNumbers } from './part-numbers.service.js';
import { checkStandingStep, standingVerb } from './part-standing.js';
import { PartSuccessors } from './part-successors.service.js';

/** Who acts: a person, or the server by itself. */
export type Actor = AuditRecord['actor'];

/** Everything that changes the library; each change writes one row of the record of changes. */
@Injectable()
export class PartsService {
  constructor(
    private readonly queue: WriteQueue,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly numbers: PartNumbers,
    private readonly successors: PartSuccessors,
    private readonly levels: StockLevels,
  ) {}

  /**
   * Adds a part, as a draft unless the input says cleared.
   * @throws ProblemError 400 for attributes that make no sense, 409 when the number is taken
   */
  async create(actor: Actor, input: PartInputDto): Promise<PartDto> {
    const attributes = checkAttributes(input.kind, input.attributes);
    const part = await this.queue.run((manager) => this.insert(manager, actor, input, attributes));
    return toPartDto(part, null);
  }

  /** Adds a part inside a running transaction; the attributes must come from `checkAttributes`. */
  async insert(
    manager: EntityManager,
    actor: Actor,
    input: PartInputDto,
    attributes: PartAttributes,
  ): Promise<Part> {
    const now = this.clock.iso();
    const part = manager.create(Part, {
      ...newPart(input, attributes),
      number: await this.numbers.take(manager, input.number),
      createdAt: now,
      updatedAt: now,
      updatedBy: actor.name,
    });
    await manager.insert(Part, part);
    await this.audit.record(manager, {
      actor,
      action: 'added',
      entity: 'part',
      entityId: part.number,
      summary: `Added ${part.kind} ${part.number} “${part.description}” as ${part.standing}`,
      after: partChange(manager.create(Part), part).after,
    });
    return part;
  }

  /**
   * Changes a part if it is still as the person saw it.
   * @throws ProblemError 404; 400 for what makes no sense; 409 with `current` when it changed meanwhile
   */
  async update(actor: Actor, number: string, patch: PartPatchDto): Promise<PartDto> {
    return this.queue.run(async (manager) => {
      const shown = async (part: Part) => toPartDto(part, await this.levels.totalOf(part.id, manager));
      const before = await manager.findOneBy(Part, { number: number.trim() });
      if (!before) throw notFound('part', number);
      // A stale edit is told so first: its other faults may come from what the person could not see.
      if (before.version !== patch.version) throw new ChangedMeanwhileError(await shown(before));
      const change = await this.changedColumns(manager, before, patch);
      // Nothing changed: nothing to count up or to put on record.
      if (partChange(before, { ...before, ...change }).fields.length === 0) return shown(before);
      const after = await updateVersioned(
        manager,
        Part,
        { id: before.id },
        patch.version,
        { ...change, updatedAt: this.clock.iso(), updatedBy: actor.name },
        shown,
      );
      await this.recordChange(manager, actor, before, after);
      return shown(after);
    });
  }

  private async changedColumns(
    manager: EntityManager,
    before: Part,
    patch: PartPatchDto,
  ): Promise<Partial<Part>> {
    const standing = patch.standing ?? before.standing;
    checkStandingStep(before.standing, standing);
    const { attributes: raw, description, mass, supply, note, material, supplier, successorNumber } = patch;
    const attributes = raw && checkAttributes(before.kind, raw);
    // A part in use again needs no successor any more.
    const kept = standing === 'withdrawn' ? before.successorNumber : null;
    const successor = successorNumber === undefined ? kept : successorNumber;
    return {
      standing,
      ...given({ description, mass, supply, note }),
      ...(material === undefined ? {} : { material: material || null }),
      ...(supplier === undefined ? {} : { supplier: supplier || null }),
      successorNumber: await this.successors.check(manager, before, standing, successor),
      ...(attributes && { attributes, ...indexColumns(before.kind, attributes) }),
    };
  }

  private async recordChange(manager: EntityManager, actor: Actor, before: Part, after: Part): Promise<void> {
    const { fields, ...change } = partChange(before, after);
    const action = standingVerb(before.standing, after.standing);
    const successor = after.successorNumber ? `, use ${after.successorNumber} instead` : '';
    const summary =
      action === 'changed'
        ? `Changed ${fields.join(', ')} of ${after.number}`
        : `${action.charAt(0).toUpperCase()}${action.slice(1)} ${after.number}${successor}`;
    await this.audit.record(manager, {
      actor,
      action,
      entity: 'part',
      entityId: after.number,
      summary,
      ...change,
    });
  }
}

/** The fields that a patch really holds. */
function given<T extends object>(patch: T): Partial<T> {
  return Object.fromEntries(Object.entries(patch).filter(([, value]) => value !== undefined)) as Partial<T>;
}
