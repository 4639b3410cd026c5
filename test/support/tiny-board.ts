import type { BoardDocument } from '#core/board/document.ts';

/** A board that is solved in a moment: 20 × 20 mm, one part of a known dissipation, two conditions, nothing to warn of. */
export function tinyBoard(powerW = 0.2, title = 'Tiny board'): BoardDocument {
  const condition = { orientation: 'horizontal' as const, air: { kind: 'still' as const } };
  return {
    format: 'dropwatt-board',
    version: 1,
    title,
    outline: {
      points: [
        [0, 0],
        [20, 0],
        [20, 20],
        [0, 20],
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
          [2, 2],
          [18, 2],
          [18, 18],
          [2, 18],
        ],
      },
    ],
    viaFields: [],
    packages: {
      block: {
        name: 'Block',
        bodyMm: [4, 4, 1],
        caseTopKPerW: 50,
        lands: [{ name: 'tab', kind: 'tab', kPerW: 5, pads: [{ at: [0, 0], sizeMm: [3, 3] }] }],
        source: 'invented',
      },
    },
    parts: {
      part: {
        name: 'PART',
        package: 'block',
        passElement: 'pmos',
        outputV: 3.3,
        outputTolerancePct: 2,
        inputMaxV: 6,
        outputMaxA: 1,
        dropoutV: [[1, 0.3]],
        groundA: [[0, 0.0001]],
        landNets: { tab: 'ground' },
        junctionMaxC: 125,
        source: 'invented',
      },
    },
    regulators: [
      { ref: 'U1', part: 'part', at: [10, 10], nets: { ground: 'GND', input: 'VIN', output: '3V3' }, powerW },
    ],
    conditions: [
      { name: 'Room', ambientC: 25, ...condition },
      { name: 'Warm', ambientC: 40, ...condition },
    ],
    criteria: { name: 'House', rules: [{ quantity: 'junctionC', belowMaxK: 25, source: 'invented' }] },
  };
}
