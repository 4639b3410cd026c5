import type { BoardDocument } from './document.ts';

/** What a new assembly starts from: a bare two-layer board of 100 mm × 70 mm, and one condition to fill in. */
export function blankBoard(title: string): BoardDocument {
  return {
    format: 'dropwatt-board',
    version: 1,
    title,
    outline: {
      points: [
        [0, 0],
        [100, 0],
        [100, 70],
        [0, 70],
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
    pours: [],
    viaFields: [],
    packages: {},
    parts: {},
    regulators: [],
    conditions: [{ name: 'Room', ambientC: 25, orientation: 'horizontal', air: { kind: 'still' } }],
    criteria: {
      name: '25 K below maximum',
      rules: [
        {
          quantity: 'junctionC',
          belowMaxK: 25,
          source: 'Habit of the trade, no single source',
          mark: 'common-practice',
        },
      ],
    },
  };
}
