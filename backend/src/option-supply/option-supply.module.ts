import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { Brief } from '../briefs/entities/brief.entity.js';
import { OffersModule } from '../offers/offers.module.js';
import { OptionSearchesModule } from '../option-searches/option-searches.module.js';
import { TrainsModule } from '../trains/trains.module.js';
import { OptionSupplyController } from './option-supply.controller.js';
import { OptionSupplyService } from './option-supply.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Brief]), OptionSearchesModule, TrainsModule, OffersModule],
  controllers: [OptionSupplyController],
  providers: [OptionSupplyService],
})
export class OptionSupplyModule {}
