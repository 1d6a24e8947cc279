import { Injectable } from '@nestjs/common';
import { type EntityManager } from 'typeorm';
import { badInput, ProblemError } from '../common/errors.js';
import { PartNumberSeries } from './entities/part-number-series.entity.js';
import { Part } from './entities/part.entity.js';
import { partNumberProblem, RUNNING_PREFIX, runningNumber } from './part-number.js';

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
    let number: string;
    do {
      last += 1;
      number = runningNumber(last);
    } while (await manager.existsBy(Part, { number }));
    await manager.upsert(PartNumberSeries, { prefix: RUNNING_PREFIX, last }, ['prefix']);
    return number;
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
