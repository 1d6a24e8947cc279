import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { Part } from '../parts/entities/part.entity.js';
import { PartsModule } from '../parts/parts.module.js';
import { BomService } from './bom.service.js';
import { Train } from './entities/train.entity.js';
import { StockGears } from './stock-gears.service.js';
import { TrainReader } from './train-reader.js';
import { TrainsController } from './trains.controller.js';
import { TrainsService } from './trains.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Train, Part]), PartsModule],
  controllers: [TrainsController],
  providers: [BomService, StockGears, TrainReader, TrainsService],
  exports: [BomService, StockGears, TrainReader, TrainsService],
})
export class TrainsModule {}
