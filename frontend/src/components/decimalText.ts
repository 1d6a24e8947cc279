/** What a person typed as a number, read: a plain decimal literal, nothing at all, or a reason to refuse it. */
export type DecimalReading =
  { kind: 'blank' } | { kind: 'number'; text: string; value: number } | { kind: 'problem'; message: string };

const PLAIN = /^[+-]?(?:\d+(?:\.\d*)?|\.\d+)$/;
const THOUSANDS_OR_DECIMALS = /^[+-]?[1-9]\d{0,2},\d{3}$/;

/**
 * Reads a typed figure. A decimal comma and a decimal point are both welcome, blanks between digits are dropped.
 * `1,400` is refused: it could mean 1400 or 1.4, and a gearbox should not depend on a guess.
 */
export function readDecimal(typed: string): DecimalReading {
  const compact = typed.replace(/[\s\u00A0\u2009\u202F]/g, '').replace(/\u2212/g, '-');
  if (compact === '') return { kind: 'blank' };
  if (THOUSANDS_OR_DECIMALS.test(compact)) {
    const [whole = '', rest = ''] = compact.split(',');
    const asDecimal = `${whole}.${rest}`.replace(/0+$/, '');
    return {
      kind: 'problem',
      message: `“${typed.trim()}” can be read as ${whole}${rest} or as ${asDecimal}. Write it without the comma.`,
    };
  }
  const dotted = compact.includes(',') && !compact.includes('.') ? compact.replace(',', '.') : compact;
  if (!PLAIN.test(dotted) || dotted.length > 30) {
    return { kind: 'problem', message: `“${typed.trim().slice(0, 40)}” is not a number.` };
  }
  return { kind: 'number', text: tidy(dotted), value: Number(dotted) };
}

/** `.5` → `0.5`, `+3` → `3`, `7.` → `7`; every digit that was typed stays. */
function tidy(text: string): string {
  const unsigned = text.replace(/^[+-]/, '').replace(/^\./, '0.').replace(/\.$/, '');
  return text.startsWith('-') ? `-${unsigned}` : unsigned;
}
