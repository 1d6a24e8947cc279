import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { Brief } from '../briefs/entities/brief.entity.js';
import { WorkersModule } from '../workers/workers.module.js';
import { OptionSearch } from './entities/option-search.entity.js';
import { OptionSearchesController } from './option-searches.controller.js';
import { OptionSearchesService } from './option-searches.service.js';
import { SearchRunner } from './search-runner.js';

@Module({
  imports: [TypeOrmModule.forFeature([OptionSearch, Brief]), WorkersModule],
  controllers: [OptionSearchesController],
  providers: [OptionSearchesService, SearchRunner],
  exports: [OptionSearchesService],
})
export class OptionSearchesModule {}
