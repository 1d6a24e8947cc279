import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import { type FastifyRequest } from 'fastify';
import { signedOut } from '../common/errors.js';
import { type SignedInUser } from './signed-in-user.js';

export type { SignedInUser };

/** The person who sent the request. Only on routes that ask for a sign-in. */
export const CurrentUser = createParamDecorator((_: unknown, context: ExecutionContext): SignedInUser => {
  const { person } = context.switchToHttp().getRequest<FastifyRequest>();
  if (!person) throw signedOut();
  return person;
});
