import { expect, it } from 'vitest';
import { throttle } from './throttle.js';

it('lets the first call through and then one each interval', () => {
  let time = 1000;
  const heard: number[] = [];
  const report = throttle(
    200,
    (value: number) => heard.push(value),
    () => time,
  );
  for (let step = 0; step <= 10; step += 1) {
    report(step);
    time += 50;
  }
  expect(heard).toEqual([0, 4, 8]);
});
