import { expect, test } from 'vitest';
import { boardDocument } from '#core/board/document.ts';
import { type Alignment, alignObjects } from '#core/board/edits/align-objects.ts';
import { distributeObjects } from '#core/board/edits/distribute-objects.ts';
import { smallDocument } from '../small-board.ts';

// Three sinks of 2 × 2, 4 × 6 and 2 × 4 mm; boxes x 2…4, 7…11, 28…30 and y 2…4, 7…13, 18…22.
const board = boardDocument.parse({
  ...smallDocument,
  sinks: [
    { id: 's1', at: [3, 3], sizeMm: [2, 2], layer: 'L2', conductanceWPerK: 0.2, toC: 'ambient' },
    { id: 's2', at: [9, 10], sizeMm: [4, 6], layer: 'L2', conductanceWPerK: 0.2, toC: 'ambient' },
    { id: 's3', at: [29, 20], sizeMm: [2, 4], layer: 'L2', conductanceWPerK: 0.2, toC: 'ambient' },
  ],
});
const keys = ['sink:s1', 'sink:s2', 'sink:s3'] as const;
const places = (changed: typeof board) => changed.sinks.map((sink) => sink.at);

/** Side, centres afterwards: worked by hand from the boxes above; the box around all is 2…30 × 2…22. */
const aligned: [Alignment, [number, number][]][] = [
  [
    'left',
    [
      [3, 3],
      [4, 10],
      [3, 20],
    ],
  ],
  [
    'centre',
    [
      [16, 3],
      [16, 10],
      [16, 20],
    ],
  ],
  [
    'right',
    [
      [29, 3],
      [28, 10],
      [29, 20],
    ],
  ],
  [
    'top',
    [
      [3, 21],
      [9, 19],
      [29, 20],
    ],
  ],
  [
    'middle',
    [
      [3, 12],
      [9, 12],
      [29, 12],
    ],
  ],
  [
    'bottom',
    [
      [3, 3],
      [9, 5],
      [29, 4],
    ],
  ],
];

test.each(aligned)('align – %s – the boxes share that line, the other coordinate stays', (to, expected) => {
  expect(places(alignObjects(board, keys, to))).toEqual(expected);
});

test('align – one object – the very same board', () => {
  expect(alignObjects(board, ['sink:s1'], 'left')).toBe(board);
});

test('distribute along x, named in any order – equal gaps of 10 mm, the outermost stay', () => {
  // Room 28 mm, boxes 8 mm, two gaps of 10 mm: the middle box begins at 4 + 10 = 14, its centre is 16.
  expect(places(distributeObjects(board, ['sink:s3', 'sink:s1', 'sink:s2'], 'x'))).toEqual([
    [3, 3],
    [16, 10],
    [29, 20],
  ]);
});

test('distribute along y – equal gaps of 4 mm', () => {
  // Room 20 mm, boxes 12 mm, two gaps of 4 mm: the middle box begins at 8, its centre is 11.
  expect(places(distributeObjects(board, keys, 'y'))).toEqual([
    [3, 3],
    [9, 11],
    [29, 20],
  ]);
});

test('distribute – two objects – the very same board', () => {
  expect(distributeObjects(board, ['sink:s1', 'sink:s2'], 'x')).toBe(board);
});
