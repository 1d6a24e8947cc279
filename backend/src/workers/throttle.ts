/**
 * Lets the first call through, then at most one each interval; calls in between are dropped.
 * @param everyMs least time between two calls, ms
 * @param now clock in ms, replaceable in tests
 */
export function throttle<T>(
  everyMs: number,
  call: (value: T) => void,
  now: () => number = () => performance.now(),
): (value: T) => void {
  let last = -Infinity;
  return (value) => {
    const time = now();
    if (time - last < everyMs) return;
    last = time;
    call(value);
  };
}
