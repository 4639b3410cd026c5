import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { canonicalJson } from '#core/board/canonical.ts';
import type { RecordInput } from './record-input.ts';

/**
 * SHA-256 over everything that the record says: board, result and the facts of the revision, as canonical JSON (RFC 8785).
 * Times of the solver are left out, so that a repeated calculation of the same content gives the same digest.
 */
export function recordDigest({ board, result, revision }: RecordInput): string {
  const conditions = result.conditions.map((condition) =>
    condition.solver ? { ...condition, solver: { ...condition.solver, milliseconds: 0 } } : condition,
  );
  const content = canonicalJson({ board, result: { ...result, conditions }, revision });
  return `sha256:${bytesToHex(sha256(utf8ToBytes(content)))}`;
}
