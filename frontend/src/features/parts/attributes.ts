import { formatPlain, NOTHING } from '../../components/figures';

/** Something with attributes; the schema types them per kind, the screens read them by name. */
interface WithAttributes {
  attributes: object;
}

export function attributeOf(part: WithAttributes, name: string): unknown {
  return (part.attributes as Record<string, unknown>)[name];
}

/** An attribute as a figure; null when it is not there or not a number. */
export function figureOf(part: WithAttributes, name: string): number | null {
  const value = attributeOf(part, name);
  return typeof value === 'number' ? value : null;
}

/** Any stored value as the screens write it. */
export function shownValue(value: unknown): string {
  if (value === null || value === undefined || value === '') return NOTHING;
  if (typeof value === 'number') return formatPlain(value);
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  return typeof value === 'string' ? value : JSON.stringify(value);
}
