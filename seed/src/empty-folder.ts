import { existsSync, readdirSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import { DATABASE_FILE } from '@stageyard/backend/database/data-sources';
import { LOCK_FILE, lockFolder } from '@stageyard/backend/database/folder-lock';
import { type Settings } from '@stageyard/backend/settings/settings';

/** Hidden, so that a loading cut short by a power failure leaves a data folder that still counts as empty. */
const WORKSHOP = '.demo-loading';

/**
 * Fills a data folder that has no database: all of it or nothing. The data is booked beside the folder's final place and
 * moved in when it is complete, the database file last.
 * @param book books into the data folder of the settings that it is given
 * @returns what was booked; null where demo mode is off or the folder has a database already
 * @throws FolderInUseError while another program works on the folder
 */
export async function fillEmptyFolder<T>(
  settings: Settings,
  book: (settings: Settings) => Promise<T>,
): Promise<T | null> {
  if (!settings.demo || hasDatabase(settings)) return null;
  const release = lockFolder(settings.dataDir);
  try {
    return await bookBeside(settings, book);
  } finally {
    release();
  }
}

async function bookBeside<T>(
  settings: Settings,
  book: (settings: Settings) => Promise<T>,
): Promise<T | null> {
  // Another loading may have ended since the folder was looked at.
  if (hasDatabase(settings)) return null;
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

function hasDatabase({ dataDir }: Settings): boolean {
  return existsSync(path.join(dataDir, DATABASE_FILE));
}

function moveIn(from: string, to: string): void {
  const names = readdirSync(from).filter((name) => name !== DATABASE_FILE && name !== LOCK_FILE);
  for (const name of [...names, DATABASE_FILE]) renameSync(path.join(from, name), path.join(to, name));
}
