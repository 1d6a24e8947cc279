// npm start: from a clean clone to a served product. See README.md for the settings.
import { spawn } from 'node:child_process';
import { existsSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { prepare } from './prepare.mjs';
import { ROOT, runNode, step } from './process.mjs';

const dataFolder = path.resolve(ROOT, process.env.STAGEYARD_DATA || 'data');
const env = { STAGEYARD_DATA: dataFolder };

/** Hidden entries are leftovers of a seeding that was cut off; the loader clears them. */
function isEmpty(folder) {
  return !existsSync(folder) || readdirSync(folder).every((name) => name.startsWith('.'));
}

await prepare();

// The loader does nothing where demo mode is off.
if (isEmpty(dataFolder))
  await step('Book the demo data into the empty data folder', () =>
    runNode('seed/dist/load.js', [], { env }),
  );

const server = spawn(process.execPath, [path.join(ROOT, 'backend/dist/main.js')], {
  cwd: ROOT,
  env: { ...process.env, ...env },
  stdio: 'inherit',
});
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal));
server.on('close', (code) => process.exit(code ?? 0));
