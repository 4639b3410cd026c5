import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { hardBoard } from './hard-board.ts';
import { tightJunctions } from './solved-board.ts';

const board = hardBoard({ filmWPerM2K: 10 });
const [p1, p2, p3] = board.pours;
const [via] = board.viaFields;

/** The same geometry said in another way must be the same network, and so the same junctions. */
function expectSame(one: Board, other: Board) {
  const [a, b] = [one, other].map((given) =>
    tightJunctions(buildBoardModel(given, { cellMm: 0.5 }), { U1: 0.9, U2: 0.4, Q1: 0.2 }),
  );
  for (const [ref, rise] of a!) expect(Math.abs(b!.get(ref)! / rise - 1), ref).toBeLessThan(1e-9);
}

const half = (low: number, high: number) => ({
  ...p2!,
  id: `p2-${low}`,
  points: [
    [3, low],
    [15, low],
    [15, high],
    [3, high],
  ] as [number, number][],
});

test('a pour – in two halves that touch – is one pour', () => {
  expectSame(board, { ...board, pours: [p1!, half(3, 10), half(10, 17), p3!] });
});

test('a pour – in two parts that overlap – counts once', () => {
  expectSame(board, { ...board, pours: [p1!, half(3, 12), half(8, 17), p3!] });
});

test('a pour – drawn twice, once with less coverage – is the denser one', () => {
  expectSame(board, { ...board, pours: [p1!, p2!, { ...p2!, id: 'thin', coverage: 0.4 }, p3!] });
  expectSame(board, { ...board, pours: [{ ...p2!, id: 'thin', coverage: 0.4 }, p1!, p2!, p3!] });
});

test('pours – in any order – are the same board', () => {
  expectSame(board, { ...board, pours: [p3!, p2!, p1!] });
});

test('a ring – from another corner, the other way round, with a corner more on an edge – is the same ring', () => {
  const points = p2!.points;
  expectSame(board, { ...board, pours: [p1!, { ...p2!, points: [...points.slice(2), ...points.slice(0, 2)] }, p3!] });
  expectSame(board, { ...board, pours: [p1!, { ...p2!, points: points.toReversed() }, p3!] });
  const [first, second, ...rest] = points;
  const between: [number, number] = [(first![0] + second![0]) / 2, (first![1] + second![1]) / 2];
  expectSame(board, { ...board, pours: [p1!, { ...p2!, points: [first!, between, second!, ...rest] }, p3!] });
});

test('a via field – as fields of one via each – is the same field', () => {
  const single = [-1, 0, 1].flatMap((column) =>
    [-0.5, 0.5].map((row, k) => ({
      ...via!,
      id: `v${column}.${k}`,
      at: [via!.at[0] + column, via!.at[1] + row] as [number, number],
      columns: 1,
      rows: 1,
    })),
  );
  expectSame(board, { ...board, viaFields: single });
});

test('a via field turned by 90° – with columns and rows exchanged – is the same field', () => {
  const turned = { ...via!, rotationDeg: 90, columns: via!.rows, rows: via!.columns };
  expectSame(board, { ...board, viaFields: [turned] });
});

test('a source – as two halves with half its heat each – warms the parts alike', () => {
  const source = {
    ...board.sources[0]!,
    rotationDeg: 0,
    at: [16, 5] as [number, number],
    sizeMm: [2, 3] as [number, number],
    bodyMm: null,
  };
  const halves = [-0.5, 0.5].map((x, k) => ({
    ...source,
    ref: `Q${k}`,
    at: [16 + x, 5] as [number, number],
    sizeMm: [1, 3] as [number, number],
  }));
  const one = tightJunctions(buildBoardModel({ ...board, sources: [source] }, { cellMm: 0.5 }), { Q1: 0.2 });
  const two = tightJunctions(buildBoardModel({ ...board, sources: halves }, { cellMm: 0.5 }), { Q0: 0.1, Q1: 0.1 });
  for (const [ref, rise] of one) expect(Math.abs(two.get(ref)! / rise - 1)).toBeLessThan(1e-9);
});

test('a sink – as two halves with half its conductance each – draws the same', () => {
  const sink = { ...board.sinks[0]!, at: [28, 4] as [number, number], sizeMm: [4, 4] as [number, number] };
  const halves = [-1, 1].map((x, k) => ({
    ...sink,
    id: `s${k}`,
    at: [28 + x, 4] as [number, number],
    sizeMm: [2, 4] as [number, number],
    conductanceWPerK: sink.conductanceWPerK / 2,
  }));
  expectSame({ ...board, sinks: [sink] }, { ...board, sinks: halves });
});

test('a dielectric – as two of half the thickness around a bare layer without copper – conducts the same through, within its new node layer', () => {
  const [thin, thick] = board.stackup.dielectric;
  const split: Board = {
    ...board,
    stackup: {
      ...board.stackup,
      copper: [
        ...board.stackup.copper.slice(0, 2),
        { name: 'bare', thicknessUm: 1, plane: null, traces: null },
        board.stackup.copper[2]!,
      ],
      dielectric: [thin!, { ...thick!, thicknessMm: 0.6 }, { ...thick!, thicknessMm: 0.6 }],
    },
  };
  expectSame(board, split);
});
