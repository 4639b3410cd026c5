import type { z } from 'zod';
import type { Endpoint } from '#core/contract/endpoint.ts';
import { endpoints, type EndpointName } from '#core/contract/endpoints.ts';
import { problem } from '#core/contract/problem.ts';
import { offlineProblem, ProblemError, unreadableAnswer } from './problem-error.ts';

type Definition<N extends EndpointName> = (typeof endpoints)[N];
type PartOf<E, K extends string> = E extends Record<K, infer S extends z.ZodType> ? z.input<S> : never;
type Given<E, K extends string> = [PartOf<E, K>] extends [never]
  ? unknown
  : object extends PartOf<E, K>
    ? { [key in K]?: PartOf<E, K> }
    : { [key in K]: PartOf<E, K> };

/** What a call needs: `params`, `query` and `body` as the endpoint states them, the version for `If-Match`, a key. */
export type CallInput<N extends EndpointName> = Given<Definition<N>, 'params'> &
  Given<Definition<N>, 'query'> &
  Given<Definition<N>, 'body'> &
  (Definition<N> extends { ifMatch: true } ? { ifMatch: number } : unknown) &
  (Definition<N> extends { idempotent: true } ? { idempotencyKey?: string } : unknown) & { signal?: AbortSignal };

type AnswerOf<A> = A extends z.ZodType ? z.output<A> : A extends 'pdf' ? Blob : A extends 'json' ? unknown : undefined;
/** Parsed answer, with the defaults of its schema filled in. */
export type CallAnswer<N extends EndpointName> = AnswerOf<Definition<N>['answer']>;
type WrittenOf<A> = A extends z.ZodType ? z.input<A> : never;
/** The answer as the server wrote it, checked, without defaults. */
export type WrittenAnswer<N extends EndpointName> = WrittenOf<Definition<N>['answer']>;

type Arguments<N extends EndpointName> = object extends CallInput<N> ? [input?: CallInput<N>] : [input: CallInput<N>];
type LooseInput = {
  params?: Record<string, unknown>;
  query?: Record<string, unknown>;
  body?: unknown;
  ifMatch?: number;
  idempotencyKey?: string;
  signal?: AbortSignal;
};

/**
 * Calls the server and reads its answer by the endpoint's schema.
 * @throws ProblemError with the server's problem document; code 'offline' when it cannot be reached
 */
export async function call<N extends EndpointName>(name: N, ...[input]: Arguments<N>): Promise<CallAnswer<N>> {
  return (await exchange(name, input)).answer as CallAnswer<N>;
}

/** As `call`, but gives the checked answer as it was written: a default that was left out stays left out. */
export async function callWritten<N extends EndpointName>(
  name: N,
  ...[input]: Arguments<N>
): Promise<{ answer: CallAnswer<N>; written: WrittenAnswer<N> }> {
  const { answer, written } = await exchange(name, input);
  return { answer: answer as CallAnswer<N>, written: written as WrittenAnswer<N> };
}

async function exchange(name: EndpointName, input: LooseInput = {}): Promise<{ answer: unknown; written: unknown }> {
  const definition: Endpoint = endpoints[name];
  const response = await send(definition, input);
  if (!response.ok) throw new ProblemError(await problemOf(response));
  if (definition.answer === null) return { answer: undefined, written: undefined };
  if (definition.answer === 'pdf') {
    const blob = await response.blob();
    return { answer: blob, written: blob };
  }
  const written: unknown = await response.json().catch(() => undefined);
  if (definition.answer === 'json') return { answer: written, written };
  const parsed = definition.answer.safeParse(written);
  if (!parsed.success) throw new ProblemError(unreadableAnswer(response.status));
  return { answer: parsed.data, written };
}

async function send(definition: Endpoint, input: LooseInput): Promise<Response> {
  const headers = new Headers({ accept: definition.answer === 'pdf' ? 'application/pdf' : 'application/json' });
  if (input.body !== undefined) headers.set('content-type', 'application/json');
  if (input.ifMatch !== undefined) headers.set('if-match', `"${input.ifMatch}"`);
  if (input.idempotencyKey) headers.set('idempotency-key', input.idempotencyKey);
  try {
    return await fetch(addressOf(definition.path, input.params, input.query), {
      method: definition.method.toUpperCase(),
      headers,
      body: input.body === undefined ? null : JSON.stringify(input.body),
      credentials: 'same-origin',
      signal: input.signal ?? null,
    });
  } catch (error) {
    if (input.signal?.aborted) throw error;
    throw new ProblemError(offlineProblem);
  }
}

/** `/api/v1` + path with its parameters filled in and the query behind. */
export function addressOf(
  path: string,
  params: Record<string, unknown> = {},
  query: Record<string, unknown> = {},
): string {
  const filled = path.replace(/\{(\w+)\}/g, (_, key: string) => encodeURIComponent(String(params[key])));
  const search = new URLSearchParams();
  for (const [key, value] of Object.entries(query)) {
    if (typeof value === 'number' || (typeof value === 'string' && value !== '')) search.set(key, String(value));
  }
  const text = search.toString();
  return `/api/v1${filled}${text ? `?${text}` : ''}`;
}

async function problemOf(response: Response) {
  const body: unknown = await response.json().catch(() => undefined);
  const parsed = problem.safeParse(body);
  return parsed.success ? parsed.data : unreadableAnswer(response.status);
}
