import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { OptionSearchesModule } from '../option-searches/option-searches.module.js';
import { BriefReader } from './brief-reader.js';
import { BriefsController } from './briefs.controller.js';
import { BriefsService } from './briefs.service.js';
import { Brief } from './entities/brief.entity.js';
import { Pin } from './entities/pin.entity.js';
import { PinsService } from './pins.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Brief, Pin]), OptionSearchesModule],
  controllers: [BriefsController],
  providers: [BriefReader, BriefsService, PinsService],
  exports: [BriefReader, BriefsService, PinsService],
})
export class BriefsModule {}
