import { createHash, randomBytes } from 'node:crypto';

/** A token for a link in a mail, 256 random bits; only its hash is stored. */
export function newToken(): { token: string; tokenHash: string } {
  const token = randomBytes(32).toString('base64url');
  return { token, tokenHash: hashOfToken(token) };
}

export function hashOfToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
