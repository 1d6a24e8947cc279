import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import { Offer } from './entities/offer.entity.js';
import { OfferReader } from './offer-reader.js';
import { OfferWriter } from './offer-writer.js';
import { OffersController } from './offers.controller.js';
import { OffersFinder } from './offers-finder.service.js';
import { OffersService } from './offers.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Offer]), SuppliersModule],
  controllers: [OffersController],
  providers: [OfferReader, OfferWriter, OffersFinder, OffersService],
  exports: [OfferReader, OffersFinder, OffersService],
})
export class OffersModule {}
