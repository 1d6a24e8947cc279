import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type PartFinder, type PartNeed, type PartRef } from '@stageyard/libs/bill-of-materials';
import { Repository } from 'typeorm';
import { Part } from './entities/part.entity.js';
import { toPartRef } from './part-ref.js';
import { narrowToNeed } from './stock-conditions.js';

/** A kit asks in a few rounds at most: what it found may lead to further needs. */
const MOST_ROUNDS = 20;

/** Looks up what a kit needs among the cleared parts of the library. */
@Injectable()
export class StockFinder {
  constructor(@InjectRepository(Part) private readonly parts: Repository<Part>) {}

  /**
   * The best cleared part that meets the need, or null: the smallest that is large enough, then the lowest number.
   * A part named by its number is returned whatever its standing; the kit flags a draft or withdrawn one.
   */
  async findForKit(need: PartNeed): Promise<PartRef | null> {
    if ('partNumber' in need && need.partNumber) {
      const named = await this.parts.findOneBy({ number: need.partNumber });
      return named && toPartRef(named);
    }
    const rows = this.parts
      .createQueryBuilder('part')
      .where('part.kind = :kind AND part.standing = :standing', { kind: need.kind, standing: 'cleared' });
    narrowToNeed(rows, need);
    const found = await rows.addOrderBy('part.number', 'ASC').limit(1).getOne();
    return found && toPartRef(found);
  }

  /**
   * Runs a kit that asks for parts while it is built. The kit cannot wait for the database, so it is run with what is
   * known so far, the parts it missed are looked up, and it runs again until it misses nothing.
   */
  async gather<T>(build: (finder: PartFinder) => T): Promise<T> {
    const known = new Map<string, PartRef | null>();
    for (let round = 0; round < MOST_ROUNDS; round++) {
      const missed = new Map<string, PartNeed>();
      const result = build({
        find: (need) => {
          const key = JSON.stringify(need);
          if (!known.has(key)) missed.set(key, need);
          return known.get(key) ?? null;
        },
      });
      if (missed.size === 0) return result;
      for (const [key, need] of missed) known.set(key, await this.findForKit(need));
    }
    throw new Error('A kit kept asking for other parts and never came to an end.');
  }
}
