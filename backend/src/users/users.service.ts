import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { type EntityManager, Not, Repository } from 'typeorm';
import { AuditService, type SystemActor } from '../audit/audit.service.js';
import { hashPassword } from '../auth/passwords.js';
import { type Role } from '../auth/permissions.js';
import { SessionsService } from '../auth/sessions.service.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { Clock } from '../common/clock.js';
import { badInput, conflict, notFound } from '../common/errors.js';
import { type ListQueryDto, type Page, pageOf, parseListQuery } from '../common/list-query.js';
import { updateVersioned } from '../database/update-versioned.js';
import { WriteQueue } from '../database/write-queue.js';
import { toUser, type User } from './dto/user.js';
import { type UserInput } from './dto/user-input.js';
import { type UserPatch } from './dto/user-patch.js';
import { UserEntity } from './entities/user.entity.js';

export interface NewPerson {
  name: string;
  email: string;
  roles: Role[];
  passwordHash: string;
  demo?: boolean;
}

type Actor = Pick<SignedInUser, 'id' | 'name'> | SystemActor;

@Injectable()
export class UsersService {
  constructor(
    @InjectRepository(UserEntity) private readonly users: Repository<UserEntity>,
    private readonly sessions: SessionsService,
    private readonly audit: AuditService,
    private readonly queue: WriteQueue,
    private readonly clock: Clock,
  ) {}

  async list(query: ListQueryDto): Promise<Page<User>> {
    const list = parseListQuery(query, ['name', 'email', 'createdAt']);
    const rows = this.users.createQueryBuilder('person').skip(list.skip).take(list.size);
    if (list.text) {
      rows.where('(instr(lower(person.name), lower(:text)) OR instr(person.email, lower(:text)))', {
        text: list.text,
      });
    }
    for (const { field, direction } of list.sorts) rows.addOrderBy(`person.${field}`, direction);
    const [people, total] = await rows.addOrderBy('person.name').addOrderBy('person.id').getManyAndCount();
    return pageOf(people.map(toUser), total, list);
  }

  /** @throws ProblemError 409 when somebody has the address already */
  async create(input: UserInput, actor: Actor): Promise<User> {
    const passwordHash = await this.hashFor(input);
    return toUser(await this.queue.run((manager) => this.insert(manager, { ...input, passwordHash }, actor)));
  }

  /**
   * Changes a person. Taking the last administrator's role or account away is refused; making somebody inactive
   * or giving a new password ends their sessions.
   * @throws ProblemError 404, 409 when changed meanwhile, when the address is taken, or for the last administrator
   */
  async change(id: string, { version, password, ...patch }: UserPatch, actor: SignedInUser): Promise<User> {
    const known = await this.users.findOneBy({ id });
    if (!known) throw notFound('person', id);
    const email = patch.email === undefined ? undefined : normalEmail(patch.email);
    const passwordHash =
      password === undefined ? undefined : await this.hashFor({ email: email ?? known.email, password });
    return this.queue.run(async (manager) => {
      const before = await manager.findOneByOrFail(UserEntity, { id });
      if (email !== undefined) await this.refuseTaken(manager, email, id);
      const values = withoutUndefined({ ...patch, email, passwordHash, updatedAt: this.clock.iso() });
      const after = await updateVersioned(manager, UserEntity, { id }, version, values, toUser);
      await this.keepAnAdmin(manager);
      if (!after.active || passwordHash !== undefined) await this.sessions.endAllOf(manager, id);
      await this.audit.record(manager, {
        actor,
        action: 'changed',
        entity: 'user',
        entityId: id,
        summary: `${after.name}: ${passwordHash === undefined ? 'account changed' : 'account changed, new password'}`,
        before: toUser(before),
        after: toUser(after),
      });
      return toUser(after);
    });
  }

  /**
   * Checks and hashes a new password, outside any transaction since it takes long.
   * @throws ProblemError 400 when the password is the address
   */
  async hashFor({ email, password }: { email: string; password: string }): Promise<string> {
    if (password.toLowerCase() === email.toLowerCase()) {
      const message = 'The password must not be the e-mail address. Choose another.';
      throw badInput([{ field: 'password', value: null, message }]);
    }
    return hashPassword(password);
  }

  /** Adds a person inside a write that is under way. @throws ProblemError 409 when the address is taken */
  async insert(manager: EntityManager, person: NewPerson, actor: Actor): Promise<UserEntity> {
    const email = normalEmail(person.email);
    await this.refuseTaken(manager, email);
    const now = this.clock.iso();
    const id = randomUUID();
    await manager.insert(UserEntity, {
      ...{ demo: false, active: true, version: 1, createdAt: now, updatedAt: now },
      ...person,
      id,
      email,
      name: person.name.trim(),
    });
    const added = await manager.findOneByOrFail(UserEntity, { id });
    await this.audit.record(manager, {
      actor,
      action: 'added',
      entity: 'user',
      entityId: id,
      summary: `${added.name} (${added.roles.join(', ')}) added`,
      after: toUser(added),
    });
    return added;
  }

  private async refuseTaken(manager: EntityManager, email: string, exceptId = ''): Promise<void> {
    if (!(await manager.existsBy(UserEntity, { email, id: Not(exceptId) }))) return;
    throw conflict('email-taken', `Somebody signs in as ${email} already. Use another address.`);
  }

  private async keepAnAdmin(manager: EntityManager): Promise<void> {
    const active = await manager.findBy(UserEntity, { active: true });
    if (active.some((user) => user.roles.includes('admin') && this.sessions.mayUse(user))) return;
    const message = 'This is the last administrator. Make somebody else administrator first.';
    throw conflict('last-admin', message);
  }
}

function normalEmail(email: string): string {
  return email.trim().toLowerCase();
}

function withoutUndefined<T extends object>(values: T): T {
  return Object.fromEntries(Object.entries(values).filter(([, value]) => value !== undefined)) as T;
}
