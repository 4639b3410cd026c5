import { describe, expect, test } from 'vitest';
import type { Board, BoardDocument } from '#core/board/document.ts';
import { findAll } from '#core/derating/find-all.ts';
import { smallDocument } from '../board/small-board.ts';
import { contextOf } from './context-of.ts';
import { ringAt, soundBoard } from './sound-board.ts';

const found = (board: Board) =>
  findAll(contextOf(board)).map(({ severity, rule, ref }) => `${severity} ${rule} ${ref}`);

const second = (at: [number, number], ref = 'U2') => ({ ...smallDocument.regulators[0]!, ref, at, dropper: null });
const via = {
  id: 'v1',
  net: 'GND',
  at: [10, 10] as [number, number],
  columns: 1,
  rows: 1,
  pitchMm: 1,
  drillMm: 0.3,
  platingUm: 25,
  filling: 'open' as const,
  from: 'L1',
  to: 'L2',
};
const backPour = {
  id: 'p3',
  layer: 'L2',
  net: 'GND',
  points: [
    [5, 5],
    [15, 5],
    [15, 15],
    [5, 15],
  ] as [number, number][],
};

/** Reaches 1 mm into the tab from the right. */
const strip = {
  id: 'p9',
  layer: 'L1',
  points: [
    [10.5, 9],
    [14, 9],
    [14, 11],
    [10.5, 11],
  ] as [number, number][],
};

test('findAll – a sound board – nothing', () => {
  expect(found(soundBoard())).toEqual([]);
});

describe('findAll – one thing wrong – its finding, and no other', () => {
  test.each<[string, (document: BoardDocument) => void, string]>([
    ['a source half off the edge', (d) => (d.sources![0]!.at = [39, 22]), 'stop outside-outline R1'],
    [
      'a source over a cut-out',
      (d) => {
        d.outline.cutouts = [
          [
            [31, 22],
            [33, 22],
            [33, 24],
            [31, 24],
          ],
        ];
      },
      'stop outside-outline R1',
    ],
    ['a source on the regulator', (d) => (d.sources![0]!.at = [12, 10]), 'stop parts-overlap U1'],
    ['a pour of another net into the tab', (d) => d.pours.push({ ...strip, net: '5V' }), 'stop tab-net-mismatch U1'],
    [
      'holes of another net in the tab',
      (d) => {
        // One hole at x = 10 in the tab, one at x = 20 in a pour of its net.
        d.viaFields.push({ ...via, net: '5V', at: [15, 10], columns: 2, pitchMm: 10 });
        d.pours.push(
          { ...backPour, net: '5V' },
          { ...backPour, id: 'p4', layer: 'L1', net: '5V', points: ringAt(22, 10) },
        );
      },
      'stop tab-net-mismatch U1',
    ],
    ['no condition', (d) => (d.conditions = []), 'stop no-condition null'],
    ['one condition', (d) => d.conditions.pop(), 'warn one-condition null'],
    [
      'no condition at high line',
      (d) => d.conditions.forEach((condition) => (condition.supplies = { VIN: 12 })),
      'warn no-high-line VIN',
    ],
    ['no junction rule', (d) => (d.criteria.rules = []), 'stop no-junction-criteria null'],
    [
      'a limit that leans on the shutdown',
      (d) => {
        d.parts.five!.shutdownC = 149;
      },
      'stop shutdown-as-limit U1',
    ],
    ['no load in one condition', (d) => (d.conditions[1]!.loadsA = {}), 'stop missing-input U1'],
    [
      'a source without a power',
      (d) => {
        d.conditions.pop();
        d.conditions.push({ ...d.conditions[0]!, name: 'Other', powersW: { Q1: 0.1 } });
        d.sources!.push({ ...d.sources![0]!, ref: 'Q1', at: [22, 22], powerW: null });
      },
      'stop missing-input Q1',
    ],
    [
      'a tab in bare laminate',
      (d) =>
        (d.pours[0]!.points = [
          [20, 20],
          [25, 20],
          [25, 25],
          [20, 25],
        ]),
      'warn tab-without-copper U1',
    ],
    ['vias that end in nothing', (d) => d.viaFields.push(via), 'warn vias-reach-nothing v1'],
    [
      'open holes of 0.35 mm in the tab',
      (d) => {
        d.pours.push(backPour);
        d.viaFields.push({ ...via, drillMm: 0.35 });
      },
      'warn open-vias-in-land v1',
    ],
    [
      'a resistor whose heat is nowhere',
      (d) => (d.regulators[0]!.dropper = { resistanceOhm: 10 }),
      'note dropper-not-placed U1',
    ],
  ])('%s', (_, change, expected) => {
    expect(found(soundBoard(change))).toEqual([expected]);
  });

  test.each<[string, (document: BoardDocument) => void, string]>([
    [
      'no headroom',
      (d) => (d.supplies![0]!.minV = 5.5),
      // 5.5 V less 10 Ω · 0.101 A is 4.49 V; 5.1 V + 0.5 V are needed.
      'stop no-headroom U1',
    ],
    ['input above the maker’s maximum', (d) => (d.parts.five!.inputMaxV = 13.9), 'stop input-above-maximum U1'],
    ['input above it without load only', (d) => (d.parts.five!.inputMaxV = 14.5), 'stop input-above-maximum U1'],
    ['output above the maker’s maximum', (d) => (d.parts.five!.outputMaxA = 0.09), 'stop output-above-maximum U1'],
    [
      'a voltage beyond the supply’s range',
      (d) => d.conditions.forEach((condition) => (condition.supplies = { VIN: 16 })),
      'warn supply-outside-range VIN',
    ],
  ])('%s – in both conditions', (_, change, expected) => {
    expect(found(soundBoard(change))).toEqual([expected, expected]);
  });
});

describe('findAll – just not wrong – nothing', () => {
  test.each<[string, (document: BoardDocument) => void]>([
    ['a source flush with the edge', (d) => (d.sources![0]!.at = [38.5, 22])],
    ['parts side by side', (d) => (d.sources![0]!.at = [13.5, 10])],
    [
      'the same place on the other side',
      (d) => {
        d.sources![0]!.at = [30, 8];
        d.sources!.push({ ...d.sources![0]!, ref: 'Q1', side: 'bottom' });
      },
    ],
    ['open holes of 0.3 mm in the tab', (d) => void (d.pours.push(backPour) && d.viaFields.push(via))],
    [
      'filled holes of 0.35 mm in the tab',
      (d) => void (d.pours.push(backPour) && d.viaFields.push({ ...via, drillMm: 0.35, filling: 'resin' })),
    ],
    ['a pour of another net with a hole around the tab', (d) => d.pours.push(frameOfAnotherNet)],
    ['a pour of another net on the other layer', (d) => d.pours.push({ ...backPour, net: '5V' })],
    ['a shutdown 26 K above the limit', (d) => (d.parts.five!.shutdownC = 151)],
    ['a known dissipation without load and feed', (d) => known(d)],
    // 14.5 V would be passed without the resistor, and 1 mA · 10 Ω keep 15 V at 14.99 V.
    ['input at its maximum with no load', (d) => (d.parts.five!.inputMaxV = 14.99)],
  ])('%s', (_, change) => {
    expect(found(soundBoard(change))).toEqual([]);
  });
});

test('findAll – leads that share a land of no net, under a pour – nothing, as their nets are not stated', () => {
  const board = soundBoard((document) => {
    document.packages.box!.lands.push({
      name: 'leads',
      kind: 'lead',
      pads: [{ at: [0, -3], sizeMm: [1, 1] }],
      kPerW: 50,
    });
  });
  expect(found(board)).toEqual([]);
});

test('findAll – a tab of the output net, its pour on ground – named with both nets and a remedy', () => {
  const board = soundBoard((document) => (document.parts.five!.landNets = { tab: 'output' }));
  const [finding] = findAll(contextOf(board));
  expect(finding).toMatchObject({
    rule: 'tab-net-mismatch',
    message: 'Pour p1 is on GND, but the tab “tab” of U1 that it touches is on 5V.',
  });
  expect(finding!.remedy).toContain('copper of 5V');
});

test('findAll – series resistor and a load beyond the peak – hottest below its load', () => {
  // (15 − 10·0.001 − 4.9)/(2 · 100 Ω) = 50 mA, below the load of 100 mA; the low line is kept from being starved.
  const board = soundBoard((document) => {
    document.regulators[0]!.dropper = { resistanceOhm: 100, source: 'R1' };
    document.supplies = [{ name: 'VIN', minV: 20, nominalV: 20, maxV: 20 }];
    document.conditions.forEach((condition) => (condition.loadsA = { U1: 0.1 }));
  });
  // 20 V: (20 − 0.1 − 4.9)/200 Ω = 75 mA.
  const finding = findAll(contextOf(board)).find(({ rule }) => rule === 'hottest-below-load');
  expect(finding?.message).toBe('With its series resistor U1 is hottest at 0.075 A, below its load of 0.100 A.');
});

test('findAll – several – stops first, then warnings, then notes', () => {
  const board = soundBoard((document) => {
    document.conditions.pop();
    document.regulators.push(second([10.5, 10]));
    document.conditions[0]!.loadsA = { U1: 0.1, U2: 0.1 };
    document.regulators[0]!.dropper = { resistanceOhm: 10 };
  });
  expect(found(board)).toEqual(['stop parts-overlap U1', 'warn one-condition null', 'note dropper-not-placed U1']);
});

const frameOfAnotherNet: BoardDocument['pours'][number] = {
  id: 'p9',
  layer: 'L1',
  net: '5V',
  points: [
    [4, 4],
    [16, 4],
    [16, 16],
    [4, 16],
  ],
  holes: [
    [
      [4.5, 4.5],
      [15.5, 4.5],
      [15.5, 15.5],
      [4.5, 15.5],
    ],
  ],
};

function known(document: BoardDocument) {
  document.regulators[0] = { ...document.regulators[0]!, powerW: 0.3, feed: null, dropper: null };
  document.conditions.forEach((condition) => (condition.loadsA = {}));
}
