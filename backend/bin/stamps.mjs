// A stamp remembers the fingerprint of what a step was made from, so that a step already done is not done again.
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { ROOT } from './process.mjs';

// Inside node_modules: whoever removes that folder removes the stamps with it.
const FOLDER = path.join(ROOT, 'node_modules/.stageyard');
const LEFT_OUT = new Set(['node_modules', 'dist', 'test-results', 'playwright-report']);

function* filesBelow(place) {
  if (!existsSync(place)) return;
  for (const entry of readdirSync(place, { withFileTypes: true }).sort((a, b) =>
    a.name < b.name ? -1 : 1,
  )) {
    if (LEFT_OUT.has(entry.name)) continue;
    const full = path.join(place, entry.name);
    if (entry.isDirectory()) yield* filesBelow(full);
    else if (entry.isFile()) yield full;
  }
}

/** One fingerprint over the contents of files and of all files below folders (paths relative to the workspace). */
export function fingerprint(places, extra = '') {
  const hash = createHash('sha256').update(`${process.version} ${process.arch} ${extra}`);
  for (const place of places) {
    const full = path.join(ROOT, place);
    if (!existsSync(full)) continue;
    for (const file of statSync(full).isDirectory() ? filesBelow(full) : [full]) {
      hash.update(path.relative(ROOT, file)).update(readFileSync(file));
    }
  }
  return hash.digest('hex');
}

/** True when the step of that name was last done from the same fingerprint. */
export function isStamped(name, print) {
  const file = path.join(FOLDER, name);
  return existsSync(file) && readFileSync(file, 'utf8') === print;
}

/** Forgets that the step of that name was ever done: it is about to be done again, and may break off half-way. */
export function unstamp(name) {
  rmSync(path.join(FOLDER, name), { force: true });
}

/** Remembers that the step of that name is done for the fingerprint. */
export function stamp(name, print) {
  mkdirSync(FOLDER, { recursive: true });
  writeFileSync(path.join(FOLDER, name), print);
}
