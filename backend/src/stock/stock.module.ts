import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { Part } from '../parts/entities/part.entity.js';
import { StockMovement } from './entities/stock-movement.entity.js';
import { Ledger } from './ledger.service.js';
import { MovementsReader } from './movements-reader.service.js';
import { StockController } from './stock.controller.js';
import { StockLevels } from './stock-levels.service.js';
import { StockReader } from './stock-reader.service.js';
import { StockService } from './stock.service.js';

/** The stock ledger: movements, and what lies where because of them. */
@Module({
  imports: [TypeOrmModule.forFeature([Part, StockMovement])],
  controllers: [StockController],
  providers: [StockReader, MovementsReader, StockLevels, StockService, Ledger],
  exports: [StockLevels, StockService],
})
export class StockModule {}
