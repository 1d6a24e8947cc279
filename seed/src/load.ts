// Entry of `npm start` for an empty data folder; the settings are those of the server.
import { FolderInUseError } from '@stageyard/backend/database/folder-lock';
import { folderProblem } from '@stageyard/backend/database/storage-problem';
import { loadSettings, SettingsError } from '@stageyard/backend/settings/settings';
import { loadDemo } from './load-demo.js';

function wordsFor(error: unknown): string {
  if (error instanceof SettingsError || error instanceof FolderInUseError) return error.message;
  const folder = process.env.STAGEYARD_DATA ?? 'data';
  return folderProblem(error, folder) ?? `The demo data could not be booked: ${String(error)}`;
}

try {
  const booked = await loadDemo(loadSettings(process.env));
  if (booked !== null) {
    const { parts, suppliers, offers, movements, briefs, trains } = booked;
    process.stdout.write(
      `Booked ${parts} parts, ${offers} offers of ${suppliers} suppliers, ${movements} stock movements, ` +
        `${briefs} briefs and ${trains} trains.\n`,
    );
  }
} catch (error) {
  process.stderr.write(`${wordsFor(error)}\n`);
  process.exitCode = 1;
}
