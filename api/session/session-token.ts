import jwt from 'jsonwebtoken';

const algorithm = 'HS256';
const issuer = 'dropwatt';

/** A signed token that names a session row; the row decides whether it still counts. */
export function signSessionToken(secret: string, sessionId: string, expiresAt: Date): string {
  return jwt.sign({ sid: sessionId, exp: Math.floor(expiresAt.getTime() / 1000) }, secret, { algorithm, issuer });
}

/** Session named by a token of ours that has not run out; null for anything else. */
export function readSessionToken(secret: string, token: string): string | null {
  try {
    const payload = jwt.verify(token, secret, { algorithms: [algorithm], issuer });
    if (typeof payload === 'string') return null;
    const sid: unknown = payload.sid;
    return typeof sid === 'string' && /^[0-9a-f-]{36}$/.test(sid) ? sid : null;
  } catch {
    return null;
  }
}
