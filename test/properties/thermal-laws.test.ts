import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import { heatInput } from '#core/check/heat-input.ts';
import { operatingPoints } from '#core/electrical/operating-points.ts';
import { sourcePowers } from '#core/electrical/source-powers.ts';
import { buildBoardModel, type BoardModel } from '#core/thermal/board-model.ts';
import type { HeatInput } from '#core/thermal/solution.ts';
import { solveCondition } from '#core/thermal/solve-condition.ts';
import { latticeCellMm } from './lattice.ts';
import { propertyRuns, propertySeed, propertyTimeout } from './property-runs.ts';
import { randomBoard, withFixedFilm } from './random-board.ts';

const holds = (property: (board: Board) => void) =>
  fc.assert(
    fc.property(randomBoard, ({ board }) => property(board)),
    { seed: propertySeed, numRuns: propertyRuns },
  );

const modelOf = (board: Board) => buildBoardModel(board, { cellMm: latticeCellMm });
const conditionOf = (board: Board) => board.conditions[0]!;

function heatOf(board: Board): HeatInput {
  const points = operatingPoints(board, conditionOf(board));
  return heatInput(points, sourcePowers(board, conditionOf(board), points));
}
const onlyPart = (ref: string, watts: number): HeatInput => ({
  regulatorsW: new Map([[ref, watts]]),
  sourcesW: new Map(),
});

function solve(model: BoardModel, heat: HeatInput, ambientC = 25) {
  const solution = solveCondition(model, { ...conditionOf(model.board), ambientC }, heat);
  expect(solution.status, solution.message ?? '').toBe('converged');
  return solution;
}

/** Films settle to 0.003 K a round. */
const settledK = 0.02;

test(
  'any board – heat in and out – balance to 1e-6, with a true residual below 1e-8',
  { timeout: propertyTimeout },
  () => {
    holds((board) => {
      const { energy, solver } = solve(modelOf(board), heatOf(board));
      expect(energy.imbalance).toBeLessThan(1e-6);
      expect(solver.residual).toBeLessThan(1e-8);
    });
  },
);

test('any board whose sinks stand at ambient – no temperature – is below the air', { timeout: propertyTimeout }, () => {
  holds((board) => {
    const { boxRiseK, air, filmWPerM2K } = conditionOf(board);
    const solution = solve(modelOf(board), heatOf(board));
    const airC = 25 + boxRiseK;
    // Air that carries heat makes no M-matrix: a cell that hardly conducts, before a hot part,
    // may fall short by some hundredths of the hottest rise.
    const hottest = Math.max(solution.board.maxC, ...[...solution.regulators.values()].map((heat) => heat.junctionC));
    const carried = air.kind === 'moving' && filmWPerM2K === null ? 2e-2 * (hottest - airC) : 0;
    const least = airC - 1e-4 - carried;
    for (const { temperatureC } of solution.field.layers) {
      for (const t of temperatureC) if (!Number.isNaN(t)) expect(t).toBeGreaterThanOrEqual(least);
    }
    for (const { junctionC, caseTopC } of solution.regulators.values()) {
      expect(Math.min(junctionC, caseTopC)).toBeGreaterThanOrEqual(least);
    }
  });
});

test(
  'any board, fixed film – one part heated more – no cell and no junction falls',
  { timeout: propertyTimeout },
  () => {
    holds((board) => {
      const model = modelOf(withFixedFilm(board));
      const heat = heatOf(board);
      const more = {
        ...heat,
        regulatorsW: new Map(heat.regulatorsW).set('U1', (heat.regulatorsW.get('U1') ?? 0) + 0.2),
      };
      const [one, other] = [solve(model, heat), solve(model, more)];
      one.field.layers.forEach(({ temperatureC }, layer) =>
        temperatureC.forEach((t, cell) => {
          if (!Number.isNaN(t)) expect(other.field.layers[layer]!.temperatureC[cell]! - t).toBeGreaterThan(-1e-4);
        }),
      );
      // The solver's tolerance is 1e-9 of the whole: also of foil alone, whose parts may be thousands of kelvins too hot.
      const hottest = Math.max(...[...other.regulators.values()].map(({ junctionC }) => junctionC));
      const unseen = Math.max(1e-6, 1e-8 * hottest);
      for (const [ref, { junctionC }] of one.regulators) {
        expect(other.regulators.get(ref)!.junctionC - junctionC).toBeGreaterThan(ref === 'U1' ? 0.1 : -unseen);
      }
    });
  },
);

test('any board in any air – one part heated more – its own junction rises', { timeout: propertyTimeout }, () => {
  holds((board) => {
    const model = modelOf(board);
    const [one, other] = [0.2, 0.5].map((watts) => solve(model, onlyPart('U1', watts)).regulators.get('U1')!.junctionC);
    expect(other! - one!).toBeGreaterThan(0.1);
  });
});

test(
  'any board in any air – ambient 15 K up – every junction rises, by at most 15 K',
  { timeout: propertyTimeout },
  () => {
    holds((board) => {
      const model = modelOf(board);
      const [cold, warm] = [solve(model, heatOf(board), 25), solve(model, heatOf(board), 40)];
      for (const [ref, { junctionC }] of cold.regulators) {
        const up = warm.regulators.get(ref)!.junctionC - junctionC;
        // Radiation of a part some hundred kelvins too hot leaves little of it.
        expect(up).toBeGreaterThan(1);
        expect(up).toBeLessThan(15 + settledK);
      }
    });
  },
);

test(
  'any board in still air – the ledger per watt – is reciprocal, and sums to each rise',
  { timeout: propertyTimeout },
  () => {
    holds((board) => {
      const still = {
        ...board,
        conditions: board.conditions.map((one) => ({ ...one, air: { kind: 'still' as const } })),
      };
      const model = modelOf(still);
      const heat: HeatInput = {
        regulatorsW: new Map(board.regulators.map(({ ref }, k) => [ref, 0.1 + 0.1 * k])),
        sourcesW: new Map(board.sources.map(({ ref }) => [ref, 0.05])),
      };
      const { ledger, regulators } = solve(model, heat);
      const perWatt = new Map<string, number>();
      for (const { victim, source, riseK } of ledger) {
        const watts = heat.regulatorsW.get(source);
        if (watts) perWatt.set(`${victim} ${source}`, riseK / watts);
      }
      const most = Math.max(...perWatt.values());
      for (const one of heat.regulatorsW.keys()) {
        for (const other of heat.regulatorsW.keys()) {
          const apart = perWatt.get(`${one} ${other}`)! - perWatt.get(`${other} ${one}`)!;
          expect(Math.abs(apart) / most).toBeLessThan(1e-6);
        }
        const sum = ledger.filter(({ victim }) => victim === one).reduce((total, { riseK }) => total + riseK, 0);
        const rise = regulators.get(one)!.junctionC - 25 - conditionOf(still).boxRiseK;
        expect(Math.abs(sum / rise - 1)).toBeLessThan(1e-4);
      }
    });
  },
);

test('any board, fixed film – heat of all – gives the sum of the rises by each', { timeout: propertyTimeout }, () => {
  holds((board) => {
    const fixed = withFixedFilm(board, { top: 14, bottom: 5 });
    const model = modelOf(fixed);
    const refs = board.regulators.map(({ ref }) => ref);
    const airC = 25 + conditionOf(board).boxRiseK;
    const rises = (heat: HeatInput) => {
      const { regulators } = solve(model, heat);
      return refs.map((ref) => regulators.get(ref)!.junctionC - airC);
    };
    const together = rises({ regulatorsW: new Map(refs.map((ref) => [ref, 0.3])), sourcesW: new Map() });
    const alone = refs.map((ref) => rises(onlyPart(ref, 0.3)));
    const most = Math.max(...together);
    together.forEach((rise, k) => {
      const sum = alone.reduce((total, one) => total + one[k]!, 0);
      expect(Math.abs(rise - sum) / most).toBeLessThan(1e-6);
    });
  });
});
