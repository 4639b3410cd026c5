import { describe, expect, test } from 'vitest';
import type { BoardDocument } from '#core/board/document.ts';
import { readBoard } from '#core/board/read-board.ts';
import { changedDocument } from './changed-document.ts';

function faultsOf(change: (document: BoardDocument) => void): string[] {
  const reading = readBoard(changedDocument(change));
  return reading.ok ? [] : reading.faults.map(({ path, message }) => `${path}: ${message}`);
}

const via = {
  id: 'v1',
  net: 'GND',
  at: [10, 10] as [number, number],
  columns: 2,
  rows: 2,
  pitchMm: 1,
  drillMm: 0.3,
  platingUm: 25,
  filling: 'open' as const,
  from: 'L1',
  to: 'L2',
};

test('crossCheck – the small board as it is, and with a via field – no fault', () => {
  expect(faultsOf(() => undefined)).toEqual([]);
  expect(faultsOf((document) => document.viaFields.push(via))).toEqual([]);
});

describe('crossCheck – what refers to nothing, stands twice or runs the wrong way – a fault that names it', () => {
  test.each<[string, (document: BoardDocument) => void, string]>([
    [
      'a dielectric too many',
      (d) => d.stackup.dielectric.push(d.stackup.dielectric[0]!),
      'stackup.dielectric: must have 1 in its list, one between every two of the 2 copper layers, found 2',
    ],
    ['a layer named twice', (d) => (d.stackup.copper[1]!.name = 'L1'), 'stackup.copper[1].name: "L1" is used twice'],
    ['a pour id twice', (d) => (d.pours[1]!.id = 'p1'), 'pours[1].id: "p1" is used twice'],
    ['a condition twice', (d) => (d.conditions[1]!.name = 'Hot'), 'conditions[1].name: "Hot" is used twice'],
    [
      'a source with a regulator’s reference',
      (d) => (d.sources![0]!.ref = 'U1'),
      'sources[0].ref: "U1" is already a regulator',
    ],
    [
      'a pour on no layer',
      (d) => (d.pours[0]!.layer = 'L7'),
      'pours[0].layer: must be a copper layer (L1, L2), found "L7"',
    ],
    [
      'a via field upwards',
      (d) => d.viaFields.push({ ...via, from: 'L2', to: 'L1' }),
      'viaFields[0].to: must lie below L2 in the stack-up, found "L1"',
    ],
    [
      'a part that is not there',
      (d) => (d.regulators[0]!.part = 'six'),
      'regulators[0].part: must be a part of this document (five), found "six"',
    ],
    [
      'a package that is not there',
      (d) => (d.parts.five!.package = 'crate'),
      'parts.five.package: must be a package of this document (box), found "crate"',
    ],
    [
      'a land that the package has not',
      (d) => (d.parts.five!.landNets.pad = 'ground'),
      'parts.five.landNets.pad: must be a land of box (tab)',
    ],
    [
      'a land named twice',
      (d) => d.packages.box!.lands.push(d.packages.box!.lands[0]!),
      'packages.box.lands[1].name: "tab" is used twice',
    ],
    [
      'a dropout table that does not rise in current',
      (d) =>
        (d.parts.five!.dropoutV = [
          [0.5, 1],
          [0.5, 1.2],
        ]),
      'parts.five.dropoutV[1][0]: must be a current above 0.5 A, found 0.5 A',
    ],
    [
      'a foldback that folds forward',
      (d) => (d.parts.five!.currentLimit = { kind: 'foldback', kneeA: 1, shortA: 2 }),
      'parts.five.currentLimit.shortA: must be at most kneeA (1 A), found 2 A',
    ],
    [
      'a lowest voltage above the nominal one',
      (d) => (d.supplies![0]!.minV = 13),
      'supplies[0].minV: must be at most nominalV (12 V), found 13 V',
    ],
    [
      'a highest voltage below the nominal one',
      (d) => (d.supplies![0]!.maxV = 11),
      'supplies[0].maxV: must be at least nominalV (12 V), found 11 V',
    ],
    [
      'a feed that is not there',
      (d) => (d.regulators[0]!.feed = { supply: 'V24' }),
      'regulators[0].feed.supply: must be a supply of this document, found "V24"',
    ],
    [
      'a feed from itself',
      (d) => (d.regulators[0]!.feed = { regulator: 'U1' }),
      'regulators[0].feed: feeds itself in a circle: U1 from U1',
    ],
    [
      'a dropper that heats nothing there is',
      (d) => (d.regulators[0]!.dropper = { resistanceOhm: 10, source: 'R5' }),
      'regulators[0].dropper.source: must be a heat source of this document, found "R5"',
    ],
    [
      'a load of no regulator',
      (d) => (d.conditions[0]!.loadsA = { U9: 0.1 }),
      'conditions[0].loadsA.U9: must name a regulator of this document',
    ],
    [
      'a power of no source',
      (d) => (d.conditions[0]!.powersW = { R9: 0.1 }),
      'conditions[0].powersW.R9: must name a heat source of this document',
    ],
    [
      'a voltage of no supply',
      (d) => (d.conditions[0]!.supplies = { V9: 5 }),
      'conditions[0].supplies.V9: must name a supply of this document',
    ],
    [
      'a short of no regulator',
      (d) => (d.conditions[0]!.fault = { kind: 'output-short', ref: 'U9' }),
      'conditions[0].fault.ref: must be a regulator of this document, found "U9"',
    ],
    [
      'an outline like a bow tie',
      (d) =>
        (d.outline.points = [
          [0, 0],
          [40, 31],
          [40, 0],
          [0, 30],
        ]),
      'outline.points: must not cross or touch itself',
    ],
    [
      'a pour without area',
      (d) =>
        (d.pours[0]!.points = [
          [1, 1],
          [2, 2],
          [3, 3],
        ]),
      'pours[0].points: must enclose an area of at least 0.0001 mm²',
    ],
    [
      'a cut-out across the edge',
      (d) =>
        (d.outline.cutouts = [
          [
            [35, 10],
            [45, 10],
            [45, 20],
            [35, 20],
          ],
        ]),
      'outline.cutouts[0]: must lie inside the outline',
    ],
    [
      'a hole beside its pour',
      (d) =>
        (d.pours[0]!.holes = [
          [
            [20, 20],
            [22, 20],
            [22, 22],
          ],
        ]),
      'pours[0].holes[0]: must lie inside the pour',
    ],
  ])('%s', (_, change, fault) => {
    expect(faultsOf(change)).toContain(fault);
  });
});

test('crossCheck – three regulators that feed each other – the circle is named in its order', () => {
  const faults = faultsOf((document) => {
    const [first] = document.regulators;
    document.regulators = ['U1', 'U2', 'U3'].map((ref, k) => ({
      ...first!,
      ref,
      at: [8 + 8 * k, 10],
      feed: { regulator: ['U3', 'U1', 'U2'][k]! },
    }));
  });
  expect(faults).toEqual(['regulators[0].feed: feeds itself in a circle: U1 from U3 from U2 from U1']);
});

test('crossCheck – a cut-out with its corners on the board but its edge through a bay of the outline – refused', () => {
  // A U-shaped board: the bay lies at x 15…17 above y = 10, so that the middle of the cut-out's edge is on the board too.
  const faults = faultsOf((document) => {
    document.outline = {
      points: [
        [0, 0],
        [40, 0],
        [40, 30],
        [17, 30],
        [17, 10],
        [15, 10],
        [15, 30],
        [0, 30],
      ],
      cutouts: [
        [
          [10, 20],
          [30, 20],
          [30, 22],
          [10, 22],
        ],
      ],
    };
  });
  expect(faults).toEqual(['outline.cutouts[0]: must lie inside the outline']);
});

test('crossCheck – a hole that touches the edge of its pour from inside – allowed', () => {
  const faults = faultsOf((document) => {
    document.pours[0]!.holes = [
      [
        [5, 6],
        [8, 6],
        [8, 9],
        [5, 9],
      ],
    ];
  });
  expect(faults).toEqual([]);
});
