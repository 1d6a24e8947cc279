import { type DynamicModule, Module } from '@nestjs/common';
import { AuditModule } from './audit/audit.module.js';
import { AuthModule } from './auth/auth.module.js';
import { ClockModule } from './common/clock.js';
import { DatabaseModule } from './database/database.module.js';
import { HealthModule } from './health/health.module.js';
import { HouseRulesModule } from './house-rules/house-rules.module.js';
import { type Settings } from './settings/settings.js';
import { SettingsModule } from './settings/settings.module.js';
import { UsersModule } from './users/users.module.js';

/** The whole server, one module a room. */
@Module({
  imports: [
    ClockModule,
    DatabaseModule,
    AuditModule,
    AuthModule,
    UsersModule,
    HealthModule,
    HouseRulesModule,
  ],
})
export class AppModule {
  static with(settings: Settings): DynamicModule {
    return { module: AppModule, imports: [SettingsModule.with(settings)] };
  }
}
