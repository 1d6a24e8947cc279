import { Injectable } from '@nestjs/common';
import { AuditService } from '../../audit/audit.service.js';
import { type SignedInUser } from '../../auth/signed-in-user.js';
import { Clock } from '../../common/clock.js';
import { ChangedMeanwhileError } from '../../common/errors.js';
import { updateVersioned } from '../../database/update-versioned.js';
import { WriteQueue } from '../../database/write-queue.js';
import { type BomEdits, NO_EDITS } from '../bom-edits.js';
import { type TrainDto } from '../dto/train.dto.js';
import { Train } from '../entities/train.entity.js';
import { TrainReader } from '../train-reader.js';

/** What an edit of the bill of materials changes of a train. */
export interface BomChange {
  spec?: Train['spec'];
  bomEdits?: BomEdits;
}

/** Books edits of bills of materials; each is one version of the train. */
@Injectable()
export class BomEditing {
  constructor(
    private readonly writes: WriteQueue,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly reader: TrainReader,
  ) {}

  /** The train as the person saw it. @throws ProblemError 404, or 409 when it changed since */
  async seen(code: string, version: number): Promise<Train> {
    const train = await this.reader.row(code);
    if (train.version !== version) throw new ChangedMeanwhileError(await this.reader.describe(train));
    return train;
  }

  /** @throws ProblemError 409 when the train changed since `train` was read */
  async book(
    train: Train,
    asked: BomChange,
    actor: Pick<SignedInUser, 'id' | 'name'>,
    action: string,
    summary: string,
  ): Promise<TrainDto> {
    const { code } = train;
    const change = onlyChanged(train, asked);
    await this.writes.run(async (manager) => {
      const present = async () => this.reader.describe(await this.reader.load(manager, code));
      const set = { ...change, updatedAt: this.clock.iso() };
      const after = await updateVersioned<Train>(manager, Train, { code }, train.version, set, present);
      await this.audit.record(manager, {
        actor,
        action,
        entity: 'train',
        entityId: code,
        summary,
        before: audited(train, change),
        after: audited(after, change),
      });
    });
    return this.reader.describe(await this.reader.row(code));
  }
}

/** An edit may hand over the whole draft; what is as before is neither written nor put on record. */
function onlyChanged(train: Train, { spec, bomEdits }: BomChange): BomChange {
  const differs = (a: unknown, b: unknown) => JSON.stringify(a) !== JSON.stringify(b);
  return {
    ...(spec && differs(spec, train.spec) ? { spec } : {}),
    ...(bomEdits && differs(bomEdits, train.bomEdits ?? NO_EDITS) ? { bomEdits } : {}),
  };
}

/** Only what the edit touches: a long list of added lines stands in the record when it changes. */
function audited({ spec, bomEdits, version }: Train, change: BomChange): object {
  return {
    ...(change.spec ? { spec } : {}),
    ...(change.bomEdits ? { bomEdits } : {}),
    version,
  };
}
