import { badInput, type FieldIssue } from '../common/errors.js';
import { type FreightRule } from './supplier-terms.js';

const CHARGES: ReadonlySet<string> = new Set(['flat', 'free-from']);

/**
 * A freight rule as it is stored: it has the amounts that its kind needs, and no other.
 * @throws ProblemError 400 naming `freight.charge` or `freight.freeFrom`
 */
export function checkFreight({ kind, charge, freeFrom }: FreightRule): FreightRule {
  const issues: FieldIssue[] = [];
  const demand = (field: 'charge' | 'freeFrom', value: number | null, needed: boolean, what: string) => {
    if (needed && value === null) {
      issues.push({ field: `freight.${field}`, value, message: `Freight of this kind needs ${what}.` });
    }
    if (!needed && value !== null) {
      const message = `Freight of this kind has no ${what.replace('the ', '')}. Leave it empty, or choose another kind.`;
      issues.push({ field: `freight.${field}`, value, message });
    }
  };
  demand('charge', charge, CHARGES.has(kind), 'the charge of one order');
  demand('freeFrom', freeFrom, kind === 'free-from', 'the order value from which it is free');
  if (issues.length > 0) throw badInput(issues);
  return { kind, charge, freeFrom };
}
