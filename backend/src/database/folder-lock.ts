import { chmodSync } from 'node:fs';
import path from 'node:path';
import Database from 'better-sqlite3';
import { makeDataFolder } from './data-sources.js';

export const LOCK_FILE = 'in-use.lock';

/** Another program works on the data folder. */
export class FolderInUseError extends Error {
  constructor(dataDir: string) {
    super(
      `Another Stageyard uses the data folder ${dataDir}. ` +
        'Stop that one first, or set STAGEYARD_DATA to another folder.',
    );
    this.name = 'FolderInUseError';
  }
}

/**
 * Keeps the data folder for this process: a second server would take the searches of the first for dead ones. The lock
 * is the system's own, held through an empty database file, so it ends with the process however that ends.
 * @returns gives the folder free again
 * @throws FolderInUseError
 */
export function lockFolder(dataDir: string): () => void {
  makeDataFolder(dataDir);
  const file = path.join(dataDir, LOCK_FILE);
  const lock = new Database(file, { timeout: 0 });
  try {
    chmodSync(file, 0o600);
    lock.exec('BEGIN EXCLUSIVE');
  } catch (error) {
    lock.close();
    if (error instanceof Database.SqliteError && error.code.startsWith('SQLITE_BUSY')) {
      throw new FolderInUseError(dataDir);
    }
    throw error;
  }
  return () => lock.close();
}
