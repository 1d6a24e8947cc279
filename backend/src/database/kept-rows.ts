import { type ReadStatement, type Row } from './read-task.js';

/** Answers remembered; filters of many people in an hour are fewer. */
const MOST_KEPT = 500;

/** Answers of statements, each good as long as nothing in the database changes. */
export class KeptRows {
  private readonly rows = new Map<string, Row[]>();
  private version: number | null = null;

  /** Names the state of the database that is read now; answers of another one are forgotten. */
  of(version: number): void {
    if (version === this.version) return;
    this.rows.clear();
    this.version = version;
  }

  /** The answer kept for the same statement with the same values, or a fresh one. */
  get(statement: ReadStatement, read: (statement: ReadStatement) => Row[]): Row[] {
    const key = JSON.stringify([statement.sql, statement.params]);
    const known = this.rows.get(key);
    if (known) return known;
    const fresh = read(statement);
    const [oldest] = this.rows.keys();
    if (this.rows.size >= MOST_KEPT && oldest !== undefined) this.rows.delete(oldest);
    this.rows.set(key, fresh);
    return fresh;
  }
}
