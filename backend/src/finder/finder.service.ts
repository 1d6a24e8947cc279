import { Injectable } from '@nestjs/common';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { BriefReader } from '../briefs/brief-reader.js';
import { PartsReader } from '../parts/parts-reader.service.js';
import { SupplierReader } from '../suppliers/supplier-reader.js';
import { TrainReader } from '../trains/train-reader.js';
import { type FinderResultDto } from './dto/finder-result.dto.js';

/** Most things of one kind. */
const MOST_OF_A_KIND = 8;

/** The search of the header, over everything a person may read. */
@Injectable()
export class FinderService {
  constructor(
    private readonly parts: PartsReader,
    private readonly briefs: BriefReader,
    private readonly trains: TrainReader,
    private readonly suppliers: SupplierReader,
  ) {}

  async find(user: SignedInUser, text: string): Promise<FinderResultDto> {
    const wanted = text.replace(/\p{Cc}/gu, ' ').trim();
    if (wanted === '') return { parts: [], briefs: [], trains: [], suppliers: [] };
    const may = (permission: SignedInUser['permissions'][number]) => user.permissions.includes(permission);
    return {
      parts: may('parts.read') ? await this.parts.find(wanted, MOST_OF_A_KIND) : [],
      briefs: may('briefs.read') ? await this.briefs.find(wanted, MOST_OF_A_KIND) : [],
      trains: may('trains.read') ? await this.trains.find(wanted, MOST_OF_A_KIND) : [],
      suppliers: may('prices.read') ? await this.suppliers.find(wanted, MOST_OF_A_KIND) : [],
    };
  }
}
