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

/** Two workers that answer when they are told to. */
function setUp() {
  const hand = driveEditor();
  const rest = () => new Promise<void>((resolve) => setImmediate(resolve));
  const worker = (calls: Call[]) => (board: Board, condition: string, cellMm: number | null) =>
    new Promise<SolveAnswer>((resolve, reject) => {
      calls.push({
        board,
        condition,
        cellMm,
        answer: () => (resolve({ result: emptyResult(condition), field: null }), rest()),
        fail: () => (reject(new Error('no copper')), rest()),
      });
    });
  const coarse: Call[] = [];
  const full: Call[] = [];
  const stop = startSolving(hand.store, { preview: worker(coarse), settled: worker(full) });
  const checks = () => hand.store.getState().checks;
  const fidelity = () => checks().byCondition.get('Hot')?.fidelity;
  return { hand, coarse, full, stop, checks, fidelity };
}

test('solving – a board at rest – the active condition coarse at once, then every condition in full, the active one first', async () => {
  const { hand, coarse, full, checks } = setUp();
  await coarse[0]?.answer();
  await full[0]?.answer();
  await full[1]?.answer();
  expect(coarse.map(({ condition }) => condition)).toEqual(['Hot']);
  expect(full.map(({ condition, cellMm }) => [condition, cellMm])).toEqual([
    ['Hot', null],
    ['Cold', null],
  ]);
  expect([...checks().byCondition.values()].every((check) => check.board === hand.board())).toBe(true);
  expect(checks().busy).toBe(false);
});

test('solving – many moves while one preview runs – one at a time, the newest board next; full ones only after the release', async () => {
  const { hand, coarse, full, fidelity } = setUp();
  await coarse[0]?.answer();
  await full[0]?.answer();
  await full[1]?.answer();
  hand.press([10, 10]);
  for (const x of [14, 16, 18, 20, 22]) hand.move([x, 12]);
  expect(coarse).toHaveLength(2);
  await coarse[1]?.answer();
  expect(coarse).toHaveLength(3);
  expect(coarse[2]?.board.regulators[0]?.at).toEqual([22, 12]);
  await coarse[2]?.answer();
  expect(fidelity()).toBe('preview');
  expect(full).toHaveLength(2);
  hand.release([22, 12]);
  expect(coarse[3]?.board).toBe(hand.board());
  await coarse[3]?.answer();
  expect(fidelity()).toBe('refined');
  expect(full[2]).toMatchObject({ condition: 'Hot', cellMm: null });
  await full[2]?.answer();
  expect(fidelity()).toBe('settled');
});

test('solving – a preview that comes after the full answer for the same board – does not take its place', async () => {
  const { coarse, full, fidelity } = setUp();
  await full[0]?.answer();
  await coarse[0]?.answer();
  expect(fidelity()).toBe('settled');
});

test('solving – a calculation that throws – is told and not tried again for the same board', async () => {
  const { coarse, full, checks } = setUp();
  await coarse[0]?.fail();
  await full[0]?.fail();
  expect(checks().fault).toBe('no copper');
  await full[1]?.answer();
  expect([coarse.length, full.length]).toEqual([1, 2]);
  expect(checks().byCondition.has('Hot')).toBe(false);
  expect(checks().busy).toBe(false);
});

test('solving – stopped – answers that come late change nothing', async () => {
  const { coarse, full, stop, checks } = setUp();
  stop();
  await coarse[0]?.answer();
  await full[0]?.answer();
  expect(checks().byCondition.size).toBe(0);
  expect(full).toHaveLength(1);
});
