import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { format, resolveConfig } from 'prettier';
import { describe, expect, it } from 'vitest';
import { renderApiDocument } from '../src/openapi.js';
import { startServer } from './harness.js';

const place = (relative: string) => fileURLToPath(new URL(relative, import.meta.url));
const COMMITTED = place('../openapi.json');
const CLIENT_TYPES = place('../../frontend/src/api/schema.d.ts');
const GENERATOR = place('../../frontend/node_modules/openapi-typescript/bin/cli.js');

describe('the OpenAPI document', () => {
  it('in the repository is the one that the server emits; if not, run pnpm openapi', async () => {
    const committed: unknown = JSON.parse(readFileSync(COMMITTED, 'utf8'));
    expect(committed).toEqual(JSON.parse(await renderApiDocument()));
  });

  it('is the same from a running server', async () => {
    const server = await startServer();
    const running: unknown = await (await fetch(`${server.url}/api/docs-json`)).json();
    await server.close();
    expect(running).toEqual(JSON.parse(await renderApiDocument()));
  });

  it('is what the types of the screens were made from; if not, run pnpm openapi', async () => {
    const made = execFileSync(process.execPath, [GENERATOR, COMMITTED], { encoding: 'utf8', stdio: 'pipe' });
    const options = { ...(await resolveConfig(CLIENT_TYPES)), filepath: CLIENT_TYPES };
    expect(readFileSync(CLIENT_TYPES, 'utf8')).toBe(await format(made, options));
  });
});
