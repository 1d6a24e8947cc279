import { type CanActivate, type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { type FastifyRequest } from 'fastify';
import { forbidden, signedOut } from '../common/errors.js';
import { ACCESS, type Access } from './allow.decorator.js';
import { readSessionCookie } from './session-cookie.js';
import { SessionsService } from './sessions.service.js';

/** Lets a request through when its person may call the route. */
@Injectable()
export class AccessGuard implements CanActivate {
  constructor(
    private readonly reflector: Reflector,
    private readonly sessions: SessionsService,
  ) {}

  async canActivate(context: ExecutionContext): Promise<boolean> {
    const places = [context.getHandler(), context.getClass()];
    const access = this.reflector.getAllAndOverride<Access | undefined>(ACCESS, places);
    if (access === 'public') return true;
    const request = context.switchToHttp().getRequest<FastifyRequest>();
    const person = await this.sessions.personOf(readSessionCookie(request));
    if (!person) throw signedOut();
    request.person = person;
    // A route without a declaration never gets here, since the server does not start; it would be refused.
    if (access === undefined || (access !== 'signed-in' && !person.permissions.includes(access)))
      throw forbidden();
    return true;
  }
}
