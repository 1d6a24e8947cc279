import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { addDays } from '@stageyard/libs/bill-of-materials';
import { In, Repository } from 'typeorm';
import { containing } from '../common/like-text.js';
import { type Page, pageOf, parseListQuery } from '../common/list-query.js';
import { statementOf } from '../database/list-statement.js';
import { ReadThreads } from '../database/read-threads.js';
import type { MovementQueryDto } from './dto/movement-query.dto.js';
import { type MovementDto, toMovementDto } from './dto/movement.dto.js';
import { StockMovement } from './entities/stock-movement.entity.js';
import { plainPlace } from './place-name.js';

const OF_PART = 'movement.partId = (SELECT "id" FROM "part" WHERE "number" = :part)';

const TEXT = `(movement.reason LIKE :text ESCAPE '\\' OR movement.actorName LIKE :text ESCAPE '\\'
  OR movement.partId IN (SELECT "id" FROM "part" WHERE "number" LIKE :text ESCAPE '\\' OR "description" LIKE :text ESCAPE '\\'))`;

/** Reads the ledger. */
@Injectable()
export class MovementsReader {
  constructor(
    @InjectRepository(StockMovement) private readonly movements: Repository<StockMovement>,
    private readonly threads: ReadThreads,
  ) {}

  /** Movements that match, the newest first. */
  async list(query: MovementQueryDto): Promise<Page<MovementDto>> {
    const list = parseListQuery(query, ['at']);
    const direction = list.sorts[0]?.direction ?? 'DESC';
    const rows = this.movements.createQueryBuilder('movement');
    if (query.part) rows.andWhere(OF_PART, { part: query.part.trim() });
    if (query.place) rows.andWhere('movement.place = :place', { place: plainPlace(query.place) });
    if (query.kind) rows.andWhere('movement.kind = :kind', { kind: query.kind });
    if (query.from) rows.andWhere('movement.at >= :from', { from: startOf(query.from) });
    if (query.until) rows.andWhere('movement.at < :end', { end: startOf(addDays(query.until, 1)) });
    if (list.text) rows.andWhere(TEXT, { text: containing(list.text) });
    const count = statementOf(rows.clone().select('COUNT(*)', 'count'), { keep: true });
    // A ledger grows for ever: counting it, or going far back, takes longer than the server's loop may be held.
    const page = rows.orderBy('movement.at', direction).addOrderBy('movement.id', direction);
    page.select('movement.id', 'id').offset(list.skip).limit(list.size);
    const [counted, found] = await this.threads.read(count, statementOf(page));
    const ids = (found ?? []).map(({ id }) => Number(id));
    return pageOf(await this.byIds(ids), Number(counted?.[0]?.count ?? 0), list);
  }

  /** Movements in the order of the ids. */
  private async byIds(ids: number[]): Promise<MovementDto[]> {
    const rows = await this.movements.find({ where: { id: In(ids) }, relations: { part: true } });
    const found = new Map(rows.map((movement) => [movement.id, movement]));
    return ids.flatMap((id) => {
      const movement = found.get(id);
      return movement?.part ? toMovementDto(movement, movement.part) : [];
    });
  }
}

/** When a day began where the server stands, as moments are stored: ISO 8601, UTC. Without a zone it is local time. */
function startOf(day: string): string {
  return new Date(`${day}T00:00:00`).toISOString();
}
