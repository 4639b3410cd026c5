import type { Request } from 'express';
import { findLiveSession } from '#db/sessions.ts';
import type { Deps } from '../deps.ts';
import { sessionToken } from '../http/session-cookie.ts';
import type { Actor } from './actor.ts';
import { readSessionToken } from './session-token.ts';

/** Who sent the request; null when nobody is signed in, or no longer. */
export async function readActor(deps: Deps, request: Request): Promise<Actor | null> {
  const token = sessionToken(request);
  const id = token ? readSessionToken(deps.sessionSecret, token) : null;
  return id ? findLiveSession(deps.database, id) : null;
}
