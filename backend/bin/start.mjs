// npm start: from a clean clone to a served product. See README.md for the settings.
import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { prepare } from './prepare.mjs';
import { ROOT, runNode, step } from './process.mjs';

const dataFolder = path.resolve(ROOT, process.env.STAGEYARD_DATA || 'data');
const env = { STAGEYARD_DATA: dataFolder };

await prepare();

// The loader books everything or nothing, the database last; it does nothing where demo mode is off.
if (!existsSync(path.join(dataFolder, 'stageyard.db')))
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
