import { z } from 'zod';
import { type Board, type BoardDocument, boardDocument } from './document.ts';

/**
 * The document to be stored for a board. A value that is no more than its default stays unwritten unless the same
 * object had it written before, so that the list of assumptions does not shrink by mere saving.
 * @param before the document as it was stored last
 */
export function asWritten(board: Board, before: BoardDocument): BoardDocument {
  return strip(boardDocument, board, before) as BoardDocument;
}

function strip(schema: unknown, value: unknown, before: unknown): unknown {
  if (schema instanceof z.ZodDefault || schema instanceof z.ZodNullable || schema instanceof z.ZodOptional) {
    return value === null || value === undefined ? value : strip(schema.unwrap(), value, before);
  }
  if (schema instanceof z.ZodUnion) {
    const option = schema.options.find((candidate) => z.safeParse(candidate, value).success);
    return strip(option, value, before);
  }
  if (schema instanceof z.ZodObject && isRecord(value)) {
    const known = isRecord(before) ? before : {};
    const entries = Object.entries(schema.shape).flatMap(([key, field]) => {
      if (value[key] === undefined || (known[key] === undefined && isDefault(field, value[key]))) return [];
      return [[key, strip(field, value[key], known[key])]];
    });
    return Object.fromEntries(entries);
  }
  if (schema instanceof z.ZodRecord && isRecord(value)) {
    const known = isRecord(before) ? before : {};
    return Object.fromEntries(
      Object.entries(value).map(([key, item]) => [key, strip(schema.valueType, item, known[key])]),
    );
  }
  if (schema instanceof z.ZodArray && Array.isArray(value)) {
    return value.map((item: unknown, index) => strip(schema.element, item, counterpart(item, index, before)));
  }
  return value;
}

function isDefault(schema: unknown, value: unknown): boolean {
  return schema instanceof z.ZodDefault && JSON.stringify(schema.def.defaultValue) === JSON.stringify(value);
}

/** The same object in another list: by its reference, id or name; by its place where it has none. */
function counterpart(item: unknown, index: number, list: unknown): unknown {
  if (!Array.isArray(list)) return undefined;
  const name = nameOf(item);
  return name === undefined ? list[index] : list.find((other) => nameOf(other) === name);
}

function nameOf(item: unknown): unknown {
  return isRecord(item) ? (item.ref ?? item.id ?? item.name) : undefined;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
