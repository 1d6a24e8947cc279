import { type NestFastifyApplication } from '@nestjs/platform-fastify';
import { createApp } from '../app.js';
import { type Settings } from '../settings/settings.js';
import { tempSettings } from './temp-settings.js';

export interface TempApp {
  app: NestFastifyApplication;
  settings: Settings;
  close: () => Promise<void>;
}

/** The whole server on a data folder of its own, not listening: services come from `app.get(Service)`. */
export async function openTempApp(changes: Partial<Settings> = {}): Promise<TempApp> {
  const { settings, remove } = tempSettings(changes);
  const app = await createApp(settings);
  return {
    app,
    settings,
    close: async () => {
      await app.close();
      remove();
    },
  };
}
