import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, Repository } from 'typeorm';
import { type Permission } from '../auth/permissions.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Clock } from '../common/clock.js';
import { type ListQueryDto, type Page, pageOf, parseListQuery } from '../common/list-query.js';
import { type Change, toChange } from './dto/change.js';
import { type ChangeQuery } from './dto/change-query.js';
import { AuditEntry } from './entities/audit-entry.js';

export type AuditedEntity =
  | 'part'
  | 'stock'
  | 'brief'
  | 'search'
  | 'train'
  | 'user'
  | 'session'
  | 'supplier'
  | 'offer'
  | 'offer-choice';

/** What each of these permissions opens in the record; everybody who reads it sees the rest. */
const CLOSED: readonly [Permission, readonly AuditedEntity[]][] = [
  ['people.manage', ['user', 'session']],
  ['prices.read', ['supplier', 'offer', 'offer-choice']],
];

/** Rows written by one statement. */
const ROWS_AT_ONCE = 100;

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
  async record(manager: EntityManager, record: AuditRecord): Promise<void> {
    await this.recordMany(manager, [record]);
  }

  /** Adds many rows to the record, a hundred a statement, in the order given. */
  async recordMany(manager: EntityManager, records: readonly AuditRecord[]): Promise<void> {
    const at = this.clock.iso();
    for (let start = 0; start < records.length; start += ROWS_AT_ONCE) {
      const entries = records
        .slice(start, start + ROWS_AT_ONCE)
        .map(({ actor, before, after, ...entry }) => ({
          ...entry,
          at,
          actorId: actor.id,
          actorName: actor.name,
          before: toJson(before),
          after: toJson(after),
        }));
      await manager
        .createQueryBuilder()
        .insert()
        .into(AuditEntry)
        .values(entries)
        .updateEntity(false)
        .execute();
    }
  }

  /** The changes of one thing, newest first. */
  changesOf(entity: AuditedEntity, entityId: string, query: ListQueryDto): Promise<Page<Change>> {
    return this.search({ ...query, entity, entityId });
  }

  /** What the person may see: accounts and sign-ins are for those who manage people, prices for those who read them. */
  visibleTo({ permissions }: SignedInUser, query: ChangeQuery): Promise<Page<Change>> {
    const hidden = CLOSED.flatMap(([permission, entities]) =>
      permissions.includes(permission) ? [] : entities,
    );
    return this.search(query, hidden);
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
