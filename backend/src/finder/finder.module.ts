import { Module } from '@nestjs/common';
import { BriefsModule } from '../briefs/briefs.module.js';
import { PartsModule } from '../parts/parts.module.js';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import { TrainsModule } from '../trains/trains.module.js';
import { FinderController } from './finder.controller.js';
import { FinderService } from './finder.service.js';

@Module({
  imports: [PartsModule, BriefsModule, TrainsModule, SuppliersModule],
  controllers: [FinderController],
  providers: [FinderService],
})
export class FinderModule {}
