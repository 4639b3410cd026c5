import { expect, test } from 'vitest';
import { checkBoard } from '#core/check/check-board.ts';
import { verdictOf } from '#core/derating/verdict.ts';
import { networkSolver } from '#core/numerics/kernel/network-solver.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { solveCondition } from '#core/thermal/solve-condition.ts';
import { hardBoard } from './hard-board.ts';
import { solved } from './solved-board.ts';

test.each([NaN, Infinity, -Infinity])(
  'heat of %d W that slipped past the schema – the solution – is no converged one',
  (power) => {
    const solution = solved(hardBoard(), { U1: power });
    expect(solution.status).not.toBe('converged');
    expect(solution.message).toMatch(/\w/);
  },
);

test.each<[string, (model: ReturnType<typeof buildBoardModel>) => void]>([
  ['a conductance in the plane', ({ network }) => (network.gx[300] = NaN)],
  ['a conductance through', ({ network }) => (network.gz[300] = Infinity)],
  ['a link of a part', ({ network }) => (network.links.g[0] = NaN)],
  ['an area of a face', ({ top }) => (top.area[40] = NaN)],
])('%s that is not finite – the solution – ends as no converged one', (_, spoil) => {
  const model = buildBoardModel(hardBoard(), { cellMm: 1 });
  spoil(model);
  model.solver = networkSolver(model.network);
  const solution = solveCondition(model, model.board.conditions[0]!, {
    regulatorsW: new Map([['U1', 1]]),
    sourcesW: new Map(),
  });
  expect(solution.status).not.toBe('converged');
});

test('a network without any path to the air – the solution – says so', () => {
  const model = buildBoardModel(hardBoard({ sinks: [] }), { cellMm: 1 });
  model.top.area.fill(0);
  model.bottom.area.fill(0);
  const shut = { ...model, packages: model.packages.map((nodes) => ({ ...nodes, caseAreaM2: 0 })) };
  const solution = solveCondition(shut, model.board.conditions[0]!, {
    regulatorsW: new Map([['U1', 1]]),
    sourcesW: new Map(),
  });
  expect(solution.status).not.toBe('converged');
});

test('a solution that did not converge – the result – carries no temperature and no verdict', () => {
  const board = hardBoard();
  const hopeless = {
    ...board,
    regulators: board.regulators.map((part) => ({ ...part, powerW: Number.NaN })),
  };
  const { result } = checkBoard(hopeless, [], { cellMm: 1 });
  const [condition] = result.conditions;
  expect(condition!.status).not.toBe('converged');
  expect(condition!.verdict).toBe('not evaluated');
  expect(result.verdict).toBe('not evaluated');
  for (const part of condition!.regulators) {
    expect(part.junctionC).toBeNull();
    expect(part.verdict).toBe('not evaluated');
  }
});

test.each([NaN, Infinity, -Infinity, null])('a stress of %s – any limit – is not evaluated', (actual) => {
  expect(verdictOf(actual, 110, 0)).toBe('not evaluated');
});
