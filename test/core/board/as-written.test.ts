import { expect, test } from 'vitest';
import { asWritten } from '#core/board/as-written.ts';
import { type BoardDocument, boardDocument } from '#core/board/document.ts';

const written: BoardDocument = {
  format: 'dropwatt-board',
  version: 1,
  title: 'Half stated',
  outline: {
    points: [
      [0, 0],
      [40, 0],
      [40, 30],
    ],
  },
  stackup: { copper: [{ name: 'L1', thicknessUm: 35 }], dielectric: [], emissivityTop: 0.9, maxOperatingC: 130 },
  pours: [
    {
      id: 'p1',
      layer: 'L1',
      net: 'GND',
      points: [
        [1, 1],
        [9, 1],
        [9, 9],
      ],
    },
    {
      id: 'p2',
      layer: 'L1',
      net: 'GND',
      points: [
        [11, 1],
        [19, 1],
        [19, 9],
      ],
      coverage: 1,
    },
  ],
  viaFields: [],
  packages: {},
  parts: {},
  regulators: [],
  conditions: [{ name: 'Fan', ambientC: 40, orientation: 'vertical', air: { kind: 'moving', speedMPerS: 2 } }],
  criteria: { name: 'None', rules: [] },
};

test('as written – a board that was only read – the very document that it came from', () => {
  expect(asWritten(boardDocument.parse(written), written)).toEqual(written);
});

test('as written – an object taken out and one put in – the others keep what was stated of them, the new one states no default', () => {
  const board = boardDocument.parse(written);
  const fresh = { ...board.pours[0]!, id: 'p3', coverage: 1, emissivity: 0.4 };
  const stored = asWritten({ ...board, pours: [board.pours[1]!, fresh] }, written);
  expect(stored.pours).toEqual([
    written.pours[1],
    {
      id: 'p3',
      layer: 'L1',
      net: 'GND',
      points: [
        [1, 1],
        [9, 1],
        [9, 9],
      ],
      emissivity: 0.4,
    },
  ]);
});

test('as written – a default changed and changed back – what is stated once stays stated', () => {
  const board = boardDocument.parse(written);
  const changed = asWritten({ ...board, stackup: { ...board.stackup, emissivityBottom: 0.5 } }, written);
  expect(changed.stackup.emissivityBottom).toBe(0.5);
  expect(asWritten(board, changed).stackup.emissivityBottom).toBe(0.9);
});
