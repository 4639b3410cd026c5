import type { z } from 'zod';
import type { RevisionAction, TeamAction } from '#core/review/permissions.ts';

/** Where a refusal is decided: nobody asked, any member, a team right, or a right on one revision. */
export type Access = 'public' | 'member' | { team: TeamAction } | { revision: RevisionAction };

export type Endpoint = {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** Below /api/v1, parameters in braces. */
  path: string;
  summary: string;
  access: Access;
  params?: z.ZodType;
  query?: z.ZodType;
  body?: z.ZodType;
  status: 200 | 201 | 202 | 204;
  /** Schema of the answer; null: none; 'pdf', 'json': not a document of this contract. */
  answer: z.ZodType | null | 'pdf' | 'json';
  /** Must carry If-Match with the revision's version. */
  ifMatch?: true;
  /** May carry Idempotency-Key: the same key and body get the same answer. */
  idempotent?: true;
};

/** Keeps the literal types of an endpoint, so that routes and client are typed by it. */
export function endpoint<const E extends Endpoint>(definition: E): E {
  return definition;
}
