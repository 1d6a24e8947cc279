/** Escapes what a person typed for `LIKE … ESCAPE '\\'`, so that `%` and `_` mean themselves. */
export function containing(text: string): string {
  return `%${text.replace(/[\\%_]/g, (sign) => `\\${sign}`)}%`;
}
