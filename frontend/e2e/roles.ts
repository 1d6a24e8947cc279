import path from 'node:path';

export const ROLES = ['admin', 'designer', 'librarian', 'purchaser', 'viewer'] as const;
export type Role = (typeof ROLES)[number];

/** Known password of the demo accounts. */
export const DEMO_PASSWORD = 'stageyard-demo';

/** Where the session of a role is kept while the journeys run. */
export function stateFile(role: Role): string {
  const folder = process.env.STAGEYARD_JOURNEY_FOLDER;
  if (folder === undefined) throw new Error('The journeys run only behind e2e/start-server.ts.');
  return path.join(folder, `${role}.json`);
}
