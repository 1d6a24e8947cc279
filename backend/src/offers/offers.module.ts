import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { StockModule } from '../stock/stock.module.js';
import { SuppliersModule } from '../suppliers/suppliers.module.js';
import { Offer } from './entities/offer.entity.js';
import { OfferReader } from './offer-reader.js';
import { OfferWriter } from './offer-writer.js';
import { OfferPasteController } from './paste/offer-paste.controller.js';
import { OfferPaste } from './paste/offer-paste.service.js';
import { OffersLoader } from './offers-loader.js';
import { PartOffersController } from './part-offers.controller.js';
import { PartOffers } from './part-offers.service.js';
import { OffersController } from './offers.controller.js';
import { OffersFinder } from './offers-finder.service.js';
import { OffersService } from './offers.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Offer]), SuppliersModule, StockModule],
  controllers: [OfferPasteController, OffersController, PartOffersController],
  providers: [OfferPaste, OfferReader, OfferWriter, OffersFinder, OffersLoader, OffersService, PartOffers],
  exports: [OfferReader, OffersFinder, OffersLoader, OffersService],
})
export class OffersModule {}
