import type { Role } from '../../api/types';

/** The roles in the order in which a team fills them, each with what it gives. */
export const ROLES: readonly { role: Role; name: string; does: string }[] = [
  { role: 'designer', name: 'Designer', does: 'briefs, searches and trains' },
  { role: 'librarian', name: 'Librarian', does: 'parts' },
  { role: 'purchaser', name: 'Purchaser', does: 'takes bills of materials' },
  { role: 'viewer', name: 'Viewer', does: 'looks, nothing else' },
  { role: 'admin', name: 'Administrator', does: 'everything, people included' },
];

/** "Designer, Librarian". */
export function roleWords(roles: readonly Role[]): string {
  return ROLES.filter(({ role }) => roles.includes(role))
    .map(({ name }) => name)
    .join(', ');
}
