// Entry of `npm start` for an empty data folder; the settings are those of the server.
import { loadSettings, SettingsError } from '@stageyard/backend/settings/settings';
import { loadDemo } from './load-demo.js';

try {
  const booked = await loadDemo(loadSettings(process.env));
  if (booked !== null) {
    process.stdout.write(
      `Booked ${booked.parts} parts, ${booked.briefs} briefs and ${booked.trains} trains.\n`,
    );
  }
} catch (error) {
  const text =
    error instanceof SettingsError ? error.message : `The demo data could not be booked: ${String(error)}`;
  process.stderr.write(`${text}\n`);
  process.exitCode = 1;
}
