import { validateOptionRequest } from '@stageyard/libs/train-planner';
import { DomainError } from '@stageyard/libs/units';
import type { Requirement } from '../../../api/types';
import { fieldForPath } from '../form/fieldNames';
import { envelopeHints } from './envelopeHints';
import { hintBasis, type Hint } from './hint';
import { directionHints, ratioHints, toleranceHints } from './ratioHints';
import { contactHints, moduleHints, undercutHints } from './toothHints';

/**
 * Live remarks on a brief. First what the planner itself would refuse; only when it refuses nothing, what the
 * figures mean for the search. Pure and quick (a few dozen gears), so it may run on every key press.
 */
export function briefHints(requirement: Requirement): Hint[] {
  const refused = refusals(requirement);
  if (refused.length > 0) return refused;
  const basis = hintBasis(requirement);
  const hints = [
    ...ratioHints(basis),
    ...toleranceHints(basis),
    ...directionHints(basis),
    ...undercutHints(basis),
    ...contactHints(basis),
    ...moduleHints(basis),
    ...envelopeHints(basis),
  ];
  return [...hints.filter(({ kind }) => kind === 'crossed'), ...hints.filter(({ kind }) => kind === 'note')];
}

function refusals(requirement: Requirement): Hint[] {
  // The duty only sizes shafts; the planner does not know it.
  const request = { ...requirement, duty: undefined };
  try {
    validateOptionRequest(request);
    return [];
  } catch (error) {
    if (!(error instanceof DomainError)) throw error;
    return error.errors.map(({ field, message }) => ({
      field: fieldForPath(field) ?? 'ratioTarget',
      kind: 'crossed',
      message,
    }));
  }
}
