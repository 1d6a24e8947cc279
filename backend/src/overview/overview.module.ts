import { Module } from '@nestjs/common';
import { BriefsModule } from '../briefs/briefs.module.js';
import { PartsModule } from '../parts/parts.module.js';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import { TrainsModule } from '../trains/trains.module.js';
import { OverviewController } from './overview.controller.js';
import { OverviewService } from './overview.service.js';

@Module({
  imports: [PartsModule, BriefsModule, TrainsModule, SuppliersModule],
  controllers: [OverviewController],
  providers: [OverviewService],
})
export class OverviewModule {}
