import { DataSource } from 'typeorm';
import { openWritingSource, readingOptions } from '../database/data-sources.js';
import { WriteQueue } from '../database/write-queue.js';
import { tempSettings } from './temp-settings.js';

export interface TempDatabase {
  dataDir: string;
  queue: WriteQueue;
  /** The read-only source, as services get it. */
  source: DataSource;
  /** The source inside the queue; services never see it. */
  writing: DataSource;
  close: () => Promise<void>;
}

/** A migrated database in a folder of its own, without the rest of the server. */
export async function openTempDatabase(): Promise<TempDatabase> {
  const { settings, remove } = tempSettings();
  const { dataDir } = settings;
  const writing = await openWritingSource(dataDir);
  const source = await new DataSource(readingOptions(dataDir)).initialize();
  const queue = new WriteQueue(writing);
  return {
    dataDir,
    queue,
    source,
    writing,
    close: async () => {
      await queue.onApplicationShutdown();
      await source.destroy();
      remove();
    },
  };
}
