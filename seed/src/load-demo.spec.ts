import { mkdirSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { NestFactory } from '@nestjs/core';
import { AppModule } from '@stageyard/backend/app.module';
import { AuditService } from '@stageyard/backend/audit/audit.service';
import { loadSettings } from '@stageyard/backend/settings/settings';
import { BomService } from '@stageyard/backend/trains/bom.service';
import { TrainReader } from '@stageyard/backend/trains/train-reader';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type DemoLoad, loadDemo } from './load-demo.js';

const folder = mkdtempSync(path.join(tmpdir(), 'stageyard-demo-'));
const settings = loadSettings({ STAGEYARD_DATA: folder, LOG_LEVEL: 'silent' });
let booked: DemoLoad;

beforeAll(async () => {
  // What a power cut during an earlier loading leaves behind.
  mkdirSync(path.join(folder, '.demo-loading'));
  writeFileSync(path.join(folder, '.demo-loading', 'stageyard.db'), 'half a database');
  booked = await loadDemo(settings);
}, 60_000);
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('loading the demo workshop', () => {
  it('books the whole workshop and leaves no half-done folder', () => {
    expect(booked).toMatchObject({ briefs: 5, trains: 2 });
    expect(booked?.parts).toBeGreaterThanOrEqual(500);
    expect(readdirSync(folder)).toContain('stageyard.db');
    expect(readdirSync(folder)).not.toContain('.demo-loading');
  });

  it('leaves a folder alone that has a database', async () => {
    expect(await loadDemo(settings)).toBeNull();
  });

  it('books nothing where demo mode is off', async () => {
    const empty = mkdtempSync(path.join(tmpdir(), 'stageyard-plain-'));
    try {
      expect(await loadDemo({ ...settings, demo: false, dataDir: empty })).toBeNull();
      expect(readdirSync(empty)).toEqual([]);
    } finally {
      rmSync(empty, { recursive: true });
    }
  });

  it('gives trains whose bills of materials name parts of the library, with the booking in the record', async () => {
    const app = await NestFactory.createApplicationContext(AppModule.with(settings), { logger: false });
    try {
      const trains = await app.get(TrainReader).page({}, 'nobody');
      expect(trains.items.map(({ code }) => code).sort()).toEqual(['T-0001', 'T-0002']);
      for (const { code } of trains.items) {
        const { lines } = await app.get(BomService).ofTrain(code);
        expect(lines.filter(({ partNumber }) => partNumber?.startsWith('KW-')).length).toBeGreaterThan(3);
        const changes = await app.get(AuditService).changesOf('train', code, {});
        expect(changes.items.map(({ by }) => by)).toEqual(['Dara Quill']);
      }
    } finally {
      await app.close();
    }
  }, 30_000);
});
