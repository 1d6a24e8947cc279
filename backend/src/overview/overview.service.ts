import { Injectable } from '@nestjs/common';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { BriefReader } from '../briefs/brief-reader.js';
import { PartsReader } from '../parts/parts-reader.service.js';
import { SupplierReader } from '../suppliers/supplier-reader.js';
import { TrainReader } from '../trains/train-reader.js';
import { type OverviewDto } from './dto/overview.dto.js';

/** Rows of each list on the first page. */
const MOST_ROWS = 10;

/** Today's work of one person. */
@Injectable()
export class OverviewService {
  constructor(
    private readonly parts: PartsReader,
    private readonly briefs: BriefReader,
    private readonly trains: TrainReader,
    private readonly suppliers: SupplierReader,
  ) {}

  async of({ id, permissions }: SignedInUser): Promise<OverviewDto> {
    const may = (permission: (typeof permissions)[number]) => permissions.includes(permission);
    const [readBriefs, readTrains] = [may('briefs.read'), may('trains.read')];
    return {
      counts: {
        briefs: readBriefs ? await this.briefs.count() : 0,
        trains: readTrains ? await this.trains.count() : 0,
        parts: may('parts.read') ? await this.parts.count() : 0,
        suppliers: may('prices.read') ? await this.suppliers.count() : 0,
      },
      briefs: readBriefs ? await this.briefs.latestOf(id, MOST_ROWS) : [],
      trains: readTrains ? await this.trains.latestOf(id, MOST_ROWS) : [],
      draftParts: may('parts.edit') ? await this.parts.latest('draft', MOST_ROWS) : [],
    };
  }
}
