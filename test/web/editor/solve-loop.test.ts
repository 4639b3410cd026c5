import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import type { CheckResult } from '#core/result/result.ts';
import { startSolving } from '#web/editor/solve/solve-loop.ts';
import type { SolveAnswer } from '#web/editor/solve/solve.worker.ts';
import { driveEditor } from './editor-driver.ts';

type Call = {
  board: Board;
  condition: string;
  cellMm: number | null;
  answer: () => Promise<void>;
  fail: () => Promise<void>;
};

/** Result of one condition without anything in it. */
function emptyResult(name: string): CheckResult {
  const condition = {
    name,
    status: 'converged' as const,
    message: null,
    regulators: [],
    sources: [],
    probes: [],
    ledger: [],
    board: null,
    energy: null,
    solver: null,
    verdict: 'not evaluated' as const,
  };
  return {
    format: 'dropwatt-result',
    version: 1,
    method: 'test',
    inputHash: '',
    title: '',
    conditions: [condition],
    findings: [],
    cautions: [],
    assumptions: [],
    verdict: 'not evaluated',
  };
}

/** A worker that answers when it is told to. */
function setUp() {
  const hand = driveEditor();
  const calls: Call[] = [];
  const settle = () => new Promise<void>((resolve) => setImmediate(resolve));
  const stop = startSolving(
    hand.store,
    (board, condition, cellMm) =>
      new Promise<SolveAnswer>((resolve, reject) => {
        calls.push({
          board,
          condition,
          cellMm,
          answer: () => (resolve({ result: emptyResult(condition), field: null }), settle()),
          fail: () => (reject(new Error('no copper')), settle()),
        });
      }),
  );
  return { hand, calls, stop, checks: () => hand.store.getState().checks };
}

test('solving – a board at rest – every condition with the normal cell, the active one first', async () => {
  const { hand, calls, checks } = setUp();
  await calls[0]?.answer();
  await calls[1]?.answer();
  expect(calls.map(({ condition, cellMm }) => [condition, cellMm])).toEqual([
    ['Hot', null],
    ['Cold', null],
  ]);
  expect([...checks().byCondition.values()].every((check) => check.board === hand.board())).toBe(true);
  expect(checks().busy).toBe(false);
});

test('solving – many moves while one calculation runs – one at a time, the newest board next, coarse', async () => {
  const { hand, calls, checks } = setUp();
  await calls[0]?.answer();
  await calls[1]?.answer();
  hand.press([10, 10]);
  for (const x of [14, 16, 18, 20, 22]) hand.move([x, 12]);
  expect(calls).toHaveLength(3);
  await calls[2]?.answer();
  expect(calls).toHaveLength(4);
  expect(calls[3]?.board.regulators[0]?.at).toEqual([22, 12]);
  expect(calls[3]?.cellMm).toBeGreaterThan(0);
  await calls[3]?.answer();
  expect(checks().byCondition.get('Hot')?.fidelity).toBe('preview');
  hand.release([22, 12]);
  await calls[4]?.answer();
  expect(calls[4]).toMatchObject({ condition: 'Hot', cellMm: null });
  expect(checks().byCondition.get('Hot')?.fidelity).toBe('settled');
});

test('solving – a calculation that throws – is told once and not tried again for the same board', async () => {
  const { calls, checks } = setUp();
  await calls[0]?.fail();
  await calls[1]?.answer();
  expect(calls).toHaveLength(2);
  expect(checks().byCondition.has('Hot')).toBe(false);
  expect(checks().busy).toBe(false);
});

test('solving – stopped – answers that come late change nothing', async () => {
  const { calls, stop, checks } = setUp();
  stop();
  await calls[0]?.answer();
  expect(checks().byCondition.size).toBe(0);
  expect(calls).toHaveLength(1);
});
