import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

/** The office suite's command, or null where none is installed. */
export function findOffice(): string | null {
  return ['soffice', 'libreoffice'].find((command) => spawnSync(command, ['--version']).status === 0) ?? null;
}

/** Opens a workbook in the office suite without a screen, lets it compute every formula, and saves it again. */
export function recalculate(office: string, workbook: Buffer): Buffer {
  const folder = mkdtempSync(path.join(tmpdir(), 'stageyard-office-'));
  try {
    const source = path.join(folder, 'in.xlsx');
    const out = path.join(folder, 'out');
    writeFileSync(source, workbook);
    const profile = `-env:UserInstallation=file://${path.join(folder, 'profile')}`;
    const run = spawnSync(office, [
      profile,
      '--headless',
      '--convert-to',
      'xlsx:Calc MS Excel 2007 XML',
      '--outdir',
      out,
      source,
    ]);
    if (run.status !== 0) throw new Error(`${office} failed: ${run.stderr.toString('utf8').slice(0, 500)}`);
    return readFileSync(path.join(out, 'in.xlsx'));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
