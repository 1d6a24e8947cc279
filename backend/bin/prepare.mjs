// What npm start and npm test share: check the machine, install what the lock file names, build what has changed.
import { spawnSync } from 'node:child_process';
import { existsSync, readFileSync, realpathSync } from 'node:fs';
import path from 'node:path';
import { fail, ROOT, run, runNode, step } from './process.mjs';
import { fingerprint, isStamped, stamp, unstamp } from './stamps.mjs';

const PACKAGES = ['libs', 'backend', 'seed', 'frontend'];
const MANIFESTS = ['package.json', ...PACKAGES.map((name) => `${name}/package.json`)];
const TSC = 'node_modules/typescript/bin/tsc';

function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major !== 20 || minor < 19) {
    fail(
      `Stageyard runs on Node 20.19 or a later 20.x; this is ${process.version}. Install Node 20 and start again.`,
    );
  }
}

/** The database driver is compiled on this machine; say what is missing before a long install fails on it. */
function checkCompilers() {
  const missing = ['python3', 'make', 'g++'].filter(
    (tool) => spawnSync(tool, ['--version'], { stdio: 'ignore' }).error,
  );
  if (missing.length > 0) {
    fail(
      `The database driver is compiled during the install, and this machine lacks ${missing.join(', ')}.\n` +
        'On Debian or a similar system, run this once and start again:\n\n  sudo apt-get install -y python3 make g++',
    );
  }
}

/** Node's own headers where they came with it: compiling against them needs no download. */
function headersEnv() {
  const prefix = path.resolve(path.dirname(realpathSync(process.execPath)), '..');
  return existsSync(path.join(prefix, 'include/node/node_api.h')) ? { npm_config_nodedir: prefix } : {};
}

async function install() {
  const print = fingerprint(['pnpm-lock.yaml', 'pnpm-workspace.yaml', ...MANIFESTS]);
  if (
    isStamped('install', print) &&
    PACKAGES.every((name) => existsSync(path.join(ROOT, name, 'node_modules')))
  )
    return;
  checkCompilers();
  unstamp('install');
  const { packageManager } = JSON.parse(readFileSync(path.join(ROOT, 'package.json'), 'utf8'));
  await step('Install the packages of the lock file', () =>
    run('npx', ['-y', packageManager, 'install', '--frozen-lockfile', '--reporter=append-only'], {
      quiet: true,
      env: headersEnv(),
    }),
  );
  stamp('install', print);
}

/** Builds one package unless it was built from the same sources; `from` lists what its result depends on. */
async function build(name, from, work) {
  const print = fingerprint(['pnpm-lock.yaml', 'tsconfig.base.json', ...from]);
  if (isStamped(`build-${name}`, print) && existsSync(path.join(ROOT, name, 'dist'))) return;
  unstamp(`build-${name}`);
  await step(`Build ${name}`, work);
  stamp(`build-${name}`, print);
}

const LIBS = ['libs'];
const BACKEND = [
  ...LIBS,
  'backend/package.json',
  'backend/tsconfig.json',
  'backend/tsconfig.build.json',
  'backend/src',
];
const SEED = [...BACKEND, 'seed'];
const FRONTEND = [
  ...LIBS,
  'frontend/package.json',
  'frontend/tsconfig.json',
  'frontend/vite.config.ts',
  'frontend/index.html',
  'frontend/public',
  'frontend/src',
];

/** Leaves the workspace installed and built; does nothing that is already done. */
export async function prepare() {
  checkNode();
  await install();
  await build('libs', LIBS, () => runNode(TSC, ['-p', 'libs/tsconfig.build.json']));
  await Promise.all([
    build('backend', BACKEND, () => runNode(TSC, ['-p', 'backend/tsconfig.build.json'])).then(() =>
      build('seed', SEED, () => runNode(TSC, ['-p', 'seed/tsconfig.build.json'])),
    ),
    build('frontend', FRONTEND, () =>
      runNode('frontend/node_modules/vite/bin/vite.js', ['build', '--logLevel', 'warn'], {
        cwd: path.join(ROOT, 'frontend'),
      }),
    ),
  ]);
}
