/** One statement for a reading thread; it cannot write. */
export interface ReadStatement {
  sql: string;
  params: readonly unknown[];
  /** The answer is kept until anything in the database changes: for counts, which are asked again with every page. */
  keep?: boolean;
  /** Run for every row found, with its first column; what it finds takes the row's place. */
  whole?: string;
}

/** What the pool hands to a thread: the statements see one and the same state of the database. */
export interface ReadTask {
  statements: readonly ReadStatement[];
}

/** Given to every reading thread at its start. */
export interface ReadThreadData {
  /** The database file. */
  file: string;
}

export type Row = Record<string, unknown>;

/** Rows as they travel between threads: their names once, which is far less to copy. */
export interface Table {
  columns: readonly string[];
  rows: readonly (readonly unknown[])[];
}

/** What a thread answers. A failure is data, since an error of the driver loses its words between threads. */
export type ReadReply = { tables: Table[] } | { failed: { message: string; code: string } };
