import { Module } from '@nestjs/common';
import { TrainPricesModule } from '../train-prices/train-prices.module.js';
import { TrainsModule } from '../trains/trains.module.js';
import { BomWorkbookService } from './bom-workbook.service.js';
import { ExportsController } from './exports.controller.js';

@Module({
  imports: [TrainsModule, TrainPricesModule],
  controllers: [ExportsController],
  providers: [BomWorkbookService],
})
export class ExportsModule {}
