import { Injectable } from '@nestjs/common';
import { plainToInstance } from 'class-transformer';
import { validateSync } from 'class-validator';
import { badInput, ProblemError } from '../common/errors.js';
import { politePause } from '../common/polite-pause.js';
import { validationProblem } from '../common/validation.js';
import { under } from './under.js';
import { WriteQueue } from '../database/write-queue.js';
import { DomainError } from '@stageyard/libs/units';
import { checkAttributes } from './check-attributes.js';
import { type PartAttributes } from './dto/attributes/part-attributes.js';
import { PartInputDto } from './dto/part-input.dto.js';
import { type Actor, PartsService } from './parts.service.js';

/** Parts written in one transaction: other writers wait that long. */
const CHUNK = 25;

interface CheckedPart {
  input: PartInputDto;
  attributes: PartAttributes;
}

/** Adds many parts by the same rules as one, without keeping anybody waiting. */
@Injectable()
export class PartsLoader {
  constructor(
    private readonly parts: PartsService,
    private readonly queue: WriteQueue,
  ) {}

  /**
   * Checks every input first, then adds them in chunks, each in its own transaction.
   * @returns the numbers, in the order of the inputs
   * @throws ProblemError naming `parts.<index>.…` before anything is added; 409 for a number that is taken, after the
   * chunks before it
   */
  async createMany(actor: Actor, inputs: readonly PartInputDto[]): Promise<string[]> {
    const pause = politePause();
    const checked: CheckedPart[] = [];
    for (const [index, input] of inputs.entries()) {
      checked.push(checkPart(input, index));
      await pause();
    }
    const numbers: string[] = [];
    for (let start = 0; start < checked.length; start += CHUNK) {
      const chunk = checked.slice(start, start + CHUNK);
      await this.queue.run(async (manager) => {
        for (const { input, attributes } of chunk) {
          numbers.push((await this.parts.insert(manager, actor, input, attributes)).number);
          // Reads go on beside an open transaction, so the loop may be left in the middle of one.
          await pause();
        }
      });
    }
    return numbers;
  }
}

function checkPart(raw: PartInputDto, index: number): CheckedPart {
  const input = plainToInstance(PartInputDto, raw);
  const faults = validateSync(input, { whitelist: true, forbidNonWhitelisted: true });
  if (faults.length > 0) throw validationProblem([under(`parts.${index}`, faults)]);
  try {
    return { input, attributes: checkAttributes(input.kind, input.attributes) };
  } catch (error) {
    if (!(error instanceof DomainError || error instanceof ProblemError)) throw error;
    throw badInput(
      (error.errors ?? []).map((issue) => ({ ...issue, field: `parts.${index}.${issue.field}` })),
    );
  }
}
