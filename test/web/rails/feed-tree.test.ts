import { expect, test } from 'vitest';
import { boardDocument } from '#core/board/document.ts';
import { railTable } from '#core/electrical/rail-table.ts';
import { feedNodes, feedTree } from '#web/rails/feed-tree.ts';
import { smallDocument } from '../../core/board/small-board.ts';

test('feedTree – two rails behind one, one beside it, one without a feed – columns by feed, no two on one place', () => {
  const [first] = smallDocument.regulators;
  const regulator = (ref: string, feed: { supply: string } | { regulator: string } | null) => ({
    ...first!,
    ref,
    dropper: null,
    feed,
    ...(feed ? {} : { powerW: 0.1 }),
  });
  const board = boardDocument.parse({
    ...smallDocument,
    regulators: [
      regulator('U2', { regulator: 'U1' }),
      regulator('U3', { regulator: 'U1' }),
      regulator('U1', { supply: 'VIN' }),
      regulator('U4', { supply: 'VIN' }),
      regulator('U5', null),
    ],
    supplies: [{ name: 'VIN', minV: 9, nominalV: 12, maxV: 15 }],
  });
  const nodes = feedNodes(feedTree(board, railTable(board, board.conditions[0]!)));
  expect(nodes.map(({ name, column, row }) => [name, column, row])).toEqual([
    ['VIN', 0, 0],
    ['U1', 1, 0],
    ['U2', 2, 0],
    ['U3', 2, 1],
    ['U4', 1, 2],
    ['U5', 0, 3],
  ]);
});
