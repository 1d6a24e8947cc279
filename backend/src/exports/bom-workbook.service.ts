import { Injectable } from '@nestjs/common';
import { Clock } from '../common/clock.js';
import { BomService } from '../trains/bom.service.js';
import { bomWorkbook, workbookName } from './bom-workbook.js';

/** Workbooks for download. */
@Injectable()
export class BomWorkbookService {
  constructor(
    private readonly boms: BomService,
    private readonly clock: Clock,
  ) {}

  /** @throws ProblemError 404 */
  async ofTrain(code: string): Promise<{ name: string; bytes: Buffer }> {
    const record = await this.boms.record(code);
    return { name: workbookName(record.train), bytes: await bomWorkbook(record, this.clock.now()) };
  }
}
