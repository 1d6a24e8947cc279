import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { loadSettings, type Settings } from '../settings/settings.js';

export interface TempSettings {
  settings: Settings;
  /** Deletes the data folder. */
  remove: () => void;
}

/** Demo mode, quiet, a free port, and an empty data folder of its own. */
export function tempSettings(changes: Partial<Settings> = {}): TempSettings {
  const dataDir = mkdtempSync(path.join(tmpdir(), 'stageyard-test-'));
  const settings = { ...loadSettings({ LOG_LEVEL: 'silent', PORT: '0' }), dataDir, ...changes };
  return { settings, remove: () => rmSync(dataDir, { recursive: true, force: true }) };
}
