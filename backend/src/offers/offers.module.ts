import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import { Offer } from './entities/offer.entity.js';
import { OffersFinder } from './offers-finder.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Offer]), SuppliersModule],
  providers: [OffersFinder],
  exports: [OffersFinder],
})
export class OffersModule {}
