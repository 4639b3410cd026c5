import fc from 'fast-check';
import { expect, test } from 'vitest';
import { crossCheck } from '#core/board/cross-check.ts';
import { type Board, boardDocument } from '#core/board/document.ts';
import { addCondition } from '#core/board/edits/add-condition.ts';
import { addCopperLayer } from '#core/board/edits/add-copper-layer.ts';
import { addCutout } from '#core/board/edits/add-cutout.ts';
import { addPour } from '#core/board/edits/add-pour.ts';
import { addProbe } from '#core/board/edits/add-probe.ts';
import { addRegulator } from '#core/board/edits/add-regulator.ts';
import { addSink } from '#core/board/edits/add-sink.ts';
import { addSource } from '#core/board/edits/add-source.ts';
import { addSupply } from '#core/board/edits/add-supply.ts';
import { addViaField } from '#core/board/edits/add-via-field.ts';
import { changeCondition } from '#core/board/edits/change-condition.ts';
import { changeCopperLayer } from '#core/board/edits/change-copper-layer.ts';
import { changeRegulator } from '#core/board/edits/change-regulator.ts';
import { changeSupply } from '#core/board/edits/change-supply.ts';
import { deleteObjects } from '#core/board/edits/delete-objects.ts';
import { duplicateCondition } from '#core/board/edits/duplicate-condition.ts';
import { duplicateObjects } from '#core/board/edits/duplicate-objects.ts';
import { moveObjects } from '#core/board/edits/move-objects.ts';
import { removeCondition } from '#core/board/edits/remove-condition.ts';
import { removeCopperLayer } from '#core/board/edits/remove-copper-layer.ts';
import { removeSupply } from '#core/board/edits/remove-supply.ts';
import { renameObject } from '#core/board/edits/rename-object.ts';
import { rotateObjects } from '#core/board/edits/rotate-objects.ts';
import { freeId } from '#core/board/free-id.ts';
import { objectKeys } from '#core/board/object-key.ts';
import { smallBoard } from '../small-board.ts';

type Edit = { name: string; apply: (board: Board) => Board };

/** A number from 0 to below `count`, from one that is anything. */
const pick = <T>(list: readonly T[], number: number): T | undefined => list[number % Math.max(1, list.length)];

/** An edit as a user might do it, with its names taken from the board it meets. */
const edit: fc.Arbitrary<Edit> = fc
  .record({ kind: fc.nat(22), a: fc.nat(999), b: fc.nat(999), dx: fc.integer({ min: -9, max: 9 }) })
  .map(({ kind, a, b, dx }): Edit => {
    const object = (board: Board) => pick(objectKeys(board), a)!;
    const layer = (board: Board, n = a) => pick(board.stackup.copper, n)!.name;
    const condition = (board: Board) => pick(board.conditions, a)?.name ?? 'none';
    const supply = (board: Board) => pick(board.supplies, a)?.name ?? 'none';
    const free = (prefix: string, board: Board) =>
      freeId(
        prefix,
        objectKeys(board).map((key) => key.slice(key.indexOf(':') + 1)),
      );
    const edits: [string, (board: Board) => Board][] = [
      ['delete', (board) => deleteObjects(board, [object(board), pick(objectKeys(board), b)!])],
      ['duplicate', (board) => duplicateObjects(board, [object(board)], [dx, 0]).board],
      ['move', (board) => moveObjects(board, [object(board)], [0, 0.1 * dx])],
      ['rotate', (board) => rotateObjects(board, [object(board)], 90)],
      ['rename', (board) => renameObject(board, object(board), `N${b}`)],
      ['add layer', (board) => addCopperLayer(board, a % board.stackup.copper.length)],
      ['remove layer', (board) => removeCopperLayer(board, a % board.stackup.copper.length)],
      ['rename layer', (board) => changeCopperLayer(board, a % board.stackup.copper.length, { name: `M${b % 4}` })],
      ['add supply', (board) => addSupply(board, { name: `V${b % 4}`, minV: 4, nominalV: 5, maxV: 6 })],
      ['rename supply', (board) => changeSupply(board, supply(board), { name: `W${b % 4}` })],
      ['remove supply', (board) => removeSupply(board, supply(board))],
      ['copy condition', (board) => duplicateCondition(board, condition(board), `C${b % 4}`)],
      ['rename condition', (board) => changeCondition(board, condition(board), { name: `D${b % 4}` })],
      ['remove condition', (board) => removeCondition(board, condition(board))],
      [
        'add condition',
        (board) => addCondition(board, { ...smallBoard.conditions[0]!, name: `E${b % 4}`, loadsA: {} }),
      ],
      [
        'state a voltage',
        (board) => changeCondition(board, condition(board), { supplies: pair(supply(board), 5, board) }),
      ],
      ['feed from a supply', (board) => feed(board, a, board.supplies[0] ? { supply: supply(board) } : null)],
      ['feed from another', (board) => chained(board, a, b)],
      ['short', (board) => shorted(board, condition(board), a)],
      ['add via field', (board) => addViaField(board, viaField(free('v', board), layer(board, 0), board))],
      ['add sink', (board) => addSink(board, { ...sink, id: free('s', board), layer: layer(board) })],
      ['add source', (board) => addSource(board, { ...smallBoard.sources[0]!, ref: free('R', board) })],
      [
        'add the rest',
        (board) => {
          const once = addProbe(board, { id: free('t', board), at: [3, 3], side: 'top' });
          const twice = addPour(once, { ...smallBoard.pours[0]!, id: free('p', once), layer: layer(board) });
          const part = { ...smallBoard.regulators[0]!, ref: free('U', twice), feed: null, dropper: null };
          return board.outline.cutouts.length > 2 ? twice : addCutout(addRegulator(twice, part), cutout);
        },
      ],
    ];
    const [name, apply] = edits[kind]!;
    return { name, apply };
  });

const sink = { at: [3, 3] as [number, number], sizeMm: [2, 2] as [number, number], conductanceWPerK: 0.1, toC: 25 };
const cutout: [number, number][] = [
  [1, 1],
  [2, 1],
  [2, 2],
];
const pair = (name: string, volts: number, board: Board): Record<string, number> =>
  board.supplies.length > 0 ? { [name]: volts } : {};
const feed = (board: Board, n: number, to: Board['regulators'][number]['feed']) =>
  changeRegulator(board, pick(board.regulators, n)?.ref ?? 'none', { feed: to });
/** Feeds only from a regulator further up the list, so that the edit itself makes no circle. */
const chained = (board: Board, a: number, b: number) => {
  const [low, high] = [a, b].map((n) => n % Math.max(1, board.regulators.length)).sort((x, y) => x - y);
  const [from, to] = [board.regulators[low!], board.regulators[high!]];
  return from && to && from !== to ? changeRegulator(board, to.ref, { feed: { regulator: from.ref } }) : board;
};
const shorted = (board: Board, condition: string, n: number) => {
  const ref = pick(board.regulators, n)?.ref;
  return ref ? changeCondition(board, condition, { fault: { kind: 'output-short', ref } }) : board;
};
const viaField = (id: string, from: string, board: Board) => ({
  id,
  net: 'GND',
  at: [10, 10] as [number, number],
  columns: 2,
  rows: 2,
  pitchMm: 1,
  rotationDeg: 0,
  drillMm: 0.3,
  platingUm: 25,
  filling: 'open' as const,
  from,
  to: board.stackup.copper.at(-1)!.name,
});

test('edits – any thirty in a row – every board is a valid document, and no older board has changed', () => {
  fc.assert(
    fc.property(fc.array(edit, { maxLength: 30 }), (edits) => {
      let board = smallBoard;
      const history: { board: Board; frozen: string }[] = [];
      for (const { name, apply } of edits) {
        history.push({ board, frozen: JSON.stringify(board) });
        board = apply(board);
        const shape = boardDocument.safeParse(board);
        expect(shape.success ? '' : shape.error.message, name).toBe('');
        // A moved cut-out may leave the board; that is for the user to see, not for the edit to prevent.
        const faults = crossCheck(board).filter(({ path }) => !path.startsWith('outline.cutouts'));
        // One copper layer has no way down, and a via field on it could not have been drawn.
        expect(board.stackup.copper.length > 1 ? faults : [], name).toEqual([]);
      }
      for (const { board: old, frozen } of history) expect(JSON.stringify(old)).toBe(frozen);
    }),
    { seed: 73129, numRuns: 150 },
  );
});

test('edits – of one object – every object that is not named keeps its identity, so that undo is a reference', () => {
  const board = addSource(duplicateObjects(smallBoard, ['regulator:U1'], [12, 0]).board, {
    ...smallBoard.sources[0]!,
    ref: 'Q2',
  });
  const without = deleteObjects(board, ['source:Q2']);
  expect(without.regulators).toBe(board.regulators);
  expect(without.conditions).toBe(board.conditions);
  expect(without.outline).toBe(board.outline);
  expect(without.sources[0]).toBe(board.sources[0]);
  const renamed = renameObject(board, 'regulator:U2', 'U7');
  expect(renamed.regulators[0]).toBe(board.regulators[0]);
  expect(renamed.pours).toBe(board.pours);
  const layer = changeCopperLayer(board, 1, { name: 'BOT' });
  expect(layer.pours[0]).toBe(board.pours[0]);
  expect(layer.sinks).toBe(board.sinks);
  expect(changeCondition(board, 'Hot', { ambientC: 61 }).conditions[1]).toBe(board.conditions[1]);
});
