import { z } from 'zod';
import { boardDocument } from './document.ts';

/** JSON Schema (draft 2020-12) of the board document as it may be written, with ranges and units. */
export function boardJsonSchema(): Record<string, unknown> {
  return { ...z.toJSONSchema(boardDocument, { io: 'input', target: 'draft-2020-12', unrepresentable: 'any' }) };
}
