import { modelErrorShare } from '#core/accuracy/model-error.ts';
import type { Condition } from '#core/board/condition.ts';
import { celsiusOffset } from '#core/units.ts';
import { adjointLedger, type Influence, type LedgerEntry } from './adjoint-ledger.ts';
import { buildBoardModel, type BoardModel } from './board-model.ts';
import { energyBalance } from './energy-balance.ts';
import { gridError } from './grid-error.ts';
import { heatField } from './heat-field-of.ts';
import { energyLimit } from './method.ts';
import { noticesOf } from './notices.ts';
import { probeTemperature } from './probe-temperature.ts';
import type { HeatInput, RegulatorHeat, ThermalSolution } from './solution.ts';
import { solveRises, type Rises } from './solve-rises.ts';

/**
 * Temperatures of a board in one condition.
 * @param options.start an earlier solution of the same model, for a warm start
 * @param options.gridError whether to solve on cells of twice the size too, for the grid error (Roache)
 * @returns a record whose status says whether its numbers may be used; never throws for a numerical reason
 */
export function solveCondition(
  model: BoardModel,
  condition: Condition,
  heat: HeatInput,
  options: { start?: ThermalSolution | undefined; gridError?: boolean | undefined } = {},
): ThermalSolution {
  const earlier = options.start && startOf.get(options.start);
  const solved = solveRises(model, condition, heat, earlier?.solved);
  const energy = energyBalance(model, heat, solved);
  const status =
    solved.status === 'converged' && !(energy.imbalance <= energyLimit) ? ('not-converged' as const) : solved.status;
  const { ledger, influences } =
    status === 'converged'
      ? adjointLedger(model, heat, solved, earlier?.influences)
      : { ledger: [] as LedgerEntry[], influences: [] };
  const coarser = options.gridError && status === 'converged' ? coarserJunctions(model, condition, heat) : null;
  const regulators = new Map<string, RegulatorHeat>();
  model.packages.forEach((nodes, index) => {
    const junctionK = solved.rise[nodes.junction]!;
    const landK = hottestLand(model, solved, index);
    const others = ledger.filter((entry) => entry.victim === nodes.ref && entry.source !== nodes.ref);
    const preheatedAirK = others.reduce((sum, entry) => sum + entry.byAirK, 0);
    const neighboursK = others.reduce((sum, entry) => sum + entry.riseK - entry.byAirK, 0);
    const packageK = junctionK - landK;
    regulators.set(nodes.ref, {
      junctionC: junctionK + solved.ambientK - celsiusOffset,
      caseTopC: solved.caseRise[index]! + solved.ambientK - celsiusOffset,
      landC: landK + solved.ambientK - celsiusOffset,
      boxK: condition.boxRiseK,
      preheatedAirK,
      neighboursK,
      boardK: junctionK - preheatedAirK - neighboursK - packageK,
      packageK,
      gridErrorK: coarser ? gridError([junctionK, coarser.get(nodes.ref) ?? NaN]) : null,
      modelErrorK: modelErrorShare(condition, nodes.path) * junctionK,
    });
  });
  const solution: ThermalSolution = {
    status,
    message:
      status === 'converged'
        ? null
        : (solved.message ?? `Heat in and out differ by ${(100 * energy.imbalance).toPrecision(2)} %.`),
    regulators,
    sources: sourceTemperatures(model, solved),
    probes: new Map(model.board.probes.map((probe) => [probe.id, probeTemperature(model, solved, probe)])),
    ledger: ledger.map(({ victim, source, riseK }) => ({ victim, source, riseK })),
    ...boardTemperatures(model, solved),
    energy,
    solver: {
      cells: solved.rise.length,
      cellMm: Math.max(model.grid.dxMm, model.grid.dyMm),
      iterations: solved.iterations,
      residual: solved.residual,
      gridErrorK: worst([...regulators.values()].map((regulator) => regulator.gridErrorK)),
    },
    notices: noticesOf(model, condition, solved),
  };
  const keep = solved.rise.length * influences.length <= mostKeptInfluences;
  startOf.set(solution, { solved, influences: keep ? influences : [] });
  return solution;
}

/** Influences kept for a warm start, numbers in all: 64 MB. */
const mostKeptInfluences = 8e6;

/** Fields behind a solution, for warm starts, without making them part of the result. */
const startOf = new WeakMap<ThermalSolution, { solved: Rises; influences: Influence[] }>();

const worst = (values: (number | null)[]) =>
  values.every((value) => value === null) ? null : Math.max(...values.map((value) => value ?? 0));

/** Junction rises on cells of twice the size. */
function coarserJunctions(model: BoardModel, condition: Condition, heat: HeatInput): Map<string, number> {
  const cellMm = 2 * Math.max(model.grid.dxMm, model.grid.dyMm);
  const { correctLands, resolvedMm } = model;
  const coarse = (model.coarser ??= buildBoardModel(model.board, { cellMm, correctLands, resolvedMm }));
  const { rise } = solveRises(coarse, condition, heat);
  return new Map(coarse.packages.map((nodes) => [nodes.ref, rise[nodes.junction]!]));
}

function hottestLand(model: BoardModel, { rise }: Rises, index: number): number {
  const { lands, side, junction } = model.packages[index]!;
  const offset = side === 'top' ? 0 : model.layers.count - 1;
  const means = lands
    .filter((land) => land.weights.cell.length > 0)
    .map(({ weights, slug, kPerW, correctionKPerW }) => {
      let mean = slug === null ? 0 : rise[slug]!;
      if (slug === null) {
        weights.cell.forEach((cell, k) => (mean += weights.weight[k]! * rise[cell * model.layers.count + offset]!));
      }
      return mean + (correctionKPerW * (rise[junction]! - mean)) / kPerW;
    });
  return means.length ? Math.max(...means) : 0;
}

function sourceTemperatures(model: BoardModel, { rise, ambientK }: Rises) {
  const temperatures = new Map<string, { meanC: number; maxC: number }>();
  for (const { ref, side, weights } of model.sources) {
    const offset = side === 'top' ? 0 : model.layers.count - 1;
    let mean = 0;
    let most = -Infinity;
    weights.cell.forEach((cell, k) => {
      const here = rise[cell * model.layers.count + offset]!;
      mean += weights.weight[k]! * here;
      most = Math.max(most, here);
    });
    if (weights.cell.length === 0) mean = most = NaN;
    temperatures.set(ref, { meanC: mean + ambientK - celsiusOffset, maxC: most + ambientK - celsiusOffset });
  }
  return temperatures;
}

function boardTemperatures(model: BoardModel, solved: Rises) {
  const { grid, layers, filled } = model;
  let maxK = -Infinity;
  let maxAt: [number, number] = [grid.x0Mm, grid.y0Mm];
  let sum = 0;
  let area = 0;
  for (let cell = 0; cell < filled.length; cell++) {
    if (filled[cell] === 0) continue;
    for (let l = 0; l < layers.count; l++) {
      const here = solved.rise[cell * layers.count + l]!;
      sum += here * filled[cell]!;
      area += filled[cell]!;
      if (here > maxK) {
        maxK = here;
        maxAt = [
          grid.x0Mm + ((cell % grid.columns) + 0.5) * grid.dxMm,
          grid.y0Mm + (Math.floor(cell / grid.columns) + 0.5) * grid.dyMm,
        ];
      }
    }
  }
  const toC = solved.ambientK - celsiusOffset;
  return { board: { maxC: maxK + toC, maxAt, meanC: sum / area + toC }, field: heatField(model, solved) };
}
