import { raw, type Request, type Response } from 'express';
import secureJson from 'secure-json-parse';
import { pathText } from '#core/board/fault.ts';
import { invalid, Refusal } from './refusal.ts';

const readBytes = raw({ type: () => true, limit: '5mb' });
/** The deepest document of the contract has about ten levels. */
const deepest = 40;

/**
 * Reads the body of a request as JSON: UTF-8, at most 5 MB and 40 levels, without keys that reach prototypes.
 * @returns undefined where there is no body
 * @throws Refusal 400, 413, 415, or 422 where a text holds NUL or a broken surrogate
 */
export async function readJson(request: Request, response: Response): Promise<unknown> {
  await new Promise<void>((resolve, reject) => {
    readBytes(request, response, (error?: unknown) => {
      if (error === undefined || error === null) resolve();
      else reject(error instanceof Error ? error : new Error('the body could not be read'));
    });
  });
  const bytes: unknown = request.body;
  if (!Buffer.isBuffer(bytes) || bytes.length === 0) return undefined;
  if (!/^application\/json\s*(;|$)/i.test(request.get('content-type') ?? ''))
    throw new Refusal(415, 'media-type', 'Wrong kind of body', 'A body must be sent as application/json.');
  const value = parse(bytes);
  const broken = unstorableTexts(value, []);
  if (broken.length > 0)
    throw invalid(broken.map((path) => ({ path, message: 'must not hold NUL or broken characters' })));
  return value;
}

function parse(bytes: Buffer): unknown {
  try {
    const text = new TextDecoder('utf-8', { fatal: true }).decode(bytes);
    if (depthOf(text) > deepest) throw new SyntaxError('too deep');
    return secureJson.parse(text);
  } catch {
    throw new Refusal(400, 'invalid-json', 'Not JSON', `The body is not JSON in UTF-8 of at most ${deepest} levels.`);
  }
}

/** Nesting of a JSON text, counted before any recursive reader touches it. */
function depthOf(text: string): number {
  let depth = 0;
  let most = 0;
  let inString = false;
  for (let index = 0; index < text.length; index++) {
    const code = text.charCodeAt(index);
    if (inString) {
      if (code === 0x5c) index++;
      else if (code === 0x22) inString = false;
    } else if (code === 0x22) inString = true;
    else if (code === 0x5b || code === 0x7b) most = Math.max(most, ++depth);
    else if (code === 0x5d || code === 0x7d) depth--;
  }
  return most;
}

/** PostgreSQL stores neither: NUL is an error, a lone surrogate would be changed silently. */
function unstorableTexts(value: unknown, path: PropertyKey[]): string[] {
  if (typeof value === 'string') return storable(value) ? [] : [pathText(path)];
  if (Array.isArray(value)) return value.flatMap((item, index) => unstorableTexts(item, [...path, index]));
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, item]) =>
    storable(key) ? unstorableTexts(item, [...path, key]) : [pathText(path)],
  );
}

const storable = (text: string) => text.isWellFormed() && !text.includes('\0');
