import type { Board } from '#core/board/document.ts';
import type { RecordInput, RecordedRevision } from '#core/record/record-input.ts';
import type { CheckResult, ConditionResult, LimitResult, RegulatorResult, Verdict } from '#core/result/result.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';
import { smallBoard } from '../board/small-board.ts';

/** A record made by hand, so that every figure in it is known to the test: nothing here is solved. */
export function sampleRecord(change: { board?: Board; result?: CheckResult; revision?: RecordedRevision | null } = {}) {
  const board = change.board ?? sampleBoard;
  return {
    board,
    result: change.result ?? sampleResult([sampleCondition('Hot', [sampleRegulator('U1', {})])]),
    fields: new Map([['Hot', sampleField(board)]]),
    revision: change.revision === undefined ? sampleRevision('issued') : change.revision,
  } satisfies RecordInput;
}

export const sampleBoard: Board = {
  ...smallBoard,
  criteria: {
    name: 'Sample rules',
    version: '7',
    rules: [
      { quantity: 'junctionC', atMostC: 110, source: 'Sample rules, clause 4.1' },
      { quantity: 'inputV', ratio: 0.8, source: 'Sample rules, clause 4.2' },
    ],
  },
};

const sources = {
  junctionC: 'Sample rules: Sample rules, clause 4.1',
  inputV: 'Sample rules: Sample rules, clause 4.2',
  outputA: 'Sample rules: no source stated',
};

export function sampleLimit(quantity: LimitResult['quantity'], actual: number | null, limit: number, verdict: Verdict) {
  const margin = actual === null ? null : limit - actual;
  return { quantity, actual, limit, margin, ratio: null, verdict, source: sources[quantity] } satisfies LimitResult;
}

export function sampleRegulator(ref: string, change: Partial<RegulatorResult>): RegulatorResult {
  return {
    ref,
    dissipationW: 0.731,
    junctionC: 97.4,
    uncertaintyK: 4.3,
    gridErrorK: 0.6,
    modelErrorK: 4.2,
    caseTopC: 95.1,
    landC: 93.2,
    thetaJaKPerW: 51.3,
    inputV: 14,
    outputV: 4.9,
    outputA: 0.1,
    groundA: 0.001,
    headroomV: 3.4,
    regulating: true,
    shutsDown: false,
    ladderK: { box: 0, air: 0, neighbours: 6.1, board: 28.2, package: 3.1 },
    limits: [sampleLimit('junctionC', 97.4, 110, 'within'), sampleLimit('inputV', 14, 16, 'within')],
    verdict: 'within',
    ...change,
  };
}

export function sampleCondition(name: string, regulators: RegulatorResult[], change: Partial<ConditionResult> = {}) {
  return {
    name,
    status: 'converged',
    message: null,
    regulators,
    sources: [{ ref: 'R1', powerW: 0.2, temperatureC: 71.2, maxC: 73.9, limitC: null, verdict: 'not evaluated' }],
    probes: [],
    ledger: regulators.flatMap(({ ref }) => [
      { victim: ref, source: ref, riseK: 31.3 },
      { victim: ref, source: 'R1', riseK: 6.1 },
    ]),
    board: { maxC: 93.9, maxAt: [10, 10], meanC: 68.4 },
    energy: { inW: 0.931, outW: 0.931, imbalance: 2e-11 },
    solver: { cells: 5120, cellMm: 0.5, iterations: 23, residual: 4e-10, gridErrorK: 0.6, milliseconds: 31 },
    verdict: 'within',
    ...change,
  } satisfies ConditionResult as ConditionResult;
}

export function sampleResult(conditions: ConditionResult[], change: Partial<CheckResult> = {}): CheckResult {
  return {
    format: 'dropwatt-result',
    version: 1,
    method: '9.8.7',
    inputHash: `sha256:${'5ca1ab1e'.repeat(8)}`,
    title: 'Small board',
    conditions,
    findings: [
      {
        rule: 'near-corner',
        severity: 'warn',
        ref: 'U1',
        condition: null,
        message: 'Near a corner.',
        remedy: 'Move it.',
      },
    ],
    cautions: [{ kind: 'hot-surface', ref: 'U1', condition: 'Hot', message: 'Hot surface at U1: do not touch.' }],
    assumptions: [
      { path: 'pours[0].coverage', value: 1 },
      { path: 'pours[1].coverage', value: 1 },
    ],
    verdict: 'within',
    ...change,
  };
}

export function sampleRevision(state: RecordedRevision['state'], change: Partial<RecordedRevision> = {}) {
  return {
    assemblyNumber: 'PCA-4711',
    assemblyTitle: 'Sample assembly',
    letter: 'C',
    state,
    changedAt: '2031-03-05T16:20:07.000Z',
    authors: ['Ada Author'],
    stateReason: null,
    reasons: [{ rule: 'near-corner', ref: 'U1', condition: null, reason: 'The corner is clamped to the frame.' }],
    signatures: [
      { name: 'Ada Author', meaning: 'authored', signedAt: '2031-03-03T08:01:02.000Z' },
      { name: 'Rolf Reviewer', meaning: 'reviewed', signedAt: '2031-03-04T09:03:04.000Z' },
      { name: 'Quinn Quality', meaning: 'released', signedAt: '2031-03-05T16:20:07.000Z' },
    ],
    comments: [],
    ...change,
  } satisfies RecordedRevision as RecordedRevision;
}

/** 60 °C at the edge, 95 °C in the middle, on both layers of the small board. */
function sampleField(board: Board): HeatField {
  const [columns, rows] = [20, 15];
  const temperatureC = new Float32Array(columns * rows);
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) {
      const [x, y] = [(column + 0.5) / columns - 0.5, (row + 0.5) / rows - 0.5];
      temperatureC[row * columns + column] = 60 + 35 * Math.exp(-12 * (x * x + y * y));
    }
  }
  return {
    columns,
    rows,
    xEdgesMm: Float64Array.from({ length: columns + 1 }, (_, i) => i * 2),
    yEdgesMm: Float64Array.from({ length: rows + 1 }, (_, i) => i * 2),
    layers: board.stackup.copper.map(({ name }) => ({ name, temperatureC })),
  };
}
