import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { OffersModule } from '../offers/offers.module.js';
import { StockModule } from '../stock/stock.module.js';
import { Train } from '../trains/entities/train.entity.js';
import { TrainsModule } from '../trains/trains.module.js';
import { BuyingService } from './buying.service.js';
import { TrainPricesController } from './train-prices.controller.js';
import { TrainPricesService } from './train-prices.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Train]), TrainsModule, OffersModule, StockModule],
  controllers: [TrainPricesController],
  providers: [BuyingService, TrainPricesService],
  exports: [TrainPricesService],
})
export class TrainPricesModule {}
