import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import { Clock } from '@stageyard/backend/common/clock';
import { AppModule } from '@stageyard/backend/app.module';
import { type Settings } from '@stageyard/backend/settings/settings';
import { UsersService } from '@stageyard/backend/users/users.service';
import { demoActors } from './actors.js';
import { bookLibrary } from './book-library.js';
import { bookStock } from './book-stock.js';
import { bookSupply } from './book-supply.js';
import { bookWork } from './book-work.js';
import { dayOf } from './demo-days.js';
import { fillEmptyFolder } from './empty-folder.js';

export type DemoLoad = {
  parts: number;
  briefs: number;
  trains: number;
  suppliers: number;
  offers: number;
  movements: number;
} | null;

/**
 * Fills a data folder that has no database with the demo workshop: all of it or nothing.
 * @returns what was booked; null where demo mode is off or the folder has a database already
 * @throws FolderInUseError while another program works on the folder
 */
export function loadDemo(settings: Settings): Promise<DemoLoad> {
  return fillEmptyFolder(settings, book);
}

async function book(settings: Settings): Promise<NonNullable<DemoLoad>> {
  const app = await NestFactory.createApplicationContext(AppModule.with(settings), {
    logger: ['error', 'warn'],
    abortOnError: false,
  });
  try {
    const actors = await demoActors(app.get(UsersService));
    const today = dayOf(app.get(Clock).now());
    const parts = await bookLibrary(app, actors);
    return {
      parts: parts.length,
      ...(await bookWork(app, actors)),
      ...(await bookSupply(app, actors, parts, today)),
      movements: await bookStock(app, actors, parts, today),
    };
  } finally {
    await app.close();
  }
}
