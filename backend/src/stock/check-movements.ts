import { plainToInstance } from 'class-transformer';
import { validateSync } from 'class-validator';
import { badInput } from '../common/errors.js';
import { validationProblem } from '../common/validation.js';
import { under } from '../parts/under.js';
import { MovementInputDto } from './dto/movement-input.dto.js';

/** A movement that may have happened before it is booked. */
export interface PastMovement extends MovementInputDto {
  /** ISO 8601, UTC; the present when left out. */
  at?: string;
}

/**
 * Checks movements as the API checks one.
 * @param now no movement happens later
 * @throws ProblemError 400 naming `movements.<index>.…`
 */
export async function checkMovements(
  movements: readonly PastMovement[],
  now: Date,
  pause: () => Promise<void>,
): Promise<PastMovement[]> {
  const checked: PastMovement[] = [];
  for (const [index, { at, ...raw }] of movements.entries()) {
    const input = plainToInstance(MovementInputDto, raw, { exposeUnsetFields: false });
    const faults = validateSync(input, { whitelist: true, forbidNonWhitelisted: true });
    if (faults.length > 0) throw validationProblem([under(`movements.${index}`, faults)]);
    checked.push(at === undefined ? input : { ...input, at: checkedMoment(at, now, index) });
    await pause();
  }
  return checked;
}

function checkedMoment(at: string, now: Date, index: number): string {
  const moment = new Date(at);
  if (Number.isNaN(moment.getTime()) || moment > now) {
    const message = `movements.${index}.at must be a moment in the past, such as 2026-03-31T08:15:00Z.`;
    throw badInput([{ field: `movements.${index}.at`, value: at, message }]);
  }
  return moment.toISOString();
}
