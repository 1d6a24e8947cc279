import { hash, verify } from 'argon2';

export const SHORTEST_PASSWORD = 10;
export const LONGEST_PASSWORD = 200;

/** argon2id (the package's default kind) with 19 MiB, two passes, one lane: the least that OWASP asks for. */
const COST = { memoryCost: 19 * 1024, timeCost: 2, parallelism: 1 };

export function hashPassword(password: string): Promise<string> {
  return hash(password, COST);
}

let decoy: Promise<string> | undefined;

/**
 * Whether the password is the one behind the hash. Without a hash (nobody has that address) it takes as long
 * and says no, so that timing does not tell which addresses exist.
 */
export async function passwordMatches(passwordHash: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('no account has this password');
  const matches = await verify(passwordHash ?? (await decoy), password);
  return matches && passwordHash !== null;
}
