import { Module } from '@nestjs/common';
import { TypeOrmModule } from '@nestjs/typeorm';
import { Part } from '../parts/entities/part.entity.js';
import { PartsModule } from '../parts/parts.module.js';
import { SubstitutesModule } from '../substitutes/substitutes.module.js';
import { BomService } from './bom.service.js';
import { BomEditing } from './bom-edits/bom-editing.service.js';
import { BomEditsController } from './bom-edits/bom-edits.controller.js';
import { BomPaste } from './bom-edits/bom-paste.service.js';
import { ExtraLines } from './bom-edits/extra-lines.service.js';
import { KitEditsReader } from './bom-edits/kit-edits.service.js';
import { LineSubstitutes } from './bom-edits/line-substitutes.service.js';
import { Swaps } from './bom-edits/swaps.service.js';
import { Train } from './entities/train.entity.js';
import { StockGears } from './stock-gears.service.js';
import { TrainReader } from './train-reader.js';
import { TrainsController } from './trains.controller.js';
import { TrainsService } from './trains.service.js';

@Module({
  imports: [TypeOrmModule.forFeature([Train, Part]), PartsModule, SubstitutesModule],
  controllers: [TrainsController, BomEditsController],
  providers: [
    ...[BomService, StockGears, TrainReader, TrainsService],
    ...[BomEditing, BomPaste, ExtraLines, KitEditsReader, LineSubstitutes, Swaps],
  ],
  exports: [BomService, StockGears, TrainReader, TrainsService],
})
export class TrainsModule {}
