import { expect, it, onTestFinished } from 'vitest';
import { openTempDatabase } from '../testing/temp-database.js';
import { toProblem } from './problem.filter.js';

it('tells of a full disk in words to act on, and of nothing inside', async () => {
  const database = await openTempDatabase();
  onTestFinished(() => database.close());
  const write = database.queue.run(async (manager) => {
    // The database takes no further page, as on a full disk.
    await manager.query('PRAGMA max_page_count = 1');
    await manager.query(`CREATE TABLE "filler" AS SELECT hex(zeroblob(100000)) AS "text"`);
  });
  const thrown: unknown = await write.catch((error: unknown) => error);
  const { statusCode, code, message } = toProblem(thrown);
  expect({ statusCode, code }).toEqual({ statusCode: 503, code: 'storage' });
  expect(message).toMatch(/nothing was saved\. The disk is full\. Free some space/);
  expect(message).not.toMatch(/SQLITE|filler/);
});

it('leaves a fault of the program without words about its inside', () => {
  const { statusCode, message } = toProblem(new TypeError('undefined is not a function'));
  expect(statusCode).toBe(500);
  expect(message).not.toContain('function');
});
