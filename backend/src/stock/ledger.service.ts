import { Injectable } from '@nestjs/common';
import { type AuditRecord } from '../audit/audit.service.js';
import { conflict } from '../common/errors.js';
import { Part } from '../parts/entities/part.entity.js';
import type { MovementInputDto } from './dto/movement-input.dto.js';
import { type MovementDto, toMovementDto } from './dto/movement.dto.js';
import { type StockItemDto, toStockItem } from './dto/stock-item.dto.js';
import { StockMovement } from './entities/stock-movement.entity.js';
import type { LedgerPage, LedgerPart } from './ledger-page.js';
import { type AskedMovement, askedMovement, canStand, changeOf, impossible } from './movement-change.js';
import { movementText } from './movement-text.js';
import { placeKey } from './place-name.js';
import { StockLevels } from './stock-levels.service.js';

/** A movement in the ledger. */
export interface Booked {
  movement: MovementDto;
  /** False when the same request had booked it before. */
  isNew: boolean;
}

/** Puts one movement after the other into the ledger, inside a running transaction. */
@Injectable()
export class Ledger {
  constructor(private readonly levels: StockLevels) {}

  /**
   * Adds one movement. The caller writes the audit row.
   * @param at when it happened: ISO 8601, UTC
   * @throws ProblemError 400 for what makes no sense; 404 for an unknown part; 409 with the shelf as `current` when the
   * shelf cannot give that much, or changed since `seenMovementId`
   */
  async add(
    page: LedgerPage,
    actor: AuditRecord['actor'],
    input: MovementInputDto,
    at: string,
  ): Promise<Booked> {
    const part = await page.part(input.number);
    const asked = askedMovement(part, input);
    const place = await page.placeName(input.place);
    const first = input.requestKey ? await page.bookedBy(input.requestKey) : null;
    if (first) return { movement: sameAgain(first, part, place, asked), isNew: false };
    const before = await page.standing(part, place);
    if (input.seenMovementId !== undefined && input.seenMovementId !== before.lastMovementId) {
      throw await this.changedSince(page, part, place);
    }
    const change = changeOf(asked, before.quantity);
    if (!canStand(change)) throw impossible(asked, place, await this.itemOf(page, part));
    const movement = await page.add(part, {
      ...change,
      kind: asked.kind,
      place,
      reason: input.reason ?? '',
      at,
      actorId: actor.id,
      actorName: actor.name,
      requestKey: input.requestKey ?? null,
    });
    return { movement: toMovementDto(movement, part), isNew: true };
  }

  private async changedSince(page: LedgerPage, part: LedgerPart, place: string): Promise<Error> {
    const { lastMovementId } = await page.standing(part, place);
    const last = await page.manager.findOneBy(StockMovement, { id: lastMovementId });
    const since = last ? whatHappened(toMovementDto(last, part)) : `Nothing was booked at ${place} yet.`;
    const message = `${since} Your entry was not booked. Look again at what is there, then send it again.`;
    return conflict('changed-meanwhile', message, { current: await this.itemOf(page, part) });
  }

  private async itemOf({ manager }: LedgerPage, { id }: LedgerPart): Promise<StockItemDto> {
    const part = await manager.findOneByOrFail(Part, { id });
    return toStockItem(part, (await this.levels.ofPartIds([id], manager)).get(id));
  }
}

function whatHappened(movement: MovementDto): string {
  const { by, place, after, unit } = movement;
  const now = after.toLocaleString('en-GB', { maximumFractionDigits: 3 });
  return `Since you looked at ${place}, ${by} ${movementText(movement)}. Now the books say ${now} ${unit}.`;
}

/** @throws ProblemError 409 when the key was used for another movement */
function sameAgain(first: StockMovement, part: LedgerPart, place: string, asked: AskedMovement): MovementDto {
  const { kind, change, counted } = first;
  const amount = counted ?? (kind === 'issued' ? -change : change);
  const isSame =
    first.partId === part.id &&
    placeKey(first.place) === placeKey(place) &&
    kind === asked.kind &&
    amount === asked.amount;
  if (isSame) return toMovementDto(first, part);
  const message = 'This requestKey belongs to another movement. Nothing was booked. Send a new key.';
  throw conflict('request-key-used', message);
}
