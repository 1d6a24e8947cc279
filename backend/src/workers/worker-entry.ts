import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

/**
 * Path of a built thread entry point. A thread runs plain JavaScript, so from source (tests, watch mode) the file of
 * the last build is taken.
 * @throws Error when the server was never built
 */
export function workerEntry(name: string): string {
  const candidates = [`./${name}.js`, `../../dist/workers/${name}.js`].map((path) =>
    fileURLToPath(new URL(path, import.meta.url)),
  );
  const found = candidates.find((path) => existsSync(path));
  if (!found) throw new Error(`The worker “${name}” is not built. Run the build of the server first.`);
  return found;
}
