import { notFound } from './errors.js';

/** Ids travel as text; rows have whole numbers. Anything else names nothing, so it is not found. */
export function rowId(text: string, what: string): number {
  if (!/^[1-9]\d{0,14}$/.test(text)) throw notFound(what, text);
  return Number(text);
}
