import { Global, Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { SETTINGS, type Settings } from '../settings/settings.js';
import { openWritingSource, readingOptions } from './data-sources.js';
import { WriteQueue } from './write-queue.js';

/** Opens the writing data source, which nothing but the queue ever holds, and migrates. */
@Module({
  providers: [
    {
      provide: WriteQueue,
      inject: [SETTINGS],
      useFactory: async (settings: Settings) => new WriteQueue(await openWritingSource(settings.dataDir)),
    },
  ],
  exports: [WriteQueue],
})
export class WriteQueueModule {}

/**
 * The default data source is read-only and opens after the migrations: that is why it asks for the queue.
 * Read with `@InjectRepository` or `DataSource`; change things only through `WriteQueue`.
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
  exports: [WriteQueueModule, TypeOrmModule],
})
export class DatabaseModule {}
