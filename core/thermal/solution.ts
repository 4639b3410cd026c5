import type { HeatField } from './heat-field.ts';

/** Heat given off in one condition, W: regulators by ref (null: unknown, not solved for) and heat sources by ref. */
export type HeatInput = { regulatorsW: ReadonlyMap<string, number>; sourcesW: ReadonlyMap<string, number> };

/** Temperatures of one regulator, °C, and the parts of its rise, K (they sum to junction − outside ambient). */
export type RegulatorHeat = {
  junctionC: number;
  caseTopC: number;
  /** Hottest land. */
  landC: number;
  boxK: number;
  preheatedAirK: number;
  neighboursK: number;
  boardK: number;
  packageK: number;
  /** Grid error of the junction (two grids, Roache), K; null when one grid was run. */
  gridErrorK: number | null;
  /** Model error, K: the share of the rise that the published cases miss by. */
  modelErrorK: number;
};

/** Something the solution wants to say about its range of validity or the copper it met. */
export type ThermalNotice = { code: string; ref: string | null; message: string };

export type ThermalSolution = {
  status: 'converged' | 'not-converged' | 'invalid';
  message: string | null;
  regulators: Map<string, RegulatorHeat>;
  sources: Map<string, { meanC: number; maxC: number }>;
  /** NaN where the probe lies off the board. */
  probes: Map<string, number>;
  /** Rise that each source of heat (regulator or heat source) gives each regulator's junction, K. */
  ledger: { victim: string; source: string; riseK: number }[];
  board: { maxC: number; maxAt: [number, number]; meanC: number };
  energy: { inW: number; outW: number; imbalance: number };
  solver: { cells: number; cellMm: number; iterations: number; residual: number; gridErrorK: number | null };
  field: HeatField;
  notices: ThermalNotice[];
};
