import type { Board, BoardDocument } from '#core/board/document.ts';
import { hashBoard } from '#core/board/hash-board.ts';
import { readBoard } from '#core/board/read-board.ts';
import type { Assumption } from '#core/result/result.ts';
import { invalid } from '../http/refusal.ts';

export type WrittenBoard = {
  /** As it was written, without defaults; this is what is stored. */
  document: BoardDocument;
  board: Board;
  assumptions: readonly Assumption[];
  /** Content hash, the same for every order of keys. */
  hash: string;
};

/** Reads a board as it came in. @throws Refusal 422 with every fault */
export function readWrittenBoard(written: unknown): WrittenBoard {
  const reading = readBoard(written);
  if (!reading.ok) throw invalid(reading.faults);
  const { board, assumptions } = reading;
  return { document: written as BoardDocument, board, assumptions, hash: hashBoard(board, assumptions) };
}
