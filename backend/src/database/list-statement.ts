import { type ObjectLiteral, type SelectQueryBuilder } from 'typeorm';
import { type ReadStatement } from './read-task.js';

/** A query as the reading threads take it. */
export function statementOf<T extends ObjectLiteral>(
  rows: SelectQueryBuilder<T>,
  options: Pick<ReadStatement, 'keep' | 'whole'> = {},
): ReadStatement {
  const [sql, params] = rows.getQueryAndParameters();
  return { sql, params: params as unknown[], ...options };
}
