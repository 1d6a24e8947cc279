import { Injectable } from '@nestjs/common';
import { AuditService } from '../audit/audit.service.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Clock } from '../common/clock.js';
import { conflict, notFound } from '../common/errors.js';
import { rowId } from '../common/row-id.js';
import { WriteQueue } from '../database/write-queue.js';
import { OptionSearch } from '../option-searches/entities/option-search.entity.js';
import { BriefReader } from './brief-reader.js';
import { type BriefDto } from './dto/brief.dto.js';
import { Pin } from './entities/pin.entity.js';

/** Most options pinned to one brief: beyond it nobody compares any more. */
export const MOST_PINS = 12;

type Person = Pick<SignedInUser, 'id' | 'name'>;

/** Keeping options of a brief for comparison. */
@Injectable()
export class PinsService {
  constructor(
    private readonly writes: WriteQueue,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly reader: BriefReader,
  ) {}

  /**
   * Pins an option that a search of this brief found; a second time changes nothing.
   * @throws ProblemError 404 for an unknown brief, search or option; 409 when twelve are pinned already
   */
  async pin(brief: string, optionKey: string, search: string, actor: Person): Promise<BriefDto> {
    const briefId = rowId(brief, 'brief');
    const searchId = rowId(search, 'search');
    return this.writes.run(async (manager) => {
      const before = await this.reader.describe(manager, briefId);
      if (before.pins.some((pin) => pin.key === optionKey)) return before;
      const found = await manager.findOneBy(OptionSearch, { id: searchId, briefId });
      if (!found) throw notFound('search of this brief', search);
      const option = found.outcome?.options.find(({ key }) => key === optionKey);
      if (!option) throw notFound('option of this search', optionKey);
      if (before.pins.length >= MOST_PINS) {
        const message = `${MOST_PINS} options are pinned to this brief, the most there can be. Take one off first.`;
        throw conflict('too-many-pins', message);
      }
      const pin = { briefId, optionKey, searchId, option, pinnedAt: this.clock.iso(), pinnedById: actor.id };
      await manager.insert(Pin, pin);
      await this.audit.record(manager, {
        actor,
        action: 'pinned',
        entity: 'brief',
        entityId: before.code,
        summary: `Pinned ${optionKey} to ${before.code}`,
        after: { option: optionKey, searchId: search },
      });
      return this.reader.describe(manager, briefId);
    });
  }

  /** Takes a pin off; one that is not there changes nothing. @throws ProblemError 404 for an unknown brief */
  async unpin(brief: string, optionKey: string, actor: Person): Promise<BriefDto> {
    const briefId = rowId(brief, 'brief');
    return this.writes.run(async (manager) => {
      const before = await this.reader.describe(manager, briefId);
      const { affected } = await manager.delete(Pin, { briefId, optionKey });
      if (!affected) return before;
      await this.audit.record(manager, {
        actor,
        action: 'unpinned',
        entity: 'brief',
        entityId: before.code,
        summary: `Took the pin off ${optionKey} of ${before.code}`,
        before: { option: optionKey },
      });
      return this.reader.describe(manager, briefId);
    });
  }
}
