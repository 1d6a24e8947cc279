import { Module } from '@nestjs/common';
import { SearchPool } from './search-pool.js';
import { workerEntry } from './worker-entry.js';

/** One pool of search threads for the whole server. */
@Module({
  providers: [
    { provide: SearchPool, useFactory: () => new SearchPool({ entry: workerEntry('option-search.worker') }) },
  ],
  exports: [SearchPool],
})
export class WorkersModule {}
