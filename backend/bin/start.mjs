// npm start: from a clean clone to a served product. See README.md for the settings.
import { existsSync } from 'node:fs';
import path from 'node:path';
import { prepare } from './prepare.mjs';
import { ROOT, runNode, step } from './process.mjs';

// Relative to the clone, wherever the command was given; the loader and the server read it too.
const dataFolder = path.resolve(ROOT, process.env.STAGEYARD_DATA || 'data');
process.env.STAGEYARD_DATA = dataFolder;

await prepare();

// The loader books everything or nothing, the database last; it does nothing where demo mode is off.
if (!existsSync(path.join(dataFolder, 'stageyard.db')))
  await step('Book the demo data into the empty data folder', () => runNode('seed/dist/load.js'));

// In this same process: signals and the exit code are the server's own.
await import('../dist/main.js');
