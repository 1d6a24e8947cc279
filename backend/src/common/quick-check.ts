import { plainToInstance } from 'class-transformer';
import { getMetadataStorage, validateSync } from 'class-validator';
import { validationProblem } from './validation.js';

type Values = Record<string, unknown>;
type Rule = (value: unknown, holder: object) => boolean;

interface FieldRules {
  field: string;
  /** The field is checked only where all of these hold. */
  conditions: Rule[];
  rules: Rule[];
}

/** An input as its class takes it, or null where the long check must decide. */
export type QuickCheck<T extends object> = (raw: object) => T | null;

/**
 * Checks inputs by the rules that stand on their class, many times faster than the long check, for loading very many of
 * them. It only ever says yes: whatever it cannot settle — a fault, text to be trimmed, a rule of an unusual form —
 * it leaves to the long check, so that both always judge alike.
 * @param nested checks of fields that hold a list of objects
 */
export function quickCheck<T extends object>(
  type: new () => T,
  nested: Readonly<Record<string, QuickCheck<object>>> = {},
): QuickCheck<T> {
  const fields = rulesOf(type, nested);
  if (fields === null) return () => null;
  const known = new Set(fields.map(({ field }) => field));
  return (raw) => {
    for (const field of Object.keys(raw)) {
      if (!known.has(field) || (raw as Values)[field] === undefined) return null;
    }
    const instance = Object.assign(new type(), raw);
    for (const { field, conditions, rules } of fields) {
      const value = (instance as Values)[field];
      if (typeof value === 'string' && value !== value.trim()) return null;
      if (allHold(conditions, value, instance) && !allHold(rules, value, instance)) return null;
    }
    return instance;
  };
}

function allHold(rules: readonly Rule[], value: unknown, holder: object): boolean {
  for (const holds of rules) if (!holds(value, holder)) return false;
  return true;
}

/**
 * The input as its class takes it: by the quick check where that says yes, else by the long one.
 * @throws ProblemError listing every field at fault
 */
export function checkedInput<T extends object>(type: new () => T, quick: QuickCheck<T>, raw: object): T {
  const settled = quick(raw);
  if (settled) return settled;
  const input = plainToInstance(type, raw, { exposeUnsetFields: false });
  const faults = validateSync(input, {
    whitelist: true,
    forbidNonWhitelisted: true,
    forbidUnknownValues: false,
  });
  if (faults.length > 0) throw validationProblem(faults);
  return input;
}

/** The rules of every field of a class; null when one is of a form that is not known here. */
function rulesOf(
  type: new () => object,
  nested: Readonly<Record<string, QuickCheck<object>>>,
): FieldRules[] | null {
  const storage = getMetadataStorage();
  const { name: targetName } = type;
  const fields = new Map<string, FieldRules>();
  for (const metadata of storage.getTargetValidationMetadatas(type, '', false, false)) {
    const field = fields.get(metadata.propertyName) ?? {
      field: metadata.propertyName,
      conditions: [],
      rules: [],
    };
    fields.set(metadata.propertyName, field);
    const constraints = metadata.constraints as unknown[];
    if (metadata.type === 'conditionalValidation') {
      const [condition] = constraints as [(holder: object, value: unknown) => boolean];
      field.conditions.push((value, holder) => condition(holder, value));
    } else if (metadata.type === 'nestedValidation') {
      const each = nested[metadata.propertyName];
      if (!each) return null;
      field.rules.push((value) => Array.isArray(value) && value.every((one) => each(one as object) !== null));
    } else if (metadata.type === 'customValidation') {
      for (const { instance, async } of storage.getTargetValidatorConstraints(metadata.constraintCls)) {
        if (async || metadata.validateIf) return null;
        const { propertyName: property } = metadata;
        const passes: Rule = (value, object) =>
          instance.validate(value, { value, object, constraints, property, targetName }) === true;
        field.rules.push(
          metadata.each
            ? (value, holder) => Array.isArray(value) && value.every((one) => passes(one, holder))
            : passes,
        );
      }
    } else if (metadata.type !== 'whitelistValidation') return null;
  }
  return [...fields.values()];
}
