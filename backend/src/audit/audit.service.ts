import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, Repository } from 'typeorm';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Clock } from '../common/clock.js';
import { type ListQueryDto, type Page, pageOf, parseListQuery } from '../common/list-query.js';
import { type Change, toChange } from './dto/change.js';
import { type ChangeQuery } from './dto/change-query.js';
import { AuditEntry } from './entities/audit-entry.js';

export type AuditedEntity = 'part' | 'brief' | 'search' | 'train' | 'user' | 'session';

const ABOUT_PEOPLE: readonly AuditedEntity[] = ['user', 'session'];

/** The server acting by itself. */
export interface SystemActor {
  id: null;
  name: string;
}

export const SYSTEM_ACTOR: SystemActor = { id: null, name: 'Stageyard' };

export interface AuditRecord {
  actor: Pick<SignedInUser, 'id' | 'name'> | SystemActor;
  /** A verb in a person's words: `added`, `changed`, `signed in`. */
  action: string;
  entity: AuditedEntity;
  /** What people call the thing: a part's number, a brief's or train's code or id, a person's id. */
  entityId: string;
  summary: string;
  /** Never a password or a token. */
  before?: unknown;
  after?: unknown;
}

@Injectable()
export class AuditService {
  constructor(
    @InjectRepository(AuditEntry) private readonly entries: Repository<AuditEntry>,
    private readonly clock: Clock,
  ) {}

  /** Adds one row to the record, in the transaction of the change it tells of. */
  async record(manager: EntityManager, { actor, before, after, ...entry }: AuditRecord): Promise<void> {
    await manager.insert(AuditEntry, {
      ...entry,
      at: this.clock.iso(),
      actorId: actor.id,
      actorName: actor.name,
      before: toJson(before),
      after: toJson(after),
    });
  }

  /** The changes of one thing, newest first. */
  changesOf(entity: AuditedEntity, entityId: string, query: ListQueryDto): Promise<Page<Change>> {
    return this.search({ ...query, entity, entityId });
  }

  /** What the person may see: accounts and sign-ins are for those who manage people. */
  visibleTo({ permissions }: SignedInUser, query: ChangeQuery): Promise<Page<Change>> {
    return this.search(query, permissions.includes('people.manage') ? [] : ABOUT_PEOPLE);
  }

  /** All changes that match, newest first unless the query sorts by `at`. */
  async search(query: ChangeQuery, hidden: readonly AuditedEntity[] = []): Promise<Page<Change>> {
    const list = parseListQuery(query, ['at']);
    const rows = this.entries
      .createQueryBuilder('entry')
      .orderBy('entry.id', list.sorts[0]?.direction ?? 'DESC')
      .skip(list.skip)
      .take(list.size);
    if (hidden.length > 0) rows.andWhere('entry.entity NOT IN (:...hidden)', { hidden });
    if (query.entity) rows.andWhere('entry.entity = :entity', { entity: query.entity });
    if (query.entityId) rows.andWhere('entry.entityId = :entityId', { entityId: query.entityId });
    if (list.text) {
      rows.andWhere(
        '(instr(lower(entry.summary), lower(:text)) OR instr(lower(entry.actorName), lower(:text)))',
        {
          text: list.text,
        },
      );
    }
    const [entries, total] = await rows.getManyAndCount();
    return pageOf(entries.map(toChange), total, list);
  }
}

/** What is recorded is a copy as JSON knows it; null stays null. */
function toJson(value: unknown): object | null {
  return value === undefined || value === null ? null : (JSON.parse(JSON.stringify(value)) as object);
}
