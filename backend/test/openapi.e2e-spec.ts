import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { renderApiDocument } from '../src/openapi.js';
import { startServer } from './harness.js';

const COMMITTED = fileURLToPath(new URL('../openapi.json', import.meta.url));

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
});
