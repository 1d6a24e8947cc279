import { Module } from '@nestjs/common';
import { TrainsModule } from '../trains/trains.module.js';
import { BomWorkbookService } from './bom-workbook.service.js';
import { ExportsController } from './exports.controller.js';

@Module({
  imports: [TrainsModule],
  controllers: [ExportsController],
  providers: [BomWorkbookService],
})
export class ExportsModule {}
