/**
 * The numbers 0 … length − 1 in the order of `compare`, equal ones in their own order. A merge sort that calls
 * `step` as it goes, so that a caller can report and stop while 100,000s of rows are sorted.
 */
export function sortedOrder(
  length: number,
  compare: (a: number, b: number) => number,
  step: () => void,
): Uint32Array {
  let from = new Uint32Array(length);
  for (let index = 0; index < length; index++) from[index] = index;
  let to = new Uint32Array(length);
  for (let width = 1; width < length; width *= 2) {
    for (let start = 0; start < length; start += 2 * width) {
      const middle = Math.min(start + width, length);
      const end = Math.min(start + 2 * width, length);
      let left = start;
      let right = middle;
      for (let at = start; at < end; at++) {
        step();
        const takeLeft =
          right >= end || (left < middle && compare(from[left] as number, from[right] as number) <= 0);
        to[at] = from[takeLeft ? left++ : right++] as number;
      }
    }
    [from, to] = [to, from];
  }
  return from;
}
