/** Rows as tab-separated text that a spreadsheet takes in one paste; tabs and line ends inside a cell become blanks. */
export function toTsv(rows: readonly (readonly (string | number | null | undefined)[])[]): string {
  return rows
    .map((row) => row.map((cell) => String(cell ?? '').replace(/[\t\r\n]+/g, ' ')).join('\t'))
    .join('\n');
}

/** Puts rows on the clipboard; false when the browser forbids it. */
export async function copyTsv(rows: Parameters<typeof toTsv>[0]): Promise<boolean> {
  try {
    await navigator.clipboard.writeText(toTsv(rows));
    return true;
  } catch {
    return false;
  }
}
