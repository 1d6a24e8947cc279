import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { pathToFileURL } from 'node:url';

/** The office suite's command, or null where none is installed. */
export function findOffice(): string | null {
  return ['soffice', 'libreoffice'].find((command) => spawnSync(command, ['--version']).status === 0) ?? null;
}

/** ms; an office suite that hangs fails the test and not the whole run. */
const PATIENCE = 60_000;

/**
 * Opens workbooks in the office suite without a screen, lets it compute every formula, and saves them again.
 * It starts once for all of them, in a folder that is its home and is gone afterwards, so that runs beside each other
 * never meet and nothing is left behind.
 * @returns the workbooks in their order
 */
export function recalculate(office: string, workbooks: readonly Buffer[]): Buffer[] {
  const folder = mkdtempSync(path.join(tmpdir(), 'stageyard-office-'));
  try {
    const out = path.join(folder, 'out');
    const names = workbooks.map((_, index) => `book-${index}.xlsx`);
    workbooks.forEach((workbook, index) => writeFileSync(path.join(folder, `book-${index}.xlsx`), workbook));
    const profile = `-env:UserInstallation=${pathToFileURL(path.join(folder, 'profile')).href}`;
    const convert = ['--convert-to', 'xlsx:Calc MS Excel 2007 XML', '--outdir', out];
    const sources = names.map((name) => path.join(folder, name));
    const run = spawnSync(office, [profile, '--headless', ...convert, ...sources], {
      env: { ...process.env, HOME: folder },
      timeout: PATIENCE,
    });
    if (run.status !== 0) throw new Error(`${office} failed: ${run.stderr.toString('utf8').slice(0, 500)}`);
    return names.map((name) => readFileSync(path.join(out, name)));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
