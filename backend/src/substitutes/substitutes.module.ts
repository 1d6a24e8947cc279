import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { OffersModule } from '../offers/offers.module.js';
import { Part } from '../parts/entities/part.entity.js';
import { StockModule } from '../stock/stock.module.js';
import { FittingParts } from './fitting-parts.service.js';
import { Substitutes } from './substitutes.service.js';
import { SubstitutesController } from './substitutes.controller.js';
import { SupplyOfParts } from './supply-of-parts.service.js';

/** Parts that drop in for others. */
@Module({
  imports: [TypeOrmModule.forFeature([Part]), OffersModule, StockModule],
  controllers: [SubstitutesController],
  providers: [Substitutes, FittingParts, SupplyOfParts],
  exports: [Substitutes, SupplyOfParts],
})
export class SubstitutesModule {}
