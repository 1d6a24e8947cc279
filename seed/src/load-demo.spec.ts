import { mkdirSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { NestFactory } from '@nestjs/core';
import { AppModule } from '@stageyard/backend/app.module';
import { AuditService } from '@stageyard/backend/audit/audit.service';
import { openWritingSource } from '@stageyard/backend/database/data-sources';
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
}, 120_000);
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('loading the demo workshop', () => {
  it('books the whole workshop and leaves no half-done folder', () => {
    expect(booked).toMatchObject({ briefs: 5, trains: 2, suppliers: 6 });
    expect(booked?.parts).toBeGreaterThanOrEqual(1800);
    expect(booked?.offers).toBeGreaterThanOrEqual(2500);
    expect(booked?.movements).toBeGreaterThanOrEqual(4000);
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

/** Rows of a query on a data folder that no server holds. */
async function rowsOf<T>(dataDir: string, ...statements: string[]): Promise<T[][]> {
  const source = await openWritingSource(dataDir);
  try {
    const answers: T[][] = [];
    for (const statement of statements) answers.push(await source.query<T[]>(statement));
    return answers;
  } finally {
    await source.destroy();
  }
}

describe('the year of the demo workshop', () => {
  it('ends with shelves that are the sum of their movements, none below 0', async () => {
    const [wrong, gears, others] = await rowsOf<{ count: number }>(
      folder,
      `SELECT COUNT(*) AS "count" FROM "stock_level" level WHERE level."quantity" < 0 OR level."quantity" <> (
        SELECT SUM(movement."change") FROM "stock_movement" movement
          WHERE movement."partId" = level."partId" AND movement."place" = level."place")`,
      ...(['=', '<>'] as const).map(
        (are) => `SELECT COUNT(*) AS "count" FROM "part" WHERE "kind" ${are} 'gear'
          AND EXISTS (SELECT 1 FROM "offer" WHERE "partId" = "part"."id")
          AND EXISTS (SELECT 1 FROM "stock_level" WHERE "partId" = "part"."id")`,
      ),
    );
    expect(wrong).toEqual([{ count: 0 }]);
    // With offers and a shelf both.
    expect(gears?.[0]?.count).toBeGreaterThanOrEqual(1500);
    expect(others?.[0]?.count).toBeGreaterThanOrEqual(300);
  });

  it('spans the last twelve months in order, on working days, with every kind of movement', async () => {
    const [moments] = await rowsOf<{ at: string; kind: string }>(
      folder,
      'SELECT "at", "kind" FROM "stock_movement" ORDER BY "id"',
    );
    const times = (moments ?? []).map(({ at }) => Date.parse(at));
    expect(times).toEqual([...times].sort((a, b) => a - b));
    const days = (Date.now() - (times[0] ?? 0)) / 86_400_000;
    expect(days).toBeGreaterThan(355);
    expect(days).toBeLessThan(370);
    expect((Date.now() - (times.at(-1) ?? 0)) / 86_400_000).toBeLessThan(8);
    const months = new Set((moments ?? []).map(({ at }) => at.slice(0, 7)));
    expect(months.size).toBeGreaterThanOrEqual(12);
    expect(times.some((time) => [0, 6].includes(new Date(time).getUTCDay()))).toBe(false);
    expect(new Set((moments ?? []).map(({ kind }) => kind)).size).toBe(4);
  });

  it('watches some hundred shelves, a few dozen of them low', async () => {
    const [shelves] = await rowsOf<{ least: number; there: number }>(
      folder,
      `SELECT part."leastStock" AS "least", (SELECT COALESCE(SUM(level."quantity"), 0) FROM "stock_level" level
        WHERE level."partId" = part."id") AS "there" FROM "part" part WHERE part."leastStock" IS NOT NULL`,
    );
    expect(shelves?.length).toBeGreaterThan(200);
    const low = (shelves ?? []).filter(({ least, there }) => there < least).length;
    expect(low).toBeGreaterThanOrEqual(24);
    expect(low).toBeLessThanOrEqual(80);
  });

  it('has offers in currencies of 0, 2 and 3 decimals for nearly every bought part, a few of them run out or too old', async () => {
    const today = new Date().toISOString().slice(0, 10);
    const [currencies, without, bought, several, runOut, old] = await rowsOf<{
      count: number;
      currency: string;
    }>(
      folder,
      'SELECT "currency", COUNT(*) AS "count" FROM "offer" GROUP BY "currency"',
      `SELECT COUNT(*) AS "count" FROM "part" WHERE "supply" = 'bought' AND "standing" = 'cleared'
        AND NOT EXISTS (SELECT 1 FROM "offer" WHERE "partId" = "part"."id")`,
      `SELECT COUNT(*) AS "count" FROM "part" WHERE "supply" = 'bought' AND "standing" = 'cleared'`,
      `SELECT COUNT(*) AS "count" FROM (SELECT 1 FROM "offer" GROUP BY "partId"
        HAVING COUNT(DISTINCT "supplierId") > 1)`,
      `SELECT COUNT(*) AS "count" FROM "offer" WHERE "validUntil" < '${today}'`,
      `SELECT COUNT(*) AS "count" FROM "offer" WHERE "validUntil" IS NULL AND "pricedOn" < date('now', '-180 days')`,
    );
    // ISO 4217 (memory): JPY has no decimals, EUR and GBP have 2, TND has 3.
    expect((currencies ?? []).map(({ currency }) => currency).sort()).toEqual(['EUR', 'GBP', 'JPY', 'TND']);
    expect(without?.[0]?.count).toBeGreaterThan(0);
    expect((without?.[0]?.count ?? 0) / (bought?.[0]?.count ?? 1)).toBeLessThan(0.05);
    expect(several?.[0]?.count).toBeGreaterThan(500);
    expect(runOut?.[0]?.count).toBeGreaterThan(50);
    expect(old?.[0]?.count).toBeGreaterThan(50);
  });

  it('has the same amounts when it is loaded again', async () => {
    const again = mkdtempSync(path.join(tmpdir(), 'stageyard-again-'));
    try {
      expect(await loadDemo({ ...settings, dataDir: again })).toEqual(booked);
      const amounts = [
        'SELECT "partId", "kind", "change", "after", "place", "reason", "actorName" FROM "stock_movement" ORDER BY "id"',
        `SELECT "partId", "supplierId", "supplierPartNumber", "currency", "per", "breaks", "pack", "leastQuantity",
          "leadTimeDays", "source" FROM "offer" ORDER BY "id"`,
        'SELECT "number", "description", "leastStock" FROM "part" ORDER BY "id"',
      ];
      expect(await rowsOf(again, ...amounts)).toEqual(await rowsOf(folder, ...amounts));
    } finally {
      rmSync(again, { recursive: true, force: true });
    }
  }, 120_000);
});
