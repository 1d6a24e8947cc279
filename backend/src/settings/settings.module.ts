import { type DynamicModule, Global, Module } from '@nestjs/common';
import { SETTINGS, type Settings } from './settings.js';

/** Gives every module the settings under the token `SETTINGS`. */
@Global()
@Module({})
export class SettingsModule {
  static with(settings: Settings): DynamicModule {
    return {
      module: SettingsModule,
      providers: [{ provide: SETTINGS, useValue: settings }],
      exports: [SETTINGS],
    };
  }
}
