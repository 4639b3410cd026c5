import { describe, expect, test } from 'vitest';
import { readBoard } from '#core/board/read-board.ts';
import { readShape } from '#core/board/read-shape.ts';
import { changedDocument } from './changed-document.ts';
import { smallDocument } from './small-board.ts';

function faultsOf(value: unknown): string[] {
  const reading = readBoard(value);
  return reading.ok ? [] : reading.faults.map(({ path, message }) => `${path}: ${message}`);
}

test('readBoard – a valid document – the board with its defaults, and every default that was used', () => {
  const reading = readBoard(smallDocument);
  if (!reading.ok) throw new Error(JSON.stringify(reading.faults));
  expect(reading.board.stackup.emissivityTop).toBe(0.9);
  expect(reading.board.conditions[0]?.boxRiseK).toBe(0);
  // Counted by hand: two emissivities of the stack-up, coverage of two pours, emissivity of the package, rotation and side
  // of U1 and of R1, box rise and altitude of two conditions. Empty lists and nulls assume nothing.
  expect(reading.assumptions.map(({ path }) => path)).toEqual([
    'stackup.emissivityTop',
    'stackup.emissivityBottom',
    'pours[0].coverage',
    'pours[1].coverage',
    'packages.box.emissivity',
    'regulators[0].rotationDeg',
    'regulators[0].side',
    'sources[0].rotationDeg',
    'sources[0].side',
    'conditions[0].boxRiseK',
    'conditions[0].altitudeM',
    'conditions[1].boxRiseK',
    'conditions[1].altitudeM',
  ]);
  expect(reading.assumptions[0]).toEqual({ path: 'stackup.emissivityTop', value: 0.9 });
});

describe('readBoard – one thing wrong – a fault with path, what is allowed and what was found', () => {
  test.each<[string, (document: ReturnType<typeof loose>) => void, string]>([
    ['text missing', (d) => delete d.title, 'title: is missing; it must be text of 1 to 200 characters'],
    [
      'number missing',
      (d) => delete d.stackup.copper[0].thicknessUm,
      'stackup.copper[0].thicknessUm: is missing; it must be a number from 1 to 500 µm',
    ],
    ['list missing', (d) => delete d.pours, 'pours: is missing; it must be a list'],
    ['object missing', (d) => delete d.outline, 'outline: is missing; it must be an object'],
    [
      'choice missing',
      (d) => delete d.conditions[0].orientation,
      'conditions[0].orientation: is missing; it must be one of "horizontal", "vertical"',
    ],
    [
      'kind missing',
      (d) => (d.conditions[0].air = {}),
      'conditions[0].air.kind: is missing; it must be one of "still", "moving"',
    ],
    [
      'kind unknown',
      (d) => (d.conditions[0].air = { kind: 'windy' }),
      'conditions[0].air.kind: must be one of "still", "moving", found "windy"',
    ],
    [
      'number out of range',
      (d) => (d.conditions[0].ambientC = 251),
      'conditions[0].ambientC: must be a number from -100 to 250 °C, found 251',
    ],
    [
      'number not finite',
      (d) => (d.conditions[0].ambientC = NaN),
      'conditions[0].ambientC: must be a number from -100 to 250 °C, found NaN',
    ],
    [
      'text for a number',
      (d) => (d.sources[0].powerW = '0,2'),
      'sources[0].powerW: must be a number from 0 to 500 W, found "0,2"',
    ],
    ['list for an object', (d) => (d.criteria = []), 'criteria: must be an object, found []'],
    [
      'three coordinates',
      (d) => (d.pours[0].points[0] = [1, 2, 3]),
      'pours[0].points[0]: must be a point [x, y] in mm, found [1,2,3]',
    ],
    [
      'film without its bottom',
      (d) => (d.conditions[0].filmWPerM2K = { top: 10 }),
      'conditions[0].filmWPerM2K: must be a number from 0.1 to 100000 W/(m²·K) or { "top", "bottom" }, found {"top":10}',
    ],
    ['unknown field', (d) => (d.pours[0].nett = 'GND'), 'pours[0].nett: is not a known field'],
    [
      'control character in a name',
      (d) => (d.pours[0].net = 'G\u0000ND'),
      'pours[0].net: must not hold control characters or broken characters',
    ],
    [
      'reference that every object answers to',
      (d) => (d.sources[0].ref = 'constructor'),
      'sources[0].ref: must not be a word that JavaScript reserves, found "constructor"',
    ],
    [
      'rule without a comparison',
      (d) => (d.criteria.rules = [{ quantity: 'junctionC' }]),
      'criteria.rules[0]: must state at least one of belowMaxK (K), atMostC (°C) and ratio',
    ],
    [
      'rule that measures volts in kelvins',
      (d) => (d.criteria.rules = [{ quantity: 'inputV', belowMaxK: 20 }]),
      'criteria.rules[0]: belowMaxK and atMostC apply to junctionC only; use ratio',
    ],
    ['format of something else', (d) => (d.format = 'x'), 'format: must be "dropwatt-board", found "x"'],
    [
      'version not out yet',
      (d) => (d.version = 2),
      'version: is 2, newer than the 1 that this release reads; update Dropwatt',
    ],
  ])('%s', (_, change, fault) => {
    const document = loose();
    change(document);
    expect(faultsOf(document)).toContain(fault);
  });
});

test('readBoard – four things wrong in four places – four faults at once', () => {
  const document = loose();
  delete document.title;
  document.outline.points = [[0, 0]];
  document.regulators[0].side = 'left';
  document.colour = 'green';
  expect(faultsOf(document).map((fault) => fault.split(':')[0])).toEqual([
    'title',
    'outline.points',
    'regulators[0].side',
    'colour',
  ]);
});

test('readBoard – 200 000 lists in each other – one fault, no exhausted stack', () => {
  const document = { ...smallDocument, pours: JSON.parse('['.repeat(200_000) + ']'.repeat(200_000)) as unknown };
  expect(faultsOf(document)).toEqual(['pours: must not nest deeper than 32 levels']);
});

test('readBoard – a key that reaches the prototype – refused by its path', () => {
  const document = { ...smallDocument, parts: JSON.parse('{ "__proto__": {} }') as unknown };
  expect(faultsOf(document)).toEqual(['parts.__proto__: must not be used as a key']);
});

test.each([null, 3, 'x', []])('readBoard – %j – not a board document', (value) => {
  expect(faultsOf(value)).toEqual([': must be a board document (a JSON object)']);
});

test('readShape – a sketch whose part is not there yet – read; readBoard – refused', () => {
  const halfDrawn = changedDocument((document) => (document.regulators[0]!.part = 'none'));
  expect(readShape(halfDrawn).ok).toBe(true);
  expect(faultsOf(halfDrawn)).toEqual(['regulators[0].part: must be a part of this document (five), found "none"']);
});

/** The document as anything goes, for spoiling it. */
function loose() {
  return JSON.parse(JSON.stringify(smallDocument));
}
