import { randomBytes } from 'node:crypto';
import { chmodSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { makeDataFolder } from '../database/data-sources.js';

const SECRET_FILE = 'session-secret';
const SHORTEST = 32;

/**
 * The key that signs session cookies. Made at the first start and kept in the data folder, readable by the
 * owner only.
 * @throws Error when the file is there but holds no key
 */
export function sessionSecret(dataDir: string): string {
  makeDataFolder(dataDir);
  const file = path.join(dataDir, SECRET_FILE);
  try {
    // `wx`: two starts at once end up with one and the same key.
    writeFileSync(file, randomBytes(48).toString('base64url'), { mode: 0o600, flag: 'wx' });
  } catch (error) {
    if (!(error instanceof Error) || !('code' in error) || error.code !== 'EEXIST') throw error;
  }
  chmodSync(file, 0o600);
  const secret = readFileSync(file, 'utf8').trim();
  if (secret.length < SHORTEST)
    throw new Error(`${file} holds no key. Delete it and start again; everybody signs in anew.`);
  return secret;
}
