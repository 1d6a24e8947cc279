import { Injectable } from '@nestjs/common';
import {
  buildEditedBom,
  type EditedBom,
  trainGearData,
  type TrainGearData,
} from '@stageyard/libs/bill-of-materials';
import { type TrainFigures } from '@stageyard/libs/train-planner';
import { StockFinder } from '../parts/stock-finder.service.js';
import { NO_EDITS } from './bom-edits.js';
import { KitEditsReader } from './bom-edits/kit-edits.service.js';
import { type BomDto, toBomDto } from './dto/bom.dto.js';
import { type TrainDto, toTrainDto } from './dto/train.dto.js';
import { type Train } from './entities/train.entity.js';
import { kitOf } from './train-kit.js';
import { TrainReader } from './train-reader.js';

/** A train with its bill of materials and the gear data of every gear. */
export interface TrainRecord {
  train: TrainDto;
  bom: BomDto;
  gearData: TrainGearData[];
}

/** What decides the bill of materials of a train. */
export type BomSource = Pick<Train, 'title' | 'spec' | 'bomEdits'>;

/** Bills of materials of trains, from the kit rules, what the library holds, and what people changed. */
@Injectable()
export class BomService {
  constructor(
    private readonly reader: TrainReader,
    private readonly finder: StockFinder,
    private readonly edits: KitEditsReader,
  ) {}

  /** @throws ProblemError 404 */
  async ofTrain(code: string): Promise<BomDto> {
    const train = await this.reader.row(code);
    return toBomDto(await this.build(train, await this.reader.figures(train)), train.bomEdits ?? NO_EDITS);
  }

  /** Everything an export of the train needs. @throws ProblemError 404 */
  async record(code: string): Promise<TrainRecord> {
    const train = await this.reader.row(code);
    const figures = await this.reader.figures(train);
    const kit = kitOf(train.title, train.spec, figures);
    return {
      train: toTrainDto(train, figures),
      bom: toBomDto(await this.build(train, figures), train.bomEdits ?? NO_EDITS),
      gearData: await this.finder.gather((finder) => trainGearData(kit, finder)),
    };
  }

  /** The lines with what their places ask for; also of a train as it would be. @param figures of its specification */
  async build({ title, spec, bomEdits }: BomSource, figures: TrainFigures): Promise<EditedBom> {
    const kit = kitOf(title, spec, figures);
    const edits = await this.edits.of(bomEdits ?? NO_EDITS);
    return this.finder.gather((finder) => buildEditedBom(kit, finder, edits));
  }
}
