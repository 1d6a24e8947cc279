import { createHash, randomBytes } from 'node:crypto';

/** 256 random bits, safe in addresses and cookies. */
export function newToken(): string {
  return randomBytes(32).toString('base64url');
}

/** What the database keeps of a token. The token is random, so a plain hash is enough. */
export function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
