import { permissionsOf } from '@stageyard/backend/auth/permissions';
import { type SignedInUser } from '@stageyard/backend/auth/signed-in-user';
import { type UsersService } from '@stageyard/backend/users/users.service';

/** The demo person of a role, as the services see somebody who is signed in. */
export type Actors = Record<'designer' | 'librarian' | 'purchaser', SignedInUser>;

/** @throws Error when the demo accounts are missing, which happens only outside demo mode */
export async function demoActors(users: UsersService): Promise<Actors> {
  const { items } = await users.list({ size: 100 });
  const actor = (role: keyof Actors): SignedInUser => {
    const person = items.find(({ roles, email }) => email.startsWith(`${role}@`) && roles.includes(role));
    if (person === undefined)
      throw new Error(`There is no demo ${role}: the demo data belongs to demo mode.`);
    const { id, name, email, roles } = person;
    return { id, name, email, roles, permissions: permissionsOf(roles), sessionId: 'demo-data' };
  };
  return { designer: actor('designer'), librarian: actor('librarian'), purchaser: actor('purchaser') };
}
