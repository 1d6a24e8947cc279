import { Injectable } from '@nestjs/common';
import { addDays } from '@stageyard/libs/bill-of-materials';
import { InjectRepository } from '@nestjs/typeorm';
import { Repository } from 'typeorm';
import { containing } from '../common/like-text.js';
import { type Page, pageOf, parseListQuery } from '../common/list-query.js';
import type { MovementQueryDto } from './dto/movement-query.dto.js';
import { type MovementDto, toMovementDto } from './dto/movement.dto.js';
import { plainPlace } from './place-name.js';
import { StockMovement } from './entities/stock-movement.entity.js';

const TEXT = `(part.number LIKE :text ESCAPE '\\' OR part.description LIKE :text ESCAPE '\\'
  OR movement.reason LIKE :text ESCAPE '\\' OR movement.actorName LIKE :text ESCAPE '\\')`;

/** Reads the ledger. */
@Injectable()
export class MovementsReader {
  constructor(@InjectRepository(StockMovement) private readonly movements: Repository<StockMovement>) {}

  /** Movements that match, the newest first. */
  async list(query: MovementQueryDto): Promise<Page<MovementDto>> {
    const list = parseListQuery(query, ['at']);
    const direction = list.sorts[0]?.direction ?? 'DESC';
    const rows = this.movements
      .createQueryBuilder('movement')
      .innerJoinAndSelect('movement.part', 'part')
      .orderBy('movement.at', direction)
      .addOrderBy('movement.id', direction)
      .offset(list.skip)
      .limit(list.size);
    if (query.part) rows.andWhere('part.number = :part', { part: query.part.trim() });
    if (query.place) rows.andWhere('movement.place = :place', { place: plainPlace(query.place) });
    if (query.kind) rows.andWhere('movement.kind = :kind', { kind: query.kind });
    if (query.from) rows.andWhere('movement.at >= :from', { from: startOf(query.from) });
    if (query.until) rows.andWhere('movement.at < :end', { end: startOf(addDays(query.until, 1)) });
    if (list.text) rows.andWhere(TEXT, { text: containing(list.text) });
    const [movements, total] = await rows.getManyAndCount();
    return pageOf(
      movements.flatMap((movement) => (movement.part ? toMovementDto(movement, movement.part) : [])),
      total,
      list,
    );
  }
}

/** When a day began where the server stands, as moments are stored: ISO 8601, UTC. Without a zone it is local time. */
function startOf(day: string): string {
  return new Date(`${day}T00:00:00`).toISOString();
}
