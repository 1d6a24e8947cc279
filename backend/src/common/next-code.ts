import { type EntityManager, type EntityTarget, type ObjectLiteral } from 'typeorm';

/**
 * The next running code, such as `B-0001`; past 9999 it grows by a digit. Call it inside the write that uses it.
 * @param letter first letter of the codes of this kind of thing
 */
export async function nextCode<T extends ObjectLiteral>(
  manager: EntityManager,
  target: EntityTarget<T>,
  letter: string,
): Promise<string> {
  const row = await manager
    .createQueryBuilder(target, 'thing')
    .select('MAX(thing.id)', 'last')
    .getRawOne<{ last: number | null }>();
  return `${letter}-${String((row?.last ?? 0) + 1).padStart(4, '0')}`;
}
