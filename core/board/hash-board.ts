import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { canonicalJson } from './canonical.ts';
import type { Board } from './document.ts';

/** Content hash of a board with its defaults: the same content gives the same hash, in whatever order it was written. */
export function hashBoard(board: Board): string {
  return `sha256:${bytesToHex(sha256(utf8ToBytes(canonicalJson(board))))}`;
}
