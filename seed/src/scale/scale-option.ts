/** Most parts of a scale set. */
export const MOST_PARTS = 1_000_000;

/** The command line cannot be followed. */
export class ScaleOptionError extends Error {}

/**
 * How many parts the command line asks for: `--scale 250000` or `--scale=250000`.
 * @returns null when it asks for no scale set
 * @throws ScaleOptionError in plain words
 */
export function scaleOption(args: readonly string[]): number | null {
  const [first, ...rest] = args.flatMap((arg) =>
    arg.startsWith('--scale=') ? ['--scale', arg.slice('--scale='.length)] : [arg],
  );
  if (first === undefined) return null;
  if (first !== '--scale') throw new ScaleOptionError(`“${first}” is not known here. Only --scale N is.`);
  const [text, extra] = rest;
  const said = text === undefined || text === '' ? 'nothing follows it' : `“${text}” follows it`;
  if (extra !== undefined)
    throw new ScaleOptionError(`--scale takes one number; “${extra}” is one too many.`);
  const count = Number(text);
  if (!/^\d{1,7}$/.test(text ?? '') || count < 1 || count > MOST_PARTS) {
    const range = `from 1 to ${MOST_PARTS.toLocaleString('en-GB')}`;
    throw new ScaleOptionError(
      `--scale needs a whole number of parts ${range}; ${said}. Write it like --scale 250000.`,
    );
  }
  return count;
}
