import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { NestFactory } from '@nestjs/core';
import { AppModule } from '@stageyard/backend/app.module';
import { PartsReader } from '@stageyard/backend/parts/parts-reader.service';
import { loadSettings } from '@stageyard/backend/settings/settings';
import { afterAll, describe, expect, it } from 'vitest';
import { loadScale } from './load-scale.js';

const folder = mkdtempSync(path.join(tmpdir(), 'stageyard-scale-'));
const settings = loadSettings({ STAGEYARD_DATA: folder, LOG_LEVEL: 'silent' });
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('loading a scale set', () => {
  it('fills an empty folder with as many parts as asked for, and no other folder', async () => {
    const COUNT = 2100;
    const loaded = await loadScale(settings, { count: COUNT });
    expect(loaded).toMatchObject({ parts: COUNT, first: 'KW-00001', last: 'KW-02100' });
    expect(readdirSync(folder).filter((name) => /stage$|loading/.test(name))).toEqual([]);
    const app = await NestFactory.createApplicationContext(AppModule.with(settings), { logger: false });
    try {
      const page = await app.get(PartsReader).list({ kind: 'gear', sort: '-teeth', size: 10, page: 2 });
      expect(page.total).toBeGreaterThan(COUNT / 2);
      expect(page.items).toHaveLength(10);
    } finally {
      await app.close();
    }
    expect(await loadScale(settings, { count: 1 })).toBeNull();
  }, 60_000);
});
