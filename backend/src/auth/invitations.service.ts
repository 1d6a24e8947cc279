import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { type EntityManager, MoreThan } from 'typeorm';
import { Clock } from '../common/clock.js';
import { ProblemError } from '../common/errors.js';
import { WriteQueue } from '../database/write-queue.js';
import { InvitationEntity } from './entities/invitation.entity.js';
import { hashToken, newToken } from './tokens.js';

const LIFETIME_MS = 24 * 3_600_000;

/** Links that work once. */
@Injectable()
export class InvitationsService {
  constructor(
    private readonly queue: WriteQueue,
    private readonly clock: Clock,
  ) {}

  /** A new token for the first administrator; those given out before stop working. */
  async inviteFirstAdmin(): Promise<string> {
    const token = newToken();
    const now = this.clock.now();
    await this.queue.run(async (manager) => {
      await manager.delete(InvitationEntity, { purpose: 'first-admin' });
      await manager.insert(InvitationEntity, {
        id: randomUUID(),
        tokenHash: hashToken(token),
        purpose: 'first-admin',
        createdAt: now.toISOString(),
        expiresAt: new Date(now.getTime() + LIFETIME_MS).toISOString(),
      });
    });
    return token;
  }

  /**
   * Uses a token up.
   * @throws ProblemError 403 when it is unknown, used or too old
   */
  async redeem(manager: EntityManager, token: string): Promise<void> {
    const { affected } = await manager.delete(InvitationEntity, {
      tokenHash: hashToken(token),
      expiresAt: MoreThan(this.clock.iso()),
    });
    if (affected === 1) return;
    const message =
      'This link was used already or is too old. Restart the server: it prints a new one while nobody can sign in.';
    throw new ProblemError(403, 'link-over', message);
  }
}
