import { type INestApplicationContext } from '@nestjs/common';
import { SYSTEM_ACTOR } from '../audit/audit.service.js';
import { DEMO_PASSWORD } from '../auth/demo-people.js';
import { permissionsOf, type Role } from '../auth/permissions.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { type User } from '../users/dto/user.js';
import { type UserInput } from '../users/dto/user-input.js';
import { UsersService } from '../users/users.service.js';

let count = 0;

/** A person to add; each call gives another name and address. */
export function newPerson(changes: Partial<UserInput> = {}): UserInput {
  count += 1;
  return {
    name: `Person ${count}`,
    email: `person-${count}@brackenbay.example`,
    roles: ['viewer'],
    password: DEMO_PASSWORD,
    ...changes,
  };
}

/** Adds a person who can sign in with the password of `newPerson`. */
export function addPerson(app: INestApplicationContext, changes: Partial<UserInput> = {}): Promise<User> {
  return app.get(UsersService).create(newPerson(changes), SYSTEM_ACTOR);
}

/** The person as services get them after a sign-in, for calls that do not come over HTTP. */
export function signedIn(user: Pick<User, 'id' | 'name' | 'email' | 'roles'>): SignedInUser {
  const { id, name, email, roles } = user;
  return { id, name, email, roles, permissions: permissionsOf(roles), sessionId: 'test' };
}

/** Adds a person of one role and gives them as services get them. */
export async function addSignedIn(app: INestApplicationContext, role: Role): Promise<SignedInUser> {
  return signedIn(await addPerson(app, { roles: [role] }));
}
