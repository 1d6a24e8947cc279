import { type Permission, type Role } from './permissions.js';

/** The person behind a request, as the session names them. */
export interface SignedInUser {
  id: string;
  name: string;
  email: string;
  roles: Role[];
  permissions: Permission[];
  sessionId: string;
}

declare module 'fastify' {
  interface FastifyRequest {
    /** Set by the guard; undefined on public routes. */
    person?: SignedInUser;
  }
}
