import { type DynamicModule, Module } from '@nestjs/common';
import { AuditModule } from './audit/audit.module.js';
import { AuthModule } from './auth/auth.module.js';
import { BulkLoadingModule } from './bulk-loading/bulk-loading.module.js';
import { CalcModule } from './calc/calc.module.js';
import { BriefsModule } from './briefs/briefs.module.js';
import { ClockModule } from './common/clock.js';
import { DatabaseModule } from './database/database.module.js';
import { ExportsModule } from './exports/exports.module.js';
import { FinderModule } from './finder/finder.module.js';
import { HealthModule } from './health/health.module.js';
import { HouseRulesModule } from './house-rules/house-rules.module.js';
import { OffersModule } from './offers/offers.module.js';
import { OptionSupplyModule } from './option-supply/option-supply.module.js';
import { OptionSearchesModule } from './option-searches/option-searches.module.js';
import { OverviewModule } from './overview/overview.module.js';
import { PartsModule } from './parts/parts.module.js';
import { type Settings } from './settings/settings.js';
import { SettingsModule } from './settings/settings.module.js';
import { StockModule } from './stock/stock.module.js';
import { SubstitutesModule } from './substitutes/substitutes.module.js';
import { SuppliersModule } from './suppliers/suppliers.module.js';
import { TrainPricesModule } from './train-prices/train-prices.module.js';
import { TrainsModule } from './trains/trains.module.js';
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
    PartsModule,
    StockModule,
    SubstitutesModule,
    SuppliersModule,
    OffersModule,
    CalcModule,
    BulkLoadingModule,
    BriefsModule,
    OptionSearchesModule,
    TrainsModule,
    TrainPricesModule,
    OptionSupplyModule,
    ExportsModule,
    FinderModule,
    OverviewModule,
  ],
})
export class AppModule {
  static with(settings: Settings): DynamicModule {
    return { module: AppModule, imports: [SettingsModule.with(settings)] };
  }
}
