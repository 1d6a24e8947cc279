import { chmodSync, mkdirSync } from 'node:fs';
import path from 'node:path';
import { DataSource, type DataSourceOptions } from 'typeorm';
import { setUpReading, setUpWriting } from './connection.js';
import { ENTITIES } from './entities.js';
import { MIGRATIONS } from './migrations.js';

export const DATABASE_FILE = 'stageyard.db';

/** Creates the data folder when it is missing; nobody but the owner of the process may look into it. */
export function makeDataFolder(dataDir: string): void {
  mkdirSync(dataDir, { recursive: true, mode: 0o700 });
}

/**
 * Opens the writing data source and brings the schema up to date. Must be done before the reading one opens.
 * @throws Error when a migration fails or leaves a reference without its target; nothing is changed then
 */
export async function openWritingSource(dataDir: string): Promise<DataSource> {
  makeDataFolder(dataDir);
  const file = path.join(dataDir, DATABASE_FILE);
  const source = await new DataSource(writingOptions(file)).initialize();
  chmodSync(file, 0o600);
  await migrate(source);
  return source;
}

/** Options of the default data source. It cannot write, so a stray `save()` fails instead of joining a transaction. */
export function readingOptions(dataDir: string): DataSourceOptions {
  return {
    ...sharedOptions(path.join(dataDir, DATABASE_FILE)),
    readonly: true,
    prepareDatabase: setUpReading,
  };
}

function writingOptions(file: string): DataSourceOptions {
  return {
    ...sharedOptions(file),
    enableWAL: true,
    migrations: MIGRATIONS,
    prepareDatabase: setUpWriting,
  };
}

function sharedOptions(file: string) {
  return {
    type: 'better-sqlite3' as const,
    database: file,
    entities: ENTITIES,
    synchronize: false,
    logging: false as const,
  };
}

/** SQLite recreates tables to change them; with foreign keys on, that would empty their children. */
async function migrate(source: DataSource): Promise<void> {
  await source.query('PRAGMA foreign_keys = OFF');
  await source.runMigrations({ transaction: 'all' });
  const broken = await source.query<unknown[]>('PRAGMA foreign_key_check');
  if (broken.length > 0) {
    throw new Error(`${broken.length} rows of the database refer to rows that do not exist.`);
  }
  await source.query('PRAGMA foreign_keys = ON');
}
