import type { Request, RequestHandler, Response } from 'express';
import type { z } from 'zod';
import { faultsOf } from '#core/board/fault.ts';
import type { Endpoint } from '#core/contract/endpoint.ts';
import { revisionRules, teamRules } from '#core/review/permissions.ts';
import { findAssembly } from '#db/assemblies.ts';
import { findRevision, type Revision } from '#db/revisions.ts';
import type { Deps } from '../deps.ts';
import type { Actor } from '../session/actor.ts';
import { readActor } from '../session/read-actor.ts';
import { versionOf } from './if-match.ts';
import { once } from './once.ts';
import { readJson } from './read-json.ts';
import { invalid, notFound, roleRefused, signedOut } from './refusal.ts';
import type { AnyRoute } from './route.ts';
import { sendAnswer } from './send-answer.ts';

/**
 * One endpoint as an express handler: session, path, load, rights, query and body, version, act, answer. Rights come
 * before the body, so that whoever may not act learns nothing about what it should hold.
 */
export function serveEndpoint(deps: Deps, name: string, endpoint: Endpoint, route: AnyRoute): RequestHandler {
  return async (request, response) => {
    const whoAsks = () => readActor(deps, request);
    const actor = endpoint.access === 'public' ? undefined : await whoAsks();
    if (actor === null) throw signedOut();
    const params = readParams(endpoint.params, request.params);
    const revision = actor ? await loadSubject(deps, actor, params) : null;
    if (actor) authorise(endpoint.access, actor);
    const query = readPart(endpoint.query, request.query);
    const { body, written } = await readBody(endpoint, request, response);
    const input = {
      deps,
      actor,
      whoAsks,
      params,
      query,
      body,
      written,
      revision: revision ?? undefined,
      overVersion: endpoint.ifMatch ? versionOf(request.get('if-match')) : undefined,
      address: request.ip ?? '',
    };
    const answer =
      endpoint.idempotent && actor
        ? await once(deps, { name, actor, request, params, written, status: endpoint.status }, (database) =>
            route({ ...input, database }),
          )
        : await route({ ...input, database: deps.database });
    sendAnswer(deps, request, response, endpoint, answer);
  };
}

/** A path that cannot be one of ours is an address that does not exist. */
function readParams(schema: z.ZodType | undefined, given: unknown): unknown {
  if (!schema) return undefined;
  const parsed = schema.safeParse(given);
  if (!parsed.success) throw notFound();
  return parsed.data;
}

function readPart(schema: z.ZodType | undefined, given: unknown): unknown {
  if (!schema) return undefined;
  const parsed = schema.safeParse(given, { reportInput: true });
  if (!parsed.success) throw invalid(faultsOf(parsed.error));
  return parsed.data;
}

/** The revision or assembly that the path names must be the team's, whatever is done with it. */
async function loadSubject(deps: Deps, actor: Actor, params: unknown): Promise<Revision | null> {
  if (typeof params !== 'object' || params === null) return null;
  if ('assemblyId' in params && typeof params.assemblyId === 'string') {
    if (!(await findAssembly(deps.database, actor.team.id, params.assemblyId))) throw notFound('This assembly');
  }
  if (!('revisionId' in params) || typeof params.revisionId !== 'string') return null;
  const revision = await findRevision(deps.database, actor.team.id, params.revisionId);
  if (!revision) throw notFound('This revision');
  return revision;
}

/** Roles only; state and authorship are looked at under lock, together with the change. */
function authorise(access: Endpoint['access'], actor: Actor): void {
  if (typeof access === 'string') return;
  const roles = 'team' in access ? teamRules[access.team] : revisionRules[access.revision].roles;
  if (!roles.some((role) => actor.member.roles.includes(role))) throw roleRefused();
}

async function readBody(endpoint: Endpoint, request: Request, response: Response) {
  if (request.method === 'GET' || request.method === 'HEAD') return { body: undefined, written: undefined };
  const written = await readJson(request, response);
  if (endpoint.body) return { body: readPart(endpoint.body, written), written };
  const empty =
    written === undefined ||
    (typeof written === 'object' && written !== null && !Array.isArray(written) && Object.keys(written).length === 0);
  if (!empty) throw invalid([{ path: '', message: 'must be empty: this request takes no body' }]);
  return { body: undefined, written: undefined };
}
