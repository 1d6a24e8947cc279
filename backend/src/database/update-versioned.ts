import { type EntityManager, type EntityTarget, type FindOptionsWhere, type ObjectLiteral } from 'typeorm';
import { type QueryDeepPartialEntity } from 'typeorm/query-builder/QueryPartialEntity.js';
import { ChangedMeanwhileError, notFound } from '../common/errors.js';

interface VersionedEntity extends ObjectLiteral {
  version: number;
}

/**
 * Changes one row if it still has the version the person saw, and counts the version up.
 * @param where names the row; without the version
 * @param describe turns the row as it stands into what the 409 answer shows as `current`
 * @returns the row after the change
 * @throws ProblemError 404 when there is no such row
 * @throws ChangedMeanwhileError when the row has another version
 */
export async function updateVersioned<T extends VersionedEntity>(
  manager: EntityManager,
  target: EntityTarget<T>,
  where: FindOptionsWhere<T>,
  version: number,
  patch: QueryDeepPartialEntity<T>,
  describe: (current: T) => unknown = (current) => current,
): Promise<T> {
  const result = await manager
    .createQueryBuilder()
    .update(target)
    .set({ ...patch, version: version + 1 })
    .where({ ...where, version })
    .execute();
  const row = await manager.findOneBy(target, where);
  if (!row) throw notFound('entry', Object.values(where).map(String).join(', '));
  if (result.affected !== 1) throw new ChangedMeanwhileError(await describe(row));
  return row;
}
