import { badInput } from '../common/errors.js';
import { type PartStanding } from './part-kinds.js';

/** draft → cleared → withdrawn, a draft may be given up at once, and a withdrawn part may be cleared again. */
const NEXT: Record<PartStanding, readonly PartStanding[]> = {
  draft: ['cleared', 'withdrawn'],
  cleared: ['withdrawn'],
  withdrawn: ['cleared'],
};

/** @throws ProblemError 400 naming `standing` when the step is not allowed */
export function checkStandingStep(from: PartStanding, to: PartStanding): void {
  if (from === to || NEXT[from].includes(to)) return;
  const allowed = NEXT[from].join(' or ');
  const message =
    to === 'draft'
      ? `A part that is ${from} does not become a draft again. Correct it as it is, or withdraw it and add a new one.`
      : `A part that is ${from} can only become ${allowed}.`;
  throw badInput([{ field: 'standing', value: to, limit: allowed, message }]);
}

/** A person's verb for the step, for the record of changes. */
export function standingVerb(from: PartStanding, to: PartStanding): string {
  if (from === to) return 'changed';
  if (to === 'withdrawn') return 'withdrew';
  return from === 'withdrawn' ? 'cleared again' : 'cleared';
}
