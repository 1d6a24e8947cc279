import { Inject, Injectable, Logger } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { InjectRepository } from '@nestjs/typeorm';
import { filter, type Observable, Subject, take } from 'rxjs';
import { type EntityManager, LessThan, Repository } from 'typeorm';
import { Clock } from '../common/clock.js';
import { WriteQueue } from '../database/write-queue.js';
import { SETTINGS, type Settings } from '../settings/settings.js';
import { type UserEntity } from '../users/entities/user.entity.js';
import { SessionEntity } from './entities/session.entity.js';
import { permissionsOf } from './permissions.js';
import { type SignedInUser } from './signed-in-user.js';
import { hashToken, newToken } from './tokens.js';

const MINUTE_MS = 60_000;
/** A session unused for this long is over. */
export const IDLE_MS = 12 * 60 * MINUTE_MS;
/** A session is over this long after the sign-in, used or not. */
export const LIFETIME_MS = 30 * 24 * 60 * MINUTE_MS;
/** How stale `seenAt` may get, so that reading does not write on every request. */
const SEEN_STEP_MS = 5 * MINUTE_MS;

/** One session, or all of a person. */
interface EndedSessions {
  sessionId?: string;
  userId?: string;
}

interface SessionClaims {
  sid: string;
}

/** Sessions live in the database and are looked up on every request, so ending one works at once. */
@Injectable()
export class SessionsService {
  private readonly logger = new Logger(SessionsService.name);
  private readonly ended = new Subject<EndedSessions>();

  constructor(
    @InjectRepository(SessionEntity) private readonly sessions: Repository<SessionEntity>,
    private readonly jwt: JwtService,
    private readonly queue: WriteQueue,
    private readonly clock: Clock,
    @Inject(SETTINGS) private readonly settings: Settings,
  ) {}

  /** Starts a session and returns the cookie's value. Also clears away what is long over. */
  async start(manager: EntityManager, userId: string): Promise<{ cookie: string; sessionId: string }> {
    const token = newToken();
    const now = this.clock.now();
    const sessionId = hashToken(token);
    await manager.delete(SessionEntity, { expiresAt: LessThan(now.toISOString()) });
    await manager.insert(SessionEntity, {
      id: sessionId,
      userId,
      createdAt: now.toISOString(),
      seenAt: now.toISOString(),
      expiresAt: new Date(now.getTime() + LIFETIME_MS).toISOString(),
    });
    const claims: SessionClaims = { sid: token };
    const cookie = await this.jwt.signAsync(claims, { expiresIn: LIFETIME_MS / 1000 });
    return { cookie, sessionId };
  }

  /** The person behind a cookie; null when it was not signed here or its session is over. */
  async personOf(cookie: string | undefined): Promise<SignedInUser | null> {
    if (!cookie) return null;
    const claims = await this.jwt.verifyAsync<SessionClaims>(cookie).catch(() => null);
    if (typeof claims?.sid !== 'string') return null;
    const session = await this.sessions.findOne({
      where: { id: hashToken(claims.sid) },
      relations: { user: true },
    });
    if (!session || !this.isAlive(session) || !this.mayUse(session.user)) return null;
    this.touch(session);
    return toSignedInUser(session.user, session.id);
  }

  /** Whether the account may be used now: active, and a demo account in demo mode only. */
  mayUse(user: Pick<UserEntity, 'active' | 'demo'>): boolean {
    return user.active && (!user.demo || this.settings.demo);
  }

  async end(manager: EntityManager, sessionId: string): Promise<void> {
    await manager.delete(SessionEntity, { id: sessionId });
    this.ended.next({ sessionId });
  }

  async endAllOf(manager: EntityManager, userId: string): Promise<void> {
    await manager.delete(SessionEntity, { userId });
    this.ended.next({ userId });
  }

  /** Tells once when the session is ended, so that what was let in by it and is still open can be closed. */
  ending(person: Pick<SignedInUser, 'id' | 'sessionId'>): Observable<EndedSessions> {
    const isTheirs = ({ sessionId, userId }: EndedSessions) =>
      sessionId === person.sessionId || userId === person.id;
    return this.ended.pipe(filter(isTheirs), take(1));
  }

  private isAlive(session: SessionEntity): boolean {
    const now = this.clock.now().getTime();
    return now < Date.parse(session.expiresAt) && now < Date.parse(session.seenAt) + IDLE_MS;
  }

  /** Not awaited by the request: reading must not wait for a long write. */
  private touch(session: SessionEntity): void {
    const now = this.clock.now();
    if (now.getTime() - Date.parse(session.seenAt) < SEEN_STEP_MS) return;
    this.queue
      .run((manager) => manager.update(SessionEntity, { id: session.id }, { seenAt: now.toISOString() }))
      .catch((error: unknown) => this.logger.warn(`A session could not be prolonged: ${String(error)}`));
  }
}

export function toSignedInUser(user: UserEntity, sessionId: string): SignedInUser {
  const { id, name, email, roles } = user;
  return { id, name, email, roles, permissions: permissionsOf(roles), sessionId };
}
