import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { BoardDocument } from '#core/board/document.ts';
import { readBoard } from '#core/board/read-board.ts';
import type { Point } from '#core/board/outline.ts';
import { checkBoard } from '#core/check/check-board.ts';
import { checkResult } from '#core/result/result.ts';
import { propertyRuns, propertySeed, propertyTimeout } from './property-runs.ts';
import { randomBoard } from './random-board.ts';

type Change = { name: string; apply: (document: BoardDocument, by: number) => BoardDocument };

const onCondition = (change: Partial<BoardDocument['conditions'][number]>) => (document: BoardDocument) => ({
  ...document,
  conditions: document.conditions.map((condition) => ({ ...condition, ...change })),
});
const firstPour = (document: BoardDocument, points: (points: Point[]) => Point[]): BoardDocument => ({
  ...document,
  pours: document.pours.map((pour, k) => (k === 0 ? { ...pour, points: points(pour.points), holes: [] } : pour)),
});

/** Shapes and numbers at the end of what a document may hold, and beyond it. */
const changes: Change[] = [
  { name: 'none', apply: (document) => document },
  {
    name: 'off the lattice',
    apply: (document, by) => firstPour(document, (ring) => ring.map(([x, y]) => [x + by / 777, y - by / 333])),
  },
  {
    name: 'a sliver',
    apply: (document) =>
      firstPour(document, () => [
        [1, 1],
        [9, 1],
        [9, 1.0001],
      ]),
  },
  {
    name: 'no area',
    apply: (document) =>
      firstPour(document, () => [
        [1, 1],
        [5, 5],
        [9, 9],
      ]),
  },
  {
    name: 'crossing itself',
    apply: (document) =>
      firstPour(document, () => [
        [0, 0],
        [9, 9],
        [9, 0],
        [0, 9],
      ]),
  },
  {
    name: 'corners on a line',
    apply: (document) =>
      firstPour(document, () => [
        [0, 0],
        [3, 0],
        [6, 0],
        [9, 0],
        [9, 9],
        [0, 9],
      ]),
  },
  { name: 'a comb', apply: (document) => firstPour(document, () => comb(30)) },
  { name: 'far away', apply: (document) => firstPour(document, (ring) => ring.map(([x, y]) => [x + 1900, y + 1900])) },
  {
    name: 'everything twice',
    apply: (document) => ({
      ...document,
      pours: [...document.pours, ...document.pours.map((pour) => ({ ...pour, id: `${pour.id}x` }))],
    }),
  },
  {
    name: 'parts on one spot',
    apply: (document) => ({
      ...document,
      regulators: document.regulators.map((part) => ({ ...part, at: [3, 3] as Point })),
    }),
  },
  {
    name: 'parts off the board',
    apply: (document) => ({
      ...document,
      regulators: document.regulators.map((part) => ({ ...part, at: [-500, 900] as Point })),
    }),
  },
  {
    name: 'no parts',
    apply: (document) => ({
      ...document,
      regulators: [],
      conditions: document.conditions.map((one) => ({ ...one, loadsA: {} })),
    }),
  },
  {
    name: 'turned askew',
    apply: (document, by) => ({
      ...document,
      regulators: document.regulators.map((part) => ({ ...part, rotationDeg: by % 360 })),
    }),
  },
  {
    name: 'much heat',
    apply: (document) => ({ ...document, regulators: document.regulators.map((part) => ({ ...part, powerW: 500 })) }),
  },
  {
    name: 'no heat',
    apply: (document) => ({
      ...document,
      regulators: document.regulators.map((part) => ({ ...part, powerW: 0 })),
      sources: [],
    }),
  },
  {
    name: 'a sink of its own temperature',
    apply: (document) => ({
      ...document,
      sinks: [{ id: 's9', at: [2, 2], sizeMm: [200, 200], layer: 'L1', conductanceWPerK: 1000, toC: 300 }],
    }),
  },
  { name: 'cold and high', apply: onCondition({ ambientC: -100, altitudeM: 20000 }) },
  { name: 'hot', apply: onCondition({ ambientC: 250, boxRiseK: 200 }) },
  { name: 'the least film', apply: onCondition({ filmWPerM2K: 0.1 }) },
  { name: 'the most film', apply: onCondition({ filmWPerM2K: 100_000 }) },
  { name: 'a storm', apply: onCondition({ air: { kind: 'moving', speedMPerS: 30, towardDeg: -360 } }) },
  { name: 'hardly a breath', apply: onCondition({ air: { kind: 'moving', speedMPerS: 0.05, towardDeg: 45 } }) },
  {
    name: 'fan stopped',
    apply: onCondition({ air: { kind: 'moving', speedMPerS: 3 }, fault: { kind: 'fan-stopped' } }),
  },
  { name: 'output short', apply: onCondition({ fault: { kind: 'output-short', ref: 'U1' } }) },
  { name: 'loads left out', apply: onCondition({ loadsA: {} }) },
];

function comb(teeth: number): Point[] {
  const upper = Array.from({ length: teeth }, (_, k): Point[] => [
    [0.3 * k, 2],
    [0.3 * k, 8],
    [0.3 * k + 0.15, 8],
    [0.3 * k + 0.15, 2],
  ]).flat();
  return [...upper, [0.3 * teeth, 1], [0, 1]];
}

/** Every number in a value, with where it stands. */
function numbers(value: unknown, path = ''): [string, number][] {
  if (typeof value === 'number') return [[path, value]];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => numbers(inner, `${path}.${key}`));
}

test(
  'any document – is refused with its faults, or has a result of its shape whose every number is finite',
  { timeout: propertyTimeout },
  () => {
    const statuses = new Set<string>();
    fc.assert(
      fc.property(
        randomBoard,
        fc.subarray(changes, { minLength: 1, maxLength: 3 }),
        fc.nat(9999),
        fc.constantFrom(1.2, 1.7, 40),
        ({ document }, chosen, by, cellMm) => {
          const changed = chosen.reduce((given, change) => change.apply(given, by), document);
          const reading = readBoard(JSON.parse(JSON.stringify(changed)));
          if (!reading.ok) {
            expect(reading.faults.length).toBeGreaterThan(0);
            for (const { path, message } of reading.faults) expect(`${path}${message}`).toMatch(/\w/);
            statuses.add('refused');
            return;
          }
          const { result, fields } = checkBoard(reading.board, [], { cellMm, gridError: true });
          expect(checkResult.safeParse(result).error?.message).toBeUndefined();
          for (const [path, value] of numbers(result)) expect(Number.isFinite(value), path).toBe(true);
          for (const { name, status, verdict, message } of result.conditions) {
            statuses.add(status);
            if (status === 'converged') expect(fields.has(name)).toBe(true);
            else expect([verdict, typeof message]).toEqual(['not evaluated', 'string']);
          }
          if (reading.board.regulators.length === 0) expect(result.verdict).toBe('not evaluated');
        },
      ),
      { seed: propertySeed, numRuns: 4 * propertyRuns },
    );
    // The generator reaches both ends.
    expect(statuses).toContain('refused');
    expect(statuses).toContain('converged');
  },
);
