import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Board, BoardDocument } from '#core/board/document.ts';
import { checkBoard } from '#core/check/check-board.ts';
import type { CheckResult, Verdict } from '#core/result/result.ts';
import { latticeCellMm } from './lattice.ts';
import { propertyRuns, propertySeed, propertyTimeout } from './property-runs.ts';
import { randomBoard, read, type Drawn } from './random-board.ts';

const holds = <T>(more: fc.Arbitrary<T>, property: (drawn: Drawn, more: T) => void) =>
  fc.assert(fc.property(randomBoard, more, property), { seed: propertySeed, numRuns: propertyRuns });

const check = (board: Board) => checkBoard(board, [], { cellMm: latticeCellMm, gridError: false }).result;

/** From good to bad. */
const rank = (verdict: Verdict) => ['within', 'close', 'not evaluated', 'over'].indexOf(verdict);

/** Verdict of every regulator in a condition of a result. */
const verdicts = (result: CheckResult, condition = 0) =>
  result.conditions[condition]!.regulators.map(({ verdict }) => rank(verdict));

function judged(board: Board, rule: Board['criteria']['rules'][number]) {
  return verdicts(check({ ...board, criteria: { ...board.criteria, rules: [rule] } }));
}
const limits = fc.tuple(fc.integer({ min: 20, max: 200 }), fc.integer({ min: 1, max: 60 }));

test('any board – a limit raised – makes no verdict worse', { timeout: propertyTimeout }, () => {
  holds(limits, ({ board }, [limit, up]) => {
    const [low, high] = [limit, limit + up].map((atMostC) => judged(board, { quantity: 'junctionC', atMostC }));
    high!.forEach((verdict, k) => expect(verdict).toBeLessThanOrEqual(low![k]!));
  });
});

test('any board – derated more – makes no verdict better', { timeout: propertyTimeout }, () => {
  holds(limits, ({ board }, [below, more]) => {
    const [less, most] = [below, below + more].map((belowMaxK) => judged(board, { quantity: 'junctionC', belowMaxK }));
    most!.forEach((verdict, k) => expect(verdict).toBeGreaterThanOrEqual(less![k]!));
  });
  holds(
    fc.tuple(fc.integer({ min: 20, max: 99 }), fc.constantFrom('inputV' as const, 'outputA' as const)),
    ({ board }, [percent, quantity]) => {
      const [mild, hard] = [1, percent / 100].map((ratio) => judged(board, { quantity, ratio }));
      hard!.forEach((verdict, k) => expect(verdict).toBeGreaterThanOrEqual(mild![k]!));
    },
  );
});

test(
  'any board – highest input, warmer air and more load – is no better than typical',
  { timeout: propertyTimeout },
  () => {
    holds(fc.integer({ min: 1, max: 40 }), ({ document }, warmer) => {
      const [typical] = document.conditions;
      const worst: BoardDocument['conditions'][number] = {
        ...typical!,
        name: 'worst',
        ambientC: typical!.ambientC + warmer,
        supplies: { VIN: 5.6 },
        loadsA: Object.fromEntries(Object.entries(typical!.loadsA ?? {}).map(([ref, load]) => [ref, 1.3 * load])),
      };
      const result = check(read({ ...document, conditions: [typical!, worst] }).board);
      const [nominal, corner] = [verdicts(result, 0), verdicts(result, 1)];
      corner.forEach((verdict, k) => expect(verdict).toBeGreaterThanOrEqual(nominal[k]!));
      result.conditions[1]!.regulators.forEach(({ junctionC }, k) =>
        expect(junctionC!).toBeGreaterThan(result.conditions[0]!.regulators[k]!.junctionC!),
      );
    });
  },
);

test('any board – saved and read again – has the same result to the last digit', { timeout: propertyTimeout }, () => {
  holds(fc.constant(null), ({ document, board }) => {
    const again = read(JSON.parse(JSON.stringify(document)) as BoardDocument).board;
    expect(JSON.stringify(check(again))).toBe(JSON.stringify(check(board)));
    // What was read, with all its defaults, is a document of the same board too.
    const full = read(JSON.parse(JSON.stringify(board)) as BoardDocument).board;
    expect(JSON.stringify(check(full))).toBe(JSON.stringify(check(board)));
  });
});
