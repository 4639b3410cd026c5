import { describe, expect, test } from 'vitest';
import { crossCheck } from '#core/board/cross-check.ts';
import { boardDocument } from '#core/board/document.ts';
import { pasteObjects } from '#core/board/edits/paste-objects.ts';
import { clippingOf, readClipping } from '#core/board/object-clipping.ts';
import { objectKeys } from '#core/board/object-key.ts';
import { smallDocument } from '../small-board.ts';

const board = boardDocument.parse(smallDocument);
const all = clippingOf(board, objectKeys(board));

describe('copy', () => {
  test('as text and back – the same clipping', () => {
    expect(readClipping(JSON.stringify(all))).toEqual(all);
  });

  test('a pour alone – no parts and packages travel with it', () => {
    const clipping = clippingOf(board, ['pour:p1']);
    expect([clipping.pours.length, clipping.parts, clipping.packages]).toEqual([1, {}, {}]);
  });

  test.each(['', 'U1', '{"format":"dropwatt-objects","version":2}', '{"format":"dropwatt-board","version":1}'])(
    'other text – %s – nothing is read',
    (text) => expect(readClipping(text)).toBeNull(),
  );
});

describe('paste', () => {
  test('on the same board – new names, moved together, no fault in the document', () => {
    const pasted = pasteObjects(board, all, [3, -2]);
    expect(crossCheck(pasted.board)).toEqual([]);
    expect(new Set(objectKeys(pasted.board)).size).toBe(objectKeys(pasted.board).length);
    const [x, y] = board.regulators[0]?.at ?? [NaN, NaN];
    expect(pasted.board.regulators[1]).toMatchObject({ ref: 'U2', at: [x + 3, y - 2] });
    expect(pasted.board.parts).toEqual(board.parts);
  });

  test('on a board without its part – part and package come along under their names', () => {
    const bare = { ...board, regulators: [], sources: [], conditions: [], parts: {}, packages: {} };
    const pasted = pasteObjects(bare, all, [0, 0]);
    expect(crossCheck(pasted.board)).toEqual([]);
    expect(Object.keys(pasted.board.parts)).toEqual(Object.keys(board.parts));
    expect(pasted.board.regulators[0]?.ref).toBe('U1');
  });

  test('on a board whose part of that name is another – both are kept, the copy uses its own', () => {
    const five = board.parts['five'];
    if (!five) throw new Error('the small board has the part five');
    const other = { ...board, parts: { ...board.parts, five: { ...five, outputV: 3.3 } } };
    const pasted = pasteObjects(other, all, [0, 0]).board;
    const copy = pasted.regulators.at(-1);
    expect(pasted.parts[copy?.part ?? '']?.outputV).toBe(five.outputV);
    expect(pasted.parts['five']?.outputV).toBe(3.3);
  });

  test('a feed and a layer that the board lacks – left open, moved to the first layer, both said', () => {
    const clipping = {
      ...all,
      pours: all.pours.slice(0, 1).map((pour) => ({ ...pour, layer: 'L9' })),
      regulators: all.regulators.map((regulator) => ({ ...regulator, feed: { supply: 'NOWHERE' } })),
    };
    const pasted = pasteObjects(board, clipping, [0, 0]);
    expect(pasted.board.regulators.at(-1)?.feed).toBeNull();
    expect(pasted.board.pours.at(-1)?.layer).toBe('L1');
    expect(pasted.dropped.sort()).toEqual(['layer L9 of pour p3, now on L1', 'the feed of U2']);
  });
});
