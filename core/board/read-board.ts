import { crossCheck } from './cross-check.ts';
import { type BoardReading, readShape } from './read-shape.ts';

export type { BoardReading };

/**
 * Reads a board document of any version: upgrade, strict shape, references. All faults at once, each with its path and
 * what is allowed; nothing is repaired silently.
 */
export function readBoard(value: unknown): BoardReading {
  const reading = readShape(value);
  if (!reading.ok) return reading;
  const faults = crossCheck(reading.board);
  return faults.length > 0 ? { ok: false, faults } : reading;
}
