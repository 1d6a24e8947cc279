import { Inject, Injectable, Logger } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { Repository } from 'typeorm';
import { AuditService, SYSTEM_ACTOR } from '../audit/audit.service.js';
import { ProblemError } from '../common/errors.js';
import { WriteQueue } from '../database/write-queue.js';
import { SETTINGS, type Settings } from '../settings/settings.js';
import { UserEntity } from '../users/entities/user.entity.js';
import { UsersService } from '../users/users.service.js';
import { DEMO_PASSWORD, DEMO_PEOPLE } from './demo-people.js';
import { type FirstAdminInput } from './dto/first-admin-input.js';
import { type SignInInput } from './dto/sign-in-input.js';
import { type Welcome } from './dto/welcome.js';
import { InvitationsService } from './invitations.service.js';
import { passwordMatches } from './passwords.js';
import { SessionsService, toSignedInUser } from './sessions.service.js';
import { SignInThrottle } from './sign-in-throttle.js';
import { type SignedInUser } from './signed-in-user.js';

/** Somebody who just signed in, and the cookie that proves it from now on. */
export interface Arrival {
  person: SignedInUser;
  cookie: string;
}

@Injectable()
export class AuthService {
  private readonly logger = new Logger(AuthService.name);

  constructor(
    @InjectRepository(UserEntity) private readonly users: Repository<UserEntity>,
    private readonly people: UsersService,
    private readonly sessions: SessionsService,
    private readonly invitations: InvitationsService,
    private readonly throttle: SignInThrottle,
    private readonly audit: AuditService,
    private readonly queue: WriteQueue,
    @Inject(SETTINGS) private readonly settings: Settings,
  ) {}

  welcome(): Welcome {
    const { demo } = this.settings;
    return {
      demo,
      accounts: demo ? DEMO_PEOPLE.map(({ email, name, role }) => ({ email, name, role })) : [],
      password: demo ? DEMO_PASSWORD : null,
    };
  }

  /**
   * @param address where the request came from, for the throttle
   * @throws ProblemError 401 for a wrong pair, whichever half is wrong; 429 after too many of them
   */
  async signIn({ email, password }: SignInInput, address: string): Promise<Arrival> {
    const key = email.trim().toLowerCase();
    const user = await this.throttle.guard(address, key, () => this.matching(key, password));
    if (!user) {
      this.noteRefusal(key, address);
      throw wrongPair();
    }
    return this.arrive(user);
  }

  /** Not awaited by the answer, whose time would tell which addresses exist. */
  private noteRefusal(email: string, address: string): void {
    this.logger.warn(`A sign-in from ${address} was refused.`);
    this.recordRefusal(email, address).catch((error: unknown) =>
      this.logger.warn(`A refused sign-in could not be put on record: ${String(error)}`),
    );
  }

  /** Only of known accounts: the throttle keeps the rows few, and mistyped passwords in the field stay out. */
  private async recordRefusal(email: string, address: string): Promise<void> {
    const user = await this.users.findOneBy({ email });
    if (!user) return;
    await this.queue.run((manager) =>
      this.audit.record(manager, {
        actor: SYSTEM_ACTOR,
        action: 'sign-in refused',
        entity: 'session',
        entityId: user.id,
        summary: `A sign-in as ${user.name} from ${address} was refused`,
      }),
    );
  }

  async signOut(person: SignedInUser): Promise<void> {
    await this.queue.run(async (manager) => {
      await this.sessions.end(manager, person.sessionId);
      await this.audit.record(manager, {
        actor: person,
        action: 'signed out',
        entity: 'session',
        entityId: person.id,
        summary: `${person.name} signed out`,
      });
    });
  }

  /**
   * Makes the first administrator and signs them in. The link works once.
   * @throws ProblemError 403 when the link is unknown, used or too old
   */
  async firstAdmin({ token, ...input }: FirstAdminInput, address: string): Promise<Arrival> {
    const details = { ...input, roles: ['admin' as const] };
    const user = await this.throttle.guard(address, 'first-admin', async () => {
      const passwordHash = await this.people.hashFor(details);
      return this.queue.run(async (manager) => {
        await this.invitations.redeem(manager, token);
        return this.people.insert(manager, { ...details, passwordHash }, { id: null, name: 'First start' });
      });
    });
    if (!user) throw wrongPair();
    return this.arrive(user);
  }

  /** The active person with that address and password. */
  private async matching(email: string, password: string): Promise<UserEntity | null> {
    const user = await this.users.findOne({
      where: { email },
      select: {
        id: true,
        name: true,
        email: true,
        roles: true,
        active: true,
        demo: true,
        passwordHash: true,
      },
    });
    const matches = await passwordMatches(user?.passwordHash ?? null, password);
    return user && matches && this.sessions.mayUse(user) ? user : null;
  }

  private async arrive(user: UserEntity): Promise<Arrival> {
    return this.queue.run(async (manager) => {
      const { cookie, sessionId } = await this.sessions.start(manager, user.id);
      await this.audit.record(manager, {
        actor: user,
        action: 'signed in',
        entity: 'session',
        entityId: user.id,
        summary: `${user.name} signed in`,
      });
      return { cookie, person: toSignedInUser(user, sessionId) };
    });
  }
}

function wrongPair(): ProblemError {
  const message = 'The e-mail address or the password is wrong. Check both, then try again.';
  return new ProblemError(401, 'wrong-sign-in', message);
}
