import { Injectable } from '@nestjs/common';
import { type EntityManager, In } from 'typeorm';
import { badInput, ProblemError } from '../common/errors.js';
import { PartNumberSeries } from './entities/part-number-series.entity.js';
import { Part } from './entities/part.entity.js';
import { partNumberProblem, RUNNING_PREFIX, runningNumber } from './part-number.js';

/** Running numbers looked up by one query. */
const MOST_ASKED_AT_ONCE = 500;

/** Gives out part numbers inside the transaction that adds the part. */
@Injectable()
export class PartNumbers {
  /**
   * The number a new part gets: the one asked for, or the next running one.
   * @throws ProblemError 400 when it is no part number; 409 when another part has it, whatever the case of its letters
   */
  async take(manager: EntityManager, asked: string | null | undefined): Promise<string> {
    const number = asked?.trim();
    if (!number) return this.next(manager);
    const problem = partNumberProblem(number);
    if (problem) throw badInput([{ field: 'number', value: asked, message: problem }]);
    const holder = await manager.findOneBy(Part, { number });
    if (holder) throw numberTaken(holder);
    return number;
  }

  /** The next running number that no part has; a number is never given out twice. */
  private async next(manager: EntityManager): Promise<string> {
    const series = await manager.findOneBy(PartNumberSeries, { prefix: RUNNING_PREFIX });
    let last = series?.last ?? 0;
    // Most often the first is free; where people typed such numbers in themselves, many are asked for at once.
    for (let batch = 1; ; batch = MOST_ASKED_AT_ONCE) {
      const candidates = Array.from({ length: batch }, (_, index) => last + 1 + index);
      const taken = await this.takenOf(manager, candidates.map(runningNumber));
      const free = candidates.find((count) => !taken.has(runningNumber(count)));
      if (free !== undefined) {
        await manager.upsert(PartNumberSeries, { prefix: RUNNING_PREFIX, last: free }, ['prefix']);
        return runningNumber(free);
      }
      last += batch;
    }
  }

  private async takenOf(manager: EntityManager, numbers: string[]): Promise<Set<string>> {
    const rows = await manager.find(Part, {
      select: { id: true, number: true },
      where: { number: In(numbers) },
    });
    return new Set(rows.map(({ number }) => number.toUpperCase()));
  }
}

function numberTaken({ number, description, standing }: Part): ProblemError {
  const message =
    `The number ${number} belongs to “${description}” (${standing}) already. ` +
    'Open that part to change it, choose another number, or leave the number blank for the next running one.';
  return new ProblemError(409, 'number-taken', message, {
    errors: [{ field: 'number', value: number, message }],
  });
}
