import path from 'node:path';
import { Global, Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { SETTINGS, type Settings } from '../settings/settings.js';
import { workerEntry } from '../workers/worker-entry.js';
import { DATABASE_FILE, openWritingSource, readingOptions } from './data-sources.js';
import { lockFolder } from './folder-lock.js';
import { ReadThreads } from './read-threads.js';
import { WriteQueue } from './write-queue.js';

async function openQueue(dataDir: string): Promise<WriteQueue> {
  const release = lockFolder(dataDir);
  try {
    return new WriteQueue(await openWritingSource(dataDir), release);
  } catch (error) {
    release();
    throw error;
  }
}

/** Keeps the data folder for this process, opens the writing data source, which nothing but the queue ever holds, and migrates. */
@Module({
  providers: [
    {
      provide: WriteQueue,
      inject: [SETTINGS],
      useFactory: (settings: Settings) => openQueue(settings.dataDir),
    },
  ],
  exports: [WriteQueue],
})
export class WriteQueueModule {}

/**
 * The default data source is read-only and opens after the migrations: that is why it asks for the queue.
 * Read with `@InjectRepository` or `DataSource`, long lists through `ReadThreads`; change things only through
 * `WriteQueue`.
 */
@Global()
@Module({
  imports: [
    WriteQueueModule,
    TypeOrmModule.forRootAsync({
      imports: [WriteQueueModule],
      inject: [SETTINGS, WriteQueue],
      useFactory: (settings: Settings) => ({ ...readingOptions(settings.dataDir), retryAttempts: 0 }),
    }),
  ],
  providers: [
    {
      // Asks for the queue, since threads open the database after the migrations.
      provide: ReadThreads,
      inject: [SETTINGS, WriteQueue],
      useFactory: (settings: Settings) =>
        new ReadThreads(workerEntry('read.worker'), path.join(settings.dataDir, DATABASE_FILE)),
    },
  ],
  exports: [WriteQueueModule, TypeOrmModule, ReadThreads],
})
export class DatabaseModule {}
