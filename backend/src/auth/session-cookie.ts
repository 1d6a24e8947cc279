import { type CookieSerializeOptions } from '@fastify/cookie';
import { type FastifyReply, type FastifyRequest } from 'fastify';
import { type Settings } from '../settings/settings.js';

const NAME = 'stageyard_session';

/** Strict: a page of another site never sends it, not even by a link; our own pages ask for data from our own. */
function options(settings: Settings): CookieSerializeOptions {
  const secure = settings.publicUrl?.startsWith('https:') ?? false;
  return { httpOnly: true, sameSite: 'strict', path: '/', secure };
}

export function readSessionCookie(request: FastifyRequest): string | undefined {
  return request.cookies[NAME];
}

export function setSessionCookie(
  reply: FastifyReply,
  settings: Settings,
  value: string,
  maxAge: number,
): void {
  void reply.setCookie(NAME, value, { ...options(settings), maxAge });
}

export function clearSessionCookie(reply: FastifyReply, settings: Settings): void {
  void reply.clearCookie(NAME, options(settings));
}
