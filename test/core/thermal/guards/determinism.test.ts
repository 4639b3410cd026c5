import { expect, test } from 'vitest';
import { boardDocument, type Board } from '#core/board/document.ts';
import { checkBoard } from '#core/check/check-board.ts';
import { hardBoard } from './hard-board.ts';

const board = (): Board => {
  const plain = hardBoard();
  const [condition] = plain.conditions;
  return {
    ...plain,
    regulators: plain.regulators.map((part) => ({ ...part, powerW: 0.4 })),
    conditions: [
      condition!,
      { ...condition!, name: 'wind', air: { kind: 'moving' as const, speedMPerS: 1, towardDeg: 20 } },
    ],
  };
};
const text = (given: Board) => {
  const { result, fields } = checkBoard(given, [], { cellMm: 1, gridError: true });
  return JSON.stringify([
    result,
    [...fields].map(([name, field]) => [name, field.layers.map((l) => [...l.temperatureC])]),
  ]);
};

test('one board twice – result and field – the same bytes', () => {
  const first = text(board());
  // Another board in between must leave nothing behind.
  checkBoard({ ...board(), regulators: [] }, [], { cellMm: 1.3 });
  expect(text(board())).toBe(first);
});

test('a board saved and read again, its fields in another order – result – the same bytes', () => {
  const backwards = (value: unknown): unknown => {
    if (Array.isArray(value)) return value.map(backwards);
    if (value === null || typeof value !== 'object') return value;
    return Object.fromEntries(
      Object.entries(value)
        .toReversed()
        .map(([key, inner]) => [key, backwards(inner)]),
    );
  };
  expect(text(boardDocument.parse(backwards(JSON.parse(JSON.stringify(board())))))).toBe(text(board()));
});
