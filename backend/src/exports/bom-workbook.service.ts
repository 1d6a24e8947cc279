import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock.js';
import { TrainPricesService } from '../train-prices/train-prices.service.js';
import { BomService } from '../trains/bom.service.js';
import { bomWorkbook, workbookName } from './bom-workbook.js';

/** Workbooks for download. */
@Injectable()
export class BomWorkbookService {
  constructor(
    private readonly boms: BomService,
    private readonly prices: TrainPricesService,
    private readonly clock: Clock,
  ) {}

  /** @throws ProblemError 404 */
  async ofTrain(code: string): Promise<{ name: string; bytes: Buffer }> {
    const record = await this.boms.record(code);
    const { buildQuantity, offerChoices } = record.train;
    const choices = Object.fromEntries(
      offerChoices.map(({ partNumber, offerId }) => [partNumber, Number(offerId)]),
    );
    const prices = await this.prices.ofBom(record.bom, buildQuantity, choices);
    return {
      name: workbookName(record.train),
      // The same day as the offers are of; the sheets write dates in UTC.
      bytes: await bomWorkbook({ ...record, prices }, new Date(`${this.clock.today()}T00:00:00Z`)),
    };
  }
}
