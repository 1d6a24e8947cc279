import { type ReadStatement, type Table } from './read-task.js';

/** Answers remembered; filters of many people in an hour are fewer. */
const MOST_KEPT = 500;

/** Answers of statements, each good as long as nothing in the database changes. */
export class KeptTables {
  private readonly tables = new Map<string, Table>();
  private version: number | null = null;

  /** Names the state of the database that is read now; answers of another one are forgotten. */
  of(version: number): void {
    if (version === this.version) return;
    this.tables.clear();
    this.version = version;
  }

  /** The answer kept for the same statement with the same values, or a fresh one. */
  get(statement: ReadStatement, read: (statement: ReadStatement) => Table): Table {
    const key = JSON.stringify([statement.sql, statement.params]);
    const known = this.tables.get(key);
    if (known) return known;
    const fresh = read(statement);
    const [oldest] = this.tables.keys();
    if (this.tables.size >= MOST_KEPT && oldest !== undefined) this.tables.delete(oldest);
    this.tables.set(key, fresh);
    return fresh;
  }
}
