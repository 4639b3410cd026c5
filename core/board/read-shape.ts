import type { Assumption } from '#core/result/result.ts';
import { findAssumptions } from './assumptions.ts';
import { boardDocument, type Board } from './document.ts';
import { type FieldFault, faultsOf } from './fault.ts';
import { hostileShape } from './hostile-shape.ts';
import { upgrade } from './upgrade.ts';

export type BoardReading = { ok: true; board: Board; assumptions: Assumption[] } | { ok: false; faults: FieldFault[] };

/**
 * Reads the shape of a board document of any version: upgrade, strict schema, defaults. References are not followed, so
 * that a half-drawn sketch can be kept; what is checked or issued goes through `readBoard`.
 */
export function readShape(value: unknown): BoardReading {
  if (value === null || typeof value !== 'object' || Array.isArray(value)) {
    return { ok: false, faults: [{ path: '', message: 'must be a board document (a JSON object)' }] };
  }
  const hostile = hostileShape(value);
  if (hostile) return { ok: false, faults: [hostile] };
  const upgraded = upgrade(value as Record<string, unknown>);
  if ('fault' in upgraded) return { ok: false, faults: [upgraded.fault] };
  const parsed = boardDocument.safeParse(upgraded.document, { reportInput: true });
  if (!parsed.success) return { ok: false, faults: faultsOf(parsed.error) };
  return { ok: true, board: parsed.data, assumptions: findAssumptions(upgraded.document, parsed.data) };
}
