import { Injectable } from '@nestjs/common';
import { type AuditRecord, AuditService } from '../audit/audit.service.js';
import { Clock } from '../common/clock.js';
import { notFound } from '../common/errors.js';
import { politePause } from '../common/polite-pause.js';
import { updateVersioned } from '../database/update-versioned.js';
import { WriteQueue } from '../database/write-queue.js';
import { Part } from '../parts/entities/part.entity.js';
import { unitOf } from '../parts/part-unit.js';
import { checkMovements, type PastMovement } from './check-movements.js';
import type { LeastStockInputDto } from './dto/least-stock-input.dto.js';
import type { MovementInputDto } from './dto/movement-input.dto.js';
import { type StockItemDto, toStockItem } from './dto/stock-item.dto.js';
import { type Booked, Ledger } from './ledger.service.js';
import { LedgerPage } from './ledger-page.js';
import { movementText } from './movement-text.js';
import { StockLevels } from './stock-levels.service.js';
import { quantityText, toThousandths } from './thousandths.js';

type Actor = AuditRecord['actor'];

/** Movements booked in one transaction: other writers wait that long. */
const CHUNK = 100;

/** The only way to change a shelf quantity: movements are added, and the database sums them up. */
@Injectable()
export class StockService {
  constructor(
    private readonly queue: WriteQueue,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly ledger: Ledger,
    private readonly levels: StockLevels,
  ) {}

  /**
   * Books one movement. The same `requestKey` sent again books nothing and gives the first movement.
   * @throws ProblemError 400 for what makes no sense; 404 for an unknown part; 409 with the shelf as `current` when the
   * shelf cannot give that much, or changed since `seenMovementId`
   */
  book(actor: Actor, input: MovementInputDto): Promise<Booked> {
    return this.queue.run(async (manager) => {
      const booked = await this.ledger.add(new LedgerPage(manager), actor, input, this.clock.iso());
      const { movement, isNew } = booked;
      if (isNew) {
        await this.audit.record(manager, {
          actor,
          action: movement.kind,
          entity: 'stock',
          entityId: movement.number,
          summary: `${capital(movementText(movement))} of ${movement.number} at ${movement.place}`,
          after: movement,
        });
      }
      return booked;
    });
  }

  /**
   * Books many movements by the same rules as one, in their order, in chunks of one transaction each and without keeping
   * anybody waiting. Each may say when it happened. A chunk leaves one row in the record of changes.
   * @returns how many were booked: those with a request key that was booked before are not booked again
   * @throws ProblemError 400 naming `movements.<index>.…` before anything is booked; 404 and 409 as `book`, after the
   * chunks before it
   */
  async bookMany(actor: Actor, movements: readonly PastMovement[]): Promise<number> {
    const pause = politePause();
    const checked = await checkMovements(movements, this.clock.now(), pause);
    let booked = 0;
    for (let start = 0; start < checked.length; start += CHUNK) {
      booked += await this.bookChunk(actor, checked.slice(start, start + CHUNK), pause);
    }
    return booked;
  }

  /**
   * Says from when on the shelf of a part counts as low.
   * @throws ProblemError 400 for parts of a piece; 404; 409 with the shelf as `current` when the part changed meanwhile
   */
  setLeast(actor: Actor, number: string, { leastStock, version }: LeastStockInputDto): Promise<StockItemDto> {
    return this.queue.run(async (manager) => {
      const itemOf = async (part: Part) =>
        toStockItem(part, (await this.levels.ofPartIds([part.id], manager)).get(part.id));
      const before = await manager.findOneBy(Part, { number: number.trim() });
      if (!before) throw notFound('part', number);
      const unit = unitOf(before.kind);
      const least =
        leastStock === null || leastStock === undefined
          ? null
          : toThousandths(leastStock, unit, 'leastStock');
      const patch = { leastStock: least, updatedAt: this.clock.iso(), updatedBy: actor.name };
      if (before.version === version && before.leastStock === least) return itemOf(before);
      const after = await updateVersioned(manager, Part, { id: before.id }, version, patch, itemOf);
      const item = await itemOf(after);
      await this.audit.record(manager, {
        actor,
        action: 'changed',
        entity: 'part',
        entityId: after.number,
        summary:
          least === null
            ? `Nobody watches the shelf of ${after.number} any more`
            : `Set the least stock of ${after.number} to ${quantityText(least, unit)}`,
        before: { leastStock: toStockItem(before, undefined).leastStock },
        after: { leastStock: item.leastStock },
      });
      return item;
    });
  }

  private bookChunk(
    actor: Actor,
    chunk: readonly PastMovement[],
    pause: () => Promise<void>,
  ): Promise<number> {
    return this.queue.run(async (manager) => {
      const page = new LedgerPage(manager);
      const numbers = new Set<string>();
      let booked = 0;
      for (const movement of chunk) {
        const { at = this.clock.iso(), ...input } = movement;
        const result = await this.ledger.add(page, actor, input, at);
        if (result.isNew) booked += 1;
        numbers.add(result.movement.number);
        // Reads go on beside an open transaction, so the loop may be left in the middle of one.
        await pause();
      }
      if (booked > 0) {
        await this.audit.record(manager, {
          actor,
          action: 'booked',
          entity: 'stock',
          entityId: [...numbers][0] ?? '',
          summary: `Booked ${booked} stock movements of ${numbers.size} parts`,
        });
      }
      return booked;
    });
  }
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
