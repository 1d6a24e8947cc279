import { type FileHandle, open } from 'node:fs/promises';

/**
 * The log into which SQLite writes its commits (`…-wal`). The writing connection leaves out waiting for the disk, which
 * would hold the server's loop; the queue waits here instead before it says that a write is done.
 */
export class WriteLog {
  readonly #file: string;
  #handle: FileHandle | null = null;

  /** @param database the database file; the log stands beside it as long as the writing connection is open */
  constructor(database: string) {
    this.#file = `${database}-wal`;
  }

  /** Resolves once everything committed so far would outlive a power failure. @throws Error of the file system */
  async toDisk(): Promise<void> {
    this.#handle ??= await open(this.#file, 'r');
    await this.#handle.datasync();
  }

  async close(): Promise<void> {
    await this.#handle?.close();
    this.#handle = null;
  }
}
