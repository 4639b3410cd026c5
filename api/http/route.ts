import type { z } from 'zod';
import type { Endpoint } from '#core/contract/endpoint.ts';
import type { endpoints, EndpointName } from '#core/contract/endpoints.ts';
import type { Database } from '#db/database.ts';
import type { Revision } from '#db/revisions.ts';
import type { Actor } from '../session/actor.ts';
import type { Deps } from '../deps.ts';

type Definition<N extends EndpointName> = (typeof endpoints)[N];
type Parsed<E, K extends string> = E extends Record<K, infer S extends z.ZodType> ? z.output<S> : undefined;

/** What a route is given once session, schemas and rights have been seen to. */
export type RouteInput<N extends EndpointName> = {
  deps: Deps;
  /** The pool; an open transaction for an endpoint that takes an Idempotency-Key. */
  database: Database;
  actor: Definition<N>['access'] extends 'public' ? undefined : Actor;
  /** Who sent a request that anybody may send; the database is asked only when the route wants to know. */
  whoAsks: () => Promise<Actor | null>;
  params: Parsed<Definition<N>, 'params'>;
  query: Parsed<Definition<N>, 'query'>;
  body: Parsed<Definition<N>, 'body'>;
  /** The body before its defaults were filled in. */
  written: unknown;
  /** Version in If-Match. */
  overVersion: Definition<N> extends { ifMatch: true } ? number : undefined;
  /** The revision of the path, in the actor's team, as it was when the request arrived. */
  revision: 'revisionId' extends keyof NonNullable<Parsed<Definition<N>, 'params'>> ? Revision : undefined;
  /** Address of the caller. */
  address: string;
};

type AnswerOf<A> = A extends z.ZodType
  ? { body: z.input<A> }
  : A extends 'pdf'
    ? { pdf: Buffer; fileName: string }
    : A extends 'json'
      ? { body: unknown }
      : unknown;

export type RouteAnswer<N extends EndpointName> = AnswerOf<Definition<N>['answer']> & {
  /** Of revision and sketch; becomes the ETag. */
  version?: number;
  /** Other status than the endpoint's. */
  status?: number;
  /** Session to open (null: to forget) in the caller's browser. */
  session?: { token: string; expiresAt: Date } | null;
};

/** One entry of the endpoint table, made to work. */
export type Route<N extends EndpointName> = (input: RouteInput<N>) => Promise<RouteAnswer<N>>;
export type Routes<N extends EndpointName = EndpointName> = { [Name in N]: Route<Name> };

/** The same without its types, as the adapter sees every route. */
export type AnyRoute = (input: Record<keyof RouteInput<EndpointName>, unknown>) => Promise<{
  body?: unknown;
  pdf?: Buffer;
  fileName?: string;
  version?: number;
  status?: number;
  session?: { token: string; expiresAt: Date } | null;
}>;
export type AnyEndpoint = Endpoint;
