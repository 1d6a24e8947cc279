import Database from 'better-sqlite3';

const BUSY_TIMEOUT_MS = 5000;
/** 64 MiB: with the driver's 2 MiB, lists over 300,000 parts take three times as long (negative means KiB). */
const CACHE_SIZE = -64 * 1024;

/** Settings of every connection that reads: it cannot write. */
export function setUpReading(database: Database.Database): void {
  setUpShared(database);
  database.pragma('query_only = ON');
}

/** Settings of the connection inside the write queue, which waits for the disk itself: see `WriteLog`. */
export function setUpWriting(database: Database.Database): void {
  setUpShared(database);
  database.pragma('synchronous = NORMAL');
}

/** A connection for a thread that only reads. @throws Error when there is no such file */
export function openReading(file: string): Database.Database {
  const database = new Database(file, { readonly: true, fileMustExist: true });
  setUpReading(database);
  return database;
}

/** A connection for a thread that writes in turns of the write queue. @throws Error when there is no such file */
export function openWriting(file: string): Database.Database {
  const database = new Database(file, { fileMustExist: true });
  setUpShared(database);
  // Every commit waits for the disk: with the weaker setting a power failure may lose the last ones.
  database.pragma('synchronous = FULL');
  database.pragma('foreign_keys = ON');
  return database;
}

function setUpShared(database: Database.Database): void {
  database.pragma(`busy_timeout = ${BUSY_TIMEOUT_MS}`);
  database.pragma(`cache_size = ${CACHE_SIZE}`);
}
