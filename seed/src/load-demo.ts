import 'reflect-metadata';
import { existsSync, readdirSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import { NestFactory } from '@nestjs/core';
import { Clock } from '@stageyard/backend/common/clock';
import { AppModule } from '@stageyard/backend/app.module';
import { DATABASE_FILE } from '@stageyard/backend/database/data-sources';
import { LOCK_FILE, lockFolder } from '@stageyard/backend/database/folder-lock';
import { type Settings } from '@stageyard/backend/settings/settings';
import { UsersService } from '@stageyard/backend/users/users.service';
import { demoActors } from './actors.js';
import { bookLibrary } from './book-library.js';
import { bookStock } from './book-stock.js';
import { bookSupply } from './book-supply.js';
import { bookWork } from './book-work.js';
import { dayOf } from './demo-days.js';

/** Hidden, so that a loading cut short by a power failure leaves a data folder that still counts as empty. */
const WORKSHOP = '.demo-loading';

export type DemoLoad = {
  parts: number;
  briefs: number;
  trains: number;
  suppliers: number;
  offers: number;
  movements: number;
} | null;

/**
 * Fills a data folder that has no database with the demo workshop: all of it or nothing. The data is booked beside the
 * folder's final place and moved in when it is complete, the database file last.
 * @returns what was booked; null where demo mode is off or the folder has a database already
 * @throws FolderInUseError while another program works on the folder
 */
export async function loadDemo(settings: Settings): Promise<DemoLoad> {
  if (!settings.demo || existsSync(path.join(settings.dataDir, DATABASE_FILE))) return null;
  const release = lockFolder(settings.dataDir);
  try {
    return await bookBeside(settings);
  } finally {
    release();
  }
}

async function bookBeside(settings: Settings): Promise<DemoLoad> {
  // Another loading may have ended since the folder was looked at.
  if (existsSync(path.join(settings.dataDir, DATABASE_FILE))) return null;
  const workshop = path.join(settings.dataDir, WORKSHOP);
  rmSync(workshop, { recursive: true, force: true });
  try {
    const booked = await book({ ...settings, dataDir: workshop });
    moveIn(workshop, settings.dataDir);
    return booked;
  } finally {
    rmSync(workshop, { recursive: true, force: true });
  }
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

function moveIn(from: string, to: string): void {
  const names = readdirSync(from).filter((name) => name !== DATABASE_FILE && name !== LOCK_FILE);
  for (const name of [...names, DATABASE_FILE]) renameSync(path.join(from, name), path.join(to, name));
}
