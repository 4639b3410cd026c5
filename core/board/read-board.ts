import type { Assumption } from '#core/result/result.ts';
import { findAssumptions } from './assumptions.ts';
import { crossCheck } from './cross-check.ts';
import { isNestedWithin } from './depth.ts';
import { boardDocument, type Board } from './document.ts';
import { type FieldFault, faultsOf } from './fault.ts';
import { upgrade } from './upgrade.ts';

/** The deepest valid document nests 8 levels. */
const deepest = 32;

export type BoardReading = { ok: true; board: Board; assumptions: Assumption[] } | { ok: false; faults: FieldFault[] };

/**
 * Reads a board document of any version: upgrade, strict shape, references. All faults at once, each with its path and
 * what is allowed; nothing is repaired silently.
 */
export function readBoard(value: unknown): BoardReading {
  if (value === null || typeof value !== 'object' || Array.isArray(value)) {
    return { ok: false, faults: [{ path: '', message: 'must be a board document (a JSON object)' }] };
  }
  if (!isNestedWithin(value, deepest)) {
    return { ok: false, faults: [{ path: '', message: `must not nest deeper than ${deepest} levels` }] };
  }
  const upgraded = upgrade(value as Record<string, unknown>);
  if ('fault' in upgraded) return { ok: false, faults: [upgraded.fault] };
  const parsed = boardDocument.safeParse(upgraded.document, { reportInput: true });
  if (!parsed.success) return { ok: false, faults: faultsOf(parsed.error) };
  const faults = crossCheck(parsed.data);
  if (faults.length > 0) return { ok: false, faults };
  return { ok: true, board: parsed.data, assumptions: findAssumptions(upgraded.document, parsed.data) };
}
