import { type Board, type BoardDocument, boardDocument } from '#core/board/document.ts';

/** A 40 × 30 mm board of two layers: one regulator on a pour, one heat source, two conditions. */
export const smallDocument: BoardDocument = {
  format: 'dropwatt-board',
  version: 1,
  title: 'Small board',
  outline: {
    points: [
      [0, 0],
      [40, 0],
      [40, 30],
      [0, 30],
    ],
  },
  stackup: {
    copper: [
      { name: 'L1', thicknessUm: 35 },
      { name: 'L2', thicknessUm: 35 },
    ],
    dielectric: [{ thicknessMm: 1.5, inPlaneWPerMK: 0.9, throughWPerMK: 0.3 }],
    maxOperatingC: 130,
  },
  pours: [
    {
      id: 'p1',
      layer: 'L1',
      net: 'GND',
      points: [
        [5, 5],
        [15, 5],
        [15, 15],
        [5, 15],
      ],
    },
    {
      id: 'p2',
      layer: 'L2',
      net: 'GND',
      points: [
        [20, 2],
        [38, 2],
        [38, 12],
        [20, 12],
      ],
    },
  ],
  viaFields: [],
  packages: {
    box: {
      name: 'Box',
      bodyMm: [4, 4, 1],
      caseTopKPerW: 50,
      lands: [{ name: 'tab', kind: 'tab', pads: [{ at: [0, 0], sizeMm: [3, 3] }], kPerW: 3 }],
      source: 'made up for tests',
    },
  },
  parts: {
    five: {
      name: 'FIVE',
      package: 'box',
      passElement: 'pmos',
      outputV: 5,
      outputTolerancePct: 2,
      inputMaxV: 20,
      outputMaxA: 1,
      dropoutV: [[0, 0.5]],
      groundA: [[0, 0.001]],
      landNets: { tab: 'ground' },
      junctionMaxC: 150,
      source: 'made up for tests',
    },
  },
  regulators: [
    {
      ref: 'U1',
      part: 'five',
      at: [10, 10],
      nets: { ground: 'GND', input: 'VIN', output: '5V' },
      feed: { supply: 'VIN' },
      dropper: { resistanceOhm: 10, source: 'R1' },
    },
  ],
  sources: [{ ref: 'R1', at: [30, 22], sizeMm: [3, 2], powerW: 0.2 }],
  supplies: [{ name: 'VIN', minV: 9, nominalV: 12, maxV: 15 }],
  conditions: [
    { name: 'Hot', ambientC: 60, orientation: 'horizontal', air: { kind: 'still' }, loadsA: { U1: 0.1 } },
    { name: 'Cold', ambientC: -20, orientation: 'horizontal', air: { kind: 'still' }, loadsA: { U1: 0.1 } },
  ],
  criteria: { name: 'Tests', rules: [] },
};

export const smallBoard: Board = boardDocument.parse(smallDocument);
