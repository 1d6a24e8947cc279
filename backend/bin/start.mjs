// npm start: from a clean clone to a served product. See README.md for the settings; `-- --scale N` for a large library.
import { existsSync } from 'node:fs';
import path from 'node:path';
import { prepare } from './prepare.mjs';
import { ROOT, runNode, step } from './process.mjs';

// Relative to the clone, wherever the command was given; the loader and the server read it too.
const dataFolder = path.resolve(ROOT, process.env.STAGEYARD_DATA || 'data');
process.env.STAGEYARD_DATA = dataFolder;

await prepare();

// The loader books everything or nothing, the database last; it does nothing where demo mode is off.
const options = process.argv.slice(2);
// Options are for an empty folder: the loader says so where it is not.
if (options.length > 0 || !existsSync(path.join(dataFolder, 'stageyard.db')))
  await step('Book the demo data into the empty data folder', () => runNode('seed/dist/load.js', options));

// In this same process: signals and the exit code are the server's own.
await import('../dist/main.js');
