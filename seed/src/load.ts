// Entry of `npm start` for an empty data folder; the settings are those of the server. `--scale N` books N parts instead.
import { type BulkProgress } from '@stageyard/backend/bulk-loading/bulk-messages';
import { FolderInUseError } from '@stageyard/backend/database/folder-lock';
import { folderProblem } from '@stageyard/backend/database/storage-problem';
import { loadSettings, SettingsError } from '@stageyard/backend/settings/settings';
import { loadDemo } from './load-demo.js';
import { loadScale } from './scale/load-scale.js';
import { scaleOption, ScaleOptionError } from './scale/scale-option.js';

function wordsFor(error: unknown): string {
  const isPlain = [SettingsError, FolderInUseError, ScaleOptionError].some((type) => error instanceof type);
  if (isPlain && error instanceof Error) return error.message;
  const folder = process.env.STAGEYARD_DATA ?? 'data';
  return folderProblem(error, folder) ?? `The demo data could not be booked: ${String(error)}`;
}

async function bookScale(count: number): Promise<void> {
  const settings = loadSettings(process.env);
  const started = performance.now();
  const booked = await loadScale(settings, { count, onProgress: progressLine(count) });
  if (booked === null) {
    throw new ScaleOptionError(
      settings.demo
        ? `The data folder ${settings.dataDir} is not empty. Set STAGEYARD_DATA to another folder, or leave --scale out.`
        : 'A scale set belongs to demo mode. Set STAGEYARD_DEMO to on, or leave --scale out.',
    );
  }
  const seconds = ((performance.now() - started) / 1000).toFixed(1);
  const { parts, offers, counts } = booked;
  process.stdout.write(
    `Loaded ${parts} parts with ${offers} offers and ${counts} opening counts in ${seconds} s.\n`,
  );
}

/** Says now and then how far a large set has come; a small one is done before there is anything to say. */
function progressLine(count: number): (progress: BulkProgress) => void {
  let said = 0;
  return ({ phase, done }) => {
    if (count < 20_000 || performance.now() - said < 2000) return;
    said = performance.now();
    process.stdout.write(
      `${phase}: ${done.toLocaleString('en-GB')} of ${count.toLocaleString('en-GB')} parts\n`,
    );
  };
}

async function bookDemo(): Promise<void> {
  const booked = await loadDemo(loadSettings(process.env));
  if (booked !== null) {
    const { parts, suppliers, offers, movements, briefs, trains } = booked;
    process.stdout.write(
      `Booked ${parts} parts, ${offers} offers of ${suppliers} suppliers, ${movements} stock movements, ` +
        `${briefs} briefs and ${trains} trains.\n`,
    );
  }
}

try {
  const count = scaleOption(process.argv.slice(2));
  await (count === null ? bookDemo() : bookScale(count));
} catch (error) {
  process.stderr.write(`${wordsFor(error)}\n`);
  process.exitCode = 1;
}
