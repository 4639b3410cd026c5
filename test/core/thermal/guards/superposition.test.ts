import { expect, test } from 'vitest';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { hardBoard } from './hard-board.ts';
import { solved, tightRises } from './solved-board.ts';

const model = buildBoardModel(hardBoard({ filmWPerM2K: 12, sinks: [] }), { cellMm: 0.5 });
const worst = (one: Float64Array, other: Float64Array) => {
  const most = one.reduce((top, value) => Math.max(top, Math.abs(value)), 0);
  return one.reduce((apart, value, node) => Math.max(apart, Math.abs(value - other[node]!) / most), 0);
};

test('fixed film – heat of two parts and a source together – is the sum of each alone, in every node to 1e-8', () => {
  const powers = Object.entries({ U1: 0.8, U2: 0.5, Q1: 0.3 });
  const alone = powers.map(([ref, power]) => tightRises(model, { [ref]: power }));
  const together = tightRises(model, Object.fromEntries(powers));
  expect(
    worst(
      together,
      together.map((_, node) => alone.reduce((sum, field) => sum + field[node]!, 0)),
    ),
  ).toBeLessThan(1e-8);
});

test.each([1e-3, 7, 60])('fixed film – heat times %d – rises times the same, in every node to 1e-8', (factor) => {
  const [one, many] = [
    tightRises(model, { U1: 0.8, U2: 0.5 }),
    tightRises(model, { U1: 0.8 * factor, U2: 0.5 * factor }),
  ];
  expect(
    worst(
      many,
      one.map((value) => factor * value),
    ),
  ).toBeLessThan(1e-8);
});

test('fixed film – air warmer by 37 K – everything warmer by 37 K', () => {
  const [cold, warm] = [solved(model, { U1: 0.8 }), solved(model, { U1: 0.8 }, { ambientC: 50, boxRiseK: 12 })];
  for (const [ref, heat] of cold.regulators) {
    expect(warm.regulators.get(ref)!.junctionC - heat.junctionC).toBeCloseTo(37, 8);
    expect(warm.regulators.get(ref)!.caseTopC - heat.caseTopC).toBeCloseTo(37, 8);
  }
  expect(warm.board.maxC - cold.board.maxC).toBeCloseTo(37, 8);
  expect(warm.sources.get('Q1')!.meanC - cold.sources.get('Q1')!.meanC).toBeCloseTo(37, 8);
});
