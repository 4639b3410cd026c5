import { expect, test } from 'vitest';
import { addCopperLayer } from '#core/board/edits/add-copper-layer.ts';
import { changeCopperLayer } from '#core/board/edits/change-copper-layer.ts';
import { changePour } from '#core/board/edits/change-pour.ts';
import { deleteObjects } from '#core/board/edits/delete-objects.ts';
import { duplicateObjects } from '#core/board/edits/duplicate-objects.ts';
import { insertCorner } from '#core/board/edits/insert-corner.ts';
import { moveObjects } from '#core/board/edits/move-objects.ts';
import { removeCopperLayer } from '#core/board/edits/remove-copper-layer.ts';
import { removeCorner } from '#core/board/edits/remove-corner.ts';
import { renameObject } from '#core/board/edits/rename-object.ts';
import { rotateObjects } from '#core/board/edits/rotate-objects.ts';
import { scaleRing } from '#core/board/edits/scale-ring.ts';
import { boardDocument } from '#core/board/document.ts';
import { smallBoard as board } from '../small-board.ts';

const frozen = JSON.stringify(board);

/** Every edit gives a document that the schema accepts, and leaves the board it was given as it was. */
function accepted<T>(edited: T): T {
  expect(boardDocument.safeParse(edited).success).toBe(true);
  expect(JSON.stringify(board)).toBe(frozen);
  return edited;
}

test('move – by tenths – no binary dust; what is not moved is shared, not copied', () => {
  const moved = accepted(moveObjects(moveObjects(board, ['regulator:U1'], [0.1, 0]), ['regulator:U1'], [0.2, 0]));
  expect(moved.regulators[0]?.at).toEqual([10.3, 10]);
  expect(moved.pours).toBe(board.pours);
  expect(moved.outline).toBe(board.outline);
});

test('move – by nothing, or of nothing – the very same board', () => {
  expect(moveObjects(board, ['regulator:U1'], [0, 0])).toBe(board);
  expect(moveObjects(board, [], [1, 1])).toBe(board);
});

test('rotate – one regulator four times by 90° – back where it was; its place never moves', () => {
  let turned = board;
  for (const angle of [90, 180, -90, 0]) {
    turned = accepted(rotateObjects(turned, ['regulator:U1'], 90));
    expect(turned.regulators[0]?.rotationDeg).toBe(angle);
    expect(turned.regulators[0]?.at).toEqual([10, 10]);
  }
});

test('rotate – a pour by 90° about its middle – corners to the nanometre', () => {
  // p2 spans 20…38 × 2…12 mm, middle (29, 7); turned, it spans 24…34 × −2…16 mm.
  const points = accepted(rotateObjects(board, ['pour:p2'], 90)).pours[1]?.points ?? [];
  expect(points).toEqual([
    [34, -2],
    [34, 16],
    [24, 16],
    [24, -2],
  ]);
});

test('delete – a regulator and the heat source that its dropper is – feeds, loads and droppers do not name what is gone', () => {
  const two = duplicateObjects(board, ['regulator:U1'], [12, 0]).board;
  const fed = {
    ...two,
    regulators: two.regulators.map((item) => (item.ref === 'U2' ? { ...item, feed: { regulator: 'U1' } } : item)),
  };
  const left = accepted(deleteObjects(fed, ['regulator:U1', 'source:R1']));
  expect(left.regulators.map(({ ref, feed, dropper }) => ({ ref, feed, dropper }))).toEqual([
    { ref: 'U2', feed: null, dropper: { resistanceOhm: 10 } },
  ]);
  expect(left.conditions[0]?.loadsA).toEqual({ U2: 0.1 });
  expect(left.sources).toEqual([]);
});

test('delete – the outline – cannot go', () => {
  expect(accepted(deleteObjects(board, ['outline:'])).outline.points).toEqual(board.outline.points);
});

test('duplicate – regulator and pour – free names, the same loads, moved', () => {
  const { board: next, keys } = duplicateObjects(board, ['regulator:U1', 'pour:p1'], [2, -2]);
  accepted(next);
  expect(keys).toEqual(['regulator:U2', 'pour:p3']);
  expect(next.regulators[1]).toMatchObject({ ref: 'U2', at: [12, 8] });
  expect(next.conditions.map(({ loadsA }) => loadsA)).toEqual([
    { U1: 0.1, U2: 0.1 },
    { U1: 0.1, U2: 0.1 },
  ]);
  expect(next.pours[2]?.points[0]).toEqual([7, 3]);
});

test('rename – a heat source – its dropper follows; to a name in use – the very same board', () => {
  const renamed = accepted(renameObject(board, 'source:R1', 'R9'));
  expect(renamed.regulators[0]?.dropper).toEqual({ resistanceOhm: 10, source: 'R9' });
  expect(renameObject(board, 'source:R1', 'p1')).toBe(board);
});

test('copper layer – renamed – what lies on it follows', () => {
  const renamed = accepted(changeCopperLayer(board, 1, { name: 'BOT' }));
  expect(renamed.pours.map(({ layer }) => layer)).toEqual(['L1', 'BOT']);
});

test('copper layer – added below and removed again – the stack-up as before', () => {
  const added = accepted(addCopperLayer(board));
  expect(added.stackup.copper.map(({ name }) => name)).toEqual(['L1', 'L2', 'L3']);
  expect(added.stackup.dielectric).toHaveLength(2);
  expect(removeCopperLayer(added, 2).stackup).toEqual(board.stackup);
});

test('copper layer – the only one – cannot be removed', () => {
  const single = { ...board, stackup: { ...board.stackup, copper: board.stackup.copper.slice(0, 1), dielectric: [] } };
  expect(removeCopperLayer(single, 0)).toBe(single);
});

test('corners – added in the middle of an edge, removed down to three', () => {
  const five = accepted(insertCorner(board, 'pour:p1', 3));
  expect(five.pours[0]?.points[4]).toEqual([5, 10]);
  let fewer = five;
  for (let index = 0; index < 5; index++) fewer = accepted(removeCorner(fewer, 'pour:p1', 0));
  expect(fewer.pours[0]?.points).toHaveLength(3);
});

test('box of a pour with a hole – moved and stretched – the hole goes along', () => {
  const holed = changePour(board, 'p1', {
    holes: [
      [
        [6, 6],
        [8, 6],
        [8, 8],
      ],
    ],
  });
  const scaled = accepted(scaleRing(holed, 'pour:p1', { left: 0, right: 20, bottom: 5, top: 15 }));
  expect(scaled.pours[0]?.points).toEqual([
    [0, 5],
    [20, 5],
    [20, 15],
    [0, 15],
  ]);
  // x from 5…15 to 0…20: 6 → 2, 8 → 6; y stays.
  expect(scaled.pours[0]?.holes).toEqual([
    [
      [2, 6],
      [6, 6],
      [6, 8],
    ],
  ]);
});

test('change – of a pour that is not there – the very same board', () => {
  expect(changePour(board, 'p99', { net: 'X' })).toBe(board);
});
