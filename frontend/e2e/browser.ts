import { existsSync, mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';

/** Browsers of the system, best first. */
const INSTALLED = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];

/**
 * The browser's executable: one of the system where there is one, else the one that comes as a package. The package
 * unpacks itself, and on a system without the libraries it needs brings those along.
 */
export async function browserPath(): Promise<string> {
  const installed = INSTALLED.find((file) => existsSync(file));
  if (installed !== undefined) return installed;
  const folder = path.join(import.meta.dirname, '../node_modules/.cache/browser');
  mkdirSync(folder, { recursive: true });
  const before = process.env.TMPDIR;
  process.env.TMPDIR = folder;
  process.env.AWS_EXECUTION_ENV ??= 'AWS_Lambda_nodejs20.x';
  try {
    const { default: chromium } = await import('@sparticuz/chromium');
    const executable = await chromium.executablePath();
    // The package's own font settings name a folder of the machine it was made for; without fonts no text is drawn.
    const fonts = path.join(folder, 'fonts');
    writeFileSync(path.join(folder, 'fonts.conf'), fontSettings(fonts));
    process.env.FONTCONFIG_PATH = folder;
    process.env.FONTCONFIG_FILE = path.join(folder, 'fonts.conf');
    return executable;
  } finally {
    if (before === undefined) delete process.env.TMPDIR;
    else process.env.TMPDIR = before;
  }
}

function fontSettings(fonts: string): string {
  const folders = [fonts, '/usr/share/fonts'].map((each) => `<dir>${each}</dir>`).join('');
  return `<?xml version="1.0"?><fontconfig>${folders}<cachedir>${fonts}/cache</cachedir></fontconfig>`;
}
