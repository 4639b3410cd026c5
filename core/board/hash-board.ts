import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import type { Assumption } from '#core/result/result.ts';
import { canonicalJson } from './canonical.ts';
import type { Board } from './document.ts';

/**
 * Content hash of a board: the same content gives the same hash, in whatever order it was written. What was assumed
 * counts as content, as a result lists it.
 */
export function hashBoard(board: Board, assumptions: readonly Assumption[]): string {
  const listed = [...assumptions].sort((a, b) => (a.path < b.path ? -1 : 1));
  return `sha256:${bytesToHex(sha256(utf8ToBytes(canonicalJson({ assumptions: listed, board }))))}`;
}
