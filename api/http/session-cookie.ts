import type { Request, Response } from 'express';

export const cookieName = 'dropwatt_session';

/** The session's token in the request; null when there is none. */
export function sessionToken(request: Request): string | null {
  const cookies: unknown = request.cookies;
  if (typeof cookies !== 'object' || cookies === null || !(cookieName in cookies)) return null;
  const token = (cookies as Record<string, unknown>)[cookieName];
  return typeof token === 'string' ? token : null;
}

/** Out of reach of scripts, sent only from pages of this site, and over TLS only where the site has TLS. */
export function setSessionCookie(
  response: Response,
  publicUrl: string,
  session: { token: string; expiresAt: Date } | null,
): void {
  const options = {
    httpOnly: true,
    sameSite: 'lax',
    secure: publicUrl.startsWith('https:'),
    path: '/',
  } as const;
  if (session) response.cookie(cookieName, session.token, { ...options, expires: session.expiresAt });
  else response.clearCookie(cookieName, options);
}
