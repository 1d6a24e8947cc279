import { Injectable } from '@nestjs/common';
import { buildBom, trainGearData, type TrainGearData } from '@stageyard/libs/bill-of-materials';
import { StockFinder } from '../parts/stock-finder.service.js';
import { type BomDto, toBomDto } from './dto/bom.dto.js';
import { type TrainDto } from './dto/train.dto.js';
import { kitOf } from './train-kit.js';
import { TrainReader } from './train-reader.js';

/** A train with its bill of materials and the gear data of every gear. */
export interface TrainRecord {
  train: TrainDto;
  bom: BomDto;
  gearData: TrainGearData[];
}

/** Bills of materials of trains, from the kit rules and what the library holds. */
@Injectable()
export class BomService {
  constructor(
    private readonly reader: TrainReader,
    private readonly finder: StockFinder,
  ) {}

  /** @throws ProblemError 404 */
  async ofTrain(code: string): Promise<BomDto> {
    const { title, spec, figures } = await this.reader.get(code);
    const kit = kitOf(title, spec, figures);
    return toBomDto(await this.finder.gather((finder) => buildBom(kit, finder)));
  }

  /** Everything an export of the train needs. @throws ProblemError 404 */
  async record(code: string): Promise<TrainRecord> {
    const train = await this.reader.get(code);
    const kit = kitOf(train.title, train.spec, train.figures);
    return this.finder.gather((finder) => ({
      train,
      bom: toBomDto(buildBom(kit, finder)),
      gearData: trainGearData(kit, finder),
    }));
  }
}
