/** Today in the reader's own time zone, `YYYY-MM-DD`. */
export function todayIso(now = new Date()): string {
  const two = (figure: number) => String(figure).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}
