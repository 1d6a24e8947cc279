// pnpm dev: the libraries and the server rebuild on change, the front end reloads at http://127.0.0.1:5173.
import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { prepare } from './prepare.mjs';
import { ROOT, runNode } from './process.mjs';
import { unstamp } from './stamps.mjs';

await prepare();
// From here on the compilers write over what was built, whether or not they come to an end.
for (const name of ['libs', 'backend']) unstamp(`build-${name}`);

const dataFolder = path.resolve(ROOT, process.env.STAGEYARD_DATA || 'data');
const api = `http://127.0.0.1:${process.env.PORT || 3000}`;
const env = { STAGEYARD_API: api, ...process.env, STAGEYARD_DATA: dataFolder };
if (!existsSync(path.join(dataFolder, 'stageyard.db'))) await runNode('seed/dist/load.js', [], { env });

const watch = ['--watch', '--preserveWatchOutput', '--pretty', 'false'];
const children = [
  ['node_modules/typescript/bin/tsc', '-p', 'libs/tsconfig.build.json', ...watch],
  ['node_modules/typescript/bin/tsc', '-p', 'backend/tsconfig.build.json', ...watch],
  ['--watch', '--watch-preserve-output', 'backend/dist/main.js'],
].map((args) => spawn(process.execPath, args, { cwd: ROOT, env, stdio: 'inherit' }));
children.push(
  spawn(process.execPath, ['node_modules/vite/bin/vite.js'], {
    cwd: path.join(ROOT, 'frontend'),
    env,
    stdio: 'inherit',
  }),
);

const stop = () => children.forEach((child) => child.kill('SIGTERM'));
process.on('SIGINT', stop);
process.on('SIGTERM', stop);
