import { Inject, Injectable, type OnApplicationBootstrap } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { Repository } from 'typeorm';
import { SYSTEM_ACTOR } from '../audit/audit.service.js';
import { WriteQueue } from '../database/write-queue.js';
import { SETTINGS, type Settings } from '../settings/settings.js';
import { UserEntity } from '../users/entities/user.entity.js';
import { UsersService } from '../users/users.service.js';
import { DEMO_PASSWORD, DEMO_PEOPLE } from './demo-people.js';
import { InvitationsService } from './invitations.service.js';
import { hashPassword } from './passwords.js';

/** Makes sure that somebody can sign in: the known accounts in demo mode, a link for the first admin otherwise. */
@Injectable()
export class OpeningService implements OnApplicationBootstrap {
  constructor(
    @InjectRepository(UserEntity) private readonly users: Repository<UserEntity>,
    private readonly people: UsersService,
    private readonly invitations: InvitationsService,
    private readonly queue: WriteQueue,
    @Inject(SETTINGS) private readonly settings: Settings,
  ) {}

  /** In demo mode a database without the known accounts gets them. */
  async onApplicationBootstrap(): Promise<void> {
    if (!this.settings.demo || (await this.users.countBy({ demo: true })) > 0) return;
    const passwordHash = await hashPassword(DEMO_PASSWORD);
    await this.queue.run(async (manager) => {
      for (const { email, name, role } of DEMO_PEOPLE) {
        const person = { email, name, roles: [role], passwordHash, demo: true };
        await this.people.insert(manager, person, SYSTEM_ACTOR);
      }
    });
  }

  /**
   * The path of a link that makes the first administrator; null in demo mode and once there is a person of one's
   * own. Each call makes the link before it useless.
   */
  async firstAdminPath(): Promise<string | null> {
    if (this.settings.demo || (await this.users.countBy({ demo: false })) > 0) return null;
    return `/accept-invite?token=${await this.invitations.inviteFirstAdmin()}`;
  }
}
