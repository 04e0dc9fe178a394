import { createHash, randomBytes } from 'node:crypto';

export const TOKEN_MINUTES = 30;

/** What is stored of a token: somebody who reads the database cannot use it. */
export const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex');

export function makeToken(now: Date): { token: string; tokenHash: string; expiresAt: Date } {
  const token = randomBytes(32).toString('base64url');
  return { token, tokenHash: hashToken(token), expiresAt: new Date(now.getTime() + TOKEN_MINUTES * 60_000) };
}
