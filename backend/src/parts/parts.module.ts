import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { StockModule } from '../stock/stock.module.js';
import { Part } from './entities/part.entity.js';
import { PartNumbers } from './part-numbers.service.js';
import { PartSuccessors } from './part-successors.service.js';
import { PartsController } from './parts.controller.js';
import { PartsLoader } from './parts-loader.service.js';
import { PartsReader } from './parts-reader.service.js';
import { PartsService } from './parts.service.js';
import { StockFinder } from './stock-finder.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Part]), StockModule],
  controllers: [PartsController],
  providers: [PartsReader, PartsService, PartsLoader, PartNumbers, PartSuccessors, StockFinder],
  exports: [PartsReader, PartsService, PartsLoader, StockFinder],
})
export class PartsModule {}
