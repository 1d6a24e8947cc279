import { Injectable } from '@nestjs/common';
import { type EntityManager } from 'typeorm';
import { AuditService } from '../audit/audit.service.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Clock } from '../common/clock.js';
import { nextCode } from '../common/next-code.js';
import { rowId } from '../common/row-id.js';
import { updateVersioned } from '../database/update-versioned.js';
import { WriteQueue } from '../database/write-queue.js';
import { BriefReader } from './brief-reader.js';
import { type BriefDto } from './dto/brief.dto.js';
import { type BriefInputDto } from './dto/brief-input.dto.js';
import { type BriefPatchDto } from './dto/brief-patch.dto.js';
import { Brief } from './entities/brief.entity.js';
import { checkRequirement, findsTheSame } from './requirement.js';

type Person = Pick<SignedInUser, 'id' | 'name'>;

/** Writing and changing briefs. */
@Injectable()
export class BriefsService {
  constructor(
    private readonly writes: WriteQueue,
    private readonly audit: AuditService,
    private readonly clock: Clock,
    private readonly reader: BriefReader,
  ) {}

  /** @throws ProblemError 400 naming every field of the requirement at fault */
  async create(input: BriefInputDto, actor: Person): Promise<BriefDto> {
    const requirement = checkRequirement(input.requirement);
    const now = this.clock.iso();
    return this.writes.run(async (manager) => {
      const brief = await manager.save(Brief, {
        code: await nextCode(manager, Brief, 'B'),
        title: input.title,
        note: input.note ?? '',
        requirement,
        standing: 'open' as const,
        ownerId: actor.id,
        version: 1,
        createdAt: now,
        updatedAt: now,
      });
      await this.audit.record(manager, {
        actor,
        action: 'added',
        entity: 'brief',
        entityId: brief.code,
        summary: `Added the brief ${brief.code} “${brief.title}”`,
        after: audited(brief),
      });
      return this.reader.describe(manager, brief.id);
    });
  }

  /**
   * Changes what the patch names. A new requirement makes the brief `open` again: what was found belongs to the old one.
   * Another build quantity alone does not: the options stay, only their prices change.
   * @throws ProblemError 400, 404, or 409 when the brief changed since the version that was seen
   */
  async edit(id: string, patch: BriefPatchDto, actor: Person): Promise<BriefDto> {
    const where = { id: rowId(id, 'brief') };
    const requirement = patch.requirement && checkRequirement(patch.requirement);
    return this.writes.run(async (manager) => {
      const before = await this.reader.describe(manager, where.id);
      const changesSearch = requirement !== undefined && !findsTheSame(before.requirement, requirement);
      const reopens = changesSearch && before.standing === 'searched';
      const change = {
        ...(patch.title === undefined ? {} : { title: patch.title }),
        ...(patch.note === undefined ? {} : { note: patch.note }),
        ...(requirement ? { requirement } : {}),
        ...(reopens ? { standing: 'open' as const } : {}),
        updatedAt: this.clock.iso(),
      };
      const after = await updateVersioned(manager, Brief, where, patch.version, change, () => before);
      await this.recordEdit(manager, before, after, actor);
      return this.reader.describe(manager, where.id);
    });
  }

  private recordEdit(manager: EntityManager, before: BriefDto, after: Brief, actor: Person): Promise<void> {
    return this.audit.record(manager, {
      actor,
      action: 'changed',
      entity: 'brief',
      entityId: after.code,
      summary: `Changed the brief ${after.code}`,
      before: audited(before),
      after: audited(after),
    });
  }
}

function audited({
  title,
  note,
  requirement,
  version,
}: Pick<Brief, 'title' | 'note' | 'requirement' | 'version'>) {
  return { title, note, requirement, version };
}
