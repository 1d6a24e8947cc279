import { type EntityManager } from 'typeorm';
import { Part } from '../parts/entities/part.entity.js';

/**
 * Copies a part many times, for tests that need many parts and not their making: `COPY-00001` and so on.
 * @param manager of a running write
 * @returns the numbers of the copies
 */
export async function copyPart(manager: EntityManager, number: string, count: number): Promise<string[]> {
  const columns = manager.connection
    .getMetadata(Part)
    .columns.map(({ databaseName }) => databaseName)
    .filter((name) => name !== 'id' && name !== 'number')
    .map((name) => `"${name}"`)
    .join(', ');
  await manager.query(
    `WITH RECURSIVE "copies"("n") AS (SELECT 1 UNION ALL SELECT "n" + 1 FROM "copies" WHERE "n" < ?)
     INSERT INTO "part" ("number", ${columns})
     SELECT printf('COPY-%05d', "n"), ${columns} FROM "copies", "part" WHERE "part"."number" = ?`,
    [count, number],
  );
  return Array.from({ length: count }, (_, index) => `COPY-${String(index + 1).padStart(5, '0')}`);
}
