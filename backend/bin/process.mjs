// Runs other programs for the scripts beside it. Node's own modules only: this runs before anything is installed.
import { spawn } from 'node:child_process';
import { constants } from 'node:os';
import { fileURLToPath } from 'node:url';
import path from 'node:path';

export const ROOT = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

/** Ends the script with a message for the person at the terminal; no stack, since the text says what to do. */
export function fail(message) {
  console.error(`\n${message}\n`);
  process.exit(1);
}

const running = new Set();

/** A script that is ended takes what it runs with it. Ends with the code a shell gives for the signal. */
function endAll(signal) {
  for (const child of running) child.kill(signal);
  process.exit(128 + constants.signals[signal]);
}

/** While programs run, a signal ends them too; otherwise it is left to whoever else listens. */
function watch(child) {
  if (running.size === 0) for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, endAll);
  running.add(child);
  child.on('close', () => {
    running.delete(child);
    if (running.size === 0) for (const signal of ['SIGINT', 'SIGTERM']) process.off(signal, endAll);
  });
}

/**
 * Runs a program in the workspace and waits for it.
 * @param {string} command
 * @param {string[]} args
 * @param {{ cwd?: string, env?: Record<string, string>, quiet?: boolean }} [options] quiet: output is kept and shown only on failure
 * @returns {Promise<number>} the exit code (1 when it was ended by a signal)
 */
export function run(command, args, { cwd = ROOT, env = {}, quiet = false } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, {
      cwd,
      env: { ...process.env, ...env },
      stdio: quiet ? ['ignore', 'pipe', 'pipe'] : ['ignore', 'inherit', 'inherit'],
    });
    watch(child);
    const kept = [];
    child.stdout?.on('data', (chunk) => kept.push(chunk));
    child.stderr?.on('data', (chunk) => kept.push(chunk));
    child.on('error', (error) => fail(`${command} could not be started: ${error.message}.`));
    child.on('close', (code) => {
      if (quiet && code !== 0) process.stderr.write(Buffer.concat(kept));
      resolve(code ?? 1);
    });
  });
}

/** Runs a script of an installed package with this same Node. `script` is relative to the workspace. */
export function runNode(script, args = [], options = {}) {
  return run(process.execPath, [path.join(ROOT, script), ...args], options);
}

/** Runs a named step, prints how long it took and ends the script when it fails. */
export async function step(name, work) {
  const started = performance.now();
  process.stdout.write(`${name} …\n`);
  const code = await work();
  if (code !== 0) fail(`${name} failed. The lines above say why.`);
  console.log(`${name}: ${((performance.now() - started) / 1000).toFixed(1)} s`);
}
