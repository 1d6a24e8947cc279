import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { Test, type TestingModule } from '@nestjs/testing';
import { AuditModule } from '../audit/audit.module.js';
import { ClockModule } from '../common/clock.js';
import { DatabaseModule } from '../database/database.module.js';
import { OffersModule } from '../offers/offers.module.js';
import { PartsModule } from '../parts/parts.module.js';
import { loadSettings } from '../settings/settings.js';
import { SettingsModule } from '../settings/settings.module.js';

export interface TempLibrary {
  module: TestingModule;
  close(): Promise<void>;
}

/** The part library with suppliers and offers, on a real database in a folder of its own; `close` removes both. */
export async function openTempLibrary(): Promise<TempLibrary> {
  const dataDir = mkdtempSync(path.join(tmpdir(), 'stageyard-parts-'));
  const settings = loadSettings({ STAGEYARD_DATA: dataDir, LOG_LEVEL: 'silent' });
  const module = await Test.createTestingModule({
    imports: [
      SettingsModule.with(settings),
      ClockModule,
      DatabaseModule,
      AuditModule,
      PartsModule,
      OffersModule,
    ],
  }).compile();
  await module.init();
  return {
    module,
    close: async () => {
      await module.close();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
}
