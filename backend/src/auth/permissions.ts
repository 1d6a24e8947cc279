export const ROLES = ['admin', 'designer', 'librarian', 'purchaser', 'viewer'] as const;
export type Role = (typeof ROLES)[number];

export const PERMISSIONS = [
  'parts.read',
  'parts.edit',
  'briefs.read',
  'briefs.edit',
  'trains.read',
  'trains.edit',
  'bom.export',
  'prices.read',
  'prices.edit',
  'offers.choose',
  'stock.read',
  'stock.book',
  'calc.use',
  'people.manage',
  'audit.read',
  'rules.read',
] as const;
export type Permission = (typeof PERMISSIONS)[number];

const LOOKING: readonly Permission[] = [
  'parts.read',
  'briefs.read',
  'trains.read',
  'stock.read',
  'audit.read',
  'rules.read',
  'calc.use',
];

/** What each role may do. A person holds what any of their roles gives. */
export const ROLE_PERMISSIONS: Readonly<Record<Role, readonly Permission[]>> = {
  admin: PERMISSIONS,
  designer: [...LOOKING, 'briefs.edit', 'trains.edit', 'bom.export', 'prices.read', 'offers.choose'],
  librarian: [...LOOKING, 'parts.edit', 'bom.export', 'prices.read', 'prices.edit', 'stock.book'],
  purchaser: [...LOOKING, 'bom.export', 'prices.read', 'prices.edit', 'offers.choose', 'stock.book'],
  viewer: LOOKING,
};

/** The union of what the roles give, in the order of `PERMISSIONS`. */
export function permissionsOf(roles: readonly Role[]): Permission[] {
  const held = new Set(roles.flatMap((role) => ROLE_PERMISSIONS[role] ?? []));
  return PERMISSIONS.filter((permission) => held.has(permission));
}
