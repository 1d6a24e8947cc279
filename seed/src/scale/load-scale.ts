import { existsSync } from 'node:fs';
import { type INestApplicationContext } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import { AppModule } from '@stageyard/backend/app.module';
import { BulkLoader } from '@stageyard/backend/bulk-loading/bulk-loader.service';
import { type BulkProgress, type BulkResult } from '@stageyard/backend/bulk-loading/bulk-messages';
import { type Settings } from '@stageyard/backend/settings/settings';
import { SuppliersService } from '@stageyard/backend/suppliers/suppliers.service';
import { UsersService } from '@stageyard/backend/users/users.service';
import { type Actors, demoActors } from '../actors.js';
import { fillEmptyFolder } from '../empty-folder.js';
import { type ScaleOptions } from './scale-rows.js';
import { SCALE_SUPPLIERS, type ScaleSupplier } from './scale-suppliers.js';

/** What every scale set grows from, unless another number is given. */
export const SCALE_SEED = 20_261;

export interface ScaleLoad {
  /** Parts. */
  count: number;
  seed?: number;
  onProgress?: (progress: BulkProgress) => void;
}

/**
 * Fills an empty data folder with the demo people, a few suppliers and as many parts with offers as asked for.
 * @returns null where demo mode is off or the folder has a database already
 */
export function loadScale(settings: Settings, load: ScaleLoad): Promise<BulkResult | null> {
  return fillEmptyFolder(settings, async (workshop) => {
    const app = await NestFactory.createApplicationContext(AppModule.with(workshop), {
      logger: ['error', 'warn'],
      abortOnError: false,
    });
    try {
      return await bookScale(app, load);
    } finally {
      await app.close();
    }
  });
}

/** Books a scale set into a running server. */
export async function bookScale(app: INestApplicationContext, load: ScaleLoad): Promise<BulkResult> {
  const { count, seed = SCALE_SEED, onProgress } = load;
  const { librarian } = await demoActors(app.get(UsersService));
  const suppliers = await bookSuppliers(app, librarian);
  const options: ScaleOptions = { count, seed, suppliers, today: new Date().toISOString().slice(0, 10) };
  const source = { module: rowsModule(), options };
  return app.get(BulkLoader).load(librarian, source, onProgress ? { onProgress } : {});
}

async function bookSuppliers(
  app: INestApplicationContext,
  librarian: Actors['librarian'],
): Promise<ScaleSupplier[]> {
  const booked: ScaleSupplier[] = [];
  for (const supplier of SCALE_SUPPLIERS) {
    const { code, name, currency } = await app.get(SuppliersService).create(librarian, { ...supplier });
    booked.push({ code, name, currency });
  }
  return booked;
}

/** A thread runs plain JavaScript, so from source (tests) the module of the last build is taken. */
function rowsModule(): string {
  const beside = new URL('./scale-rows.js', import.meta.url);
  return existsSync(beside) ? beside.href : new URL('../../dist/scale/scale-rows.js', import.meta.url).href;
}
