import { describe, expect, test } from 'vitest';
import { type Board, type BoardDocument, boardDocument } from '#core/board/document.ts';
import { CheckCancelled, checkBoard } from '#core/check/check-board.ts';
import { checkResult } from '#core/result/result.ts';
import { soundBoard } from '../derating/sound-board.ts';

const options = { cellMm: 1 };
const check = (board: Board) => checkBoard(board, [], options).result;
const only = (change: (document: BoardDocument) => void) =>
  soundBoard((document) => {
    document.conditions.pop();
    change(document);
  });

describe('checkBoard – a sound board – a whole result document', () => {
  const assumptions = [{ path: 'stackup.emissivityTop', value: 0.9 }];
  const { result, fields } = checkBoard(soundBoard(), assumptions, options);

  test('the document obeys its schema and carries what was assumed', () => {
    expect(checkResult.parse(result)).toEqual(result);
    expect(result.assumptions).toEqual(assumptions);
    expect([...fields.keys()]).toEqual(['Hot', 'Cold']);
  });

  test('run again – the same to the last bit', () => {
    expect(checkBoard(soundBoard(), assumptions, options).result).toEqual(result);
  });

  test('the ladder – its rungs sum to junction − outside ambient', () => {
    const { ladderK, junctionC } = result.conditions[0]!.regulators[0]!;
    const { box, air, neighbours, board, package: inside } = ladderK!;
    expect(box + air + neighbours + board + inside).toBeCloseTo(junctionC! - 60, 9);
  });

  test('the ledger – every source’s share of a junction sums to its rise, as no air warms another', () => {
    const { ledger, regulators } = result.conditions[0]!;
    const sum = ledger.filter(({ victim }) => victim === 'U1').reduce((total, { riseK }) => total + riseK, 0);
    expect(sum).toBeCloseTo(regulators[0]!.junctionC! - 60, 6);
  });

  test('heat in – that of the operating point, the dropper and the source', () => {
    // 15 V through 10 Ω at 0.101 A leave 13.99 V; (13.99 − 4.9)·0.1 + 13.99·0.001 W in U1; 10·0.101² + 0.2 W in R1.
    expect(result.conditions[0]!.energy!.inW).toBeCloseTo(0.909 + 0.01399 + 0.10201 + 0.2, 9);
    expect(result.conditions[0]!.energy!.imbalance).toBeLessThan(1e-6);
  });
});

test('checkBoard – with the grid error – one band from grid and model', () => {
  const { result } = checkBoard(soundBoard(), [], { ...options, gridError: true });
  const { uncertaintyK, gridErrorK, modelErrorK } = result.conditions[0]!.regulators[0]!;
  expect(gridErrorK).toBeGreaterThan(0);
  expect(uncertaintyK).toBeCloseTo(Math.hypot(gridErrorK!, modelErrorK!), 12);
});

test('checkBoard – one condition asked for – that one alone', () => {
  const { result } = checkBoard(soundBoard(), [], { ...options, conditions: ['Cold'] });
  expect(result.conditions.map(({ name }) => name)).toEqual(['Cold']);
});

test('checkBoard – told to stop after the first of two conditions – CheckCancelled', () => {
  const seen: number[][] = [];
  const run = () =>
    checkBoard(soundBoard(), [], { ...options, onProgress: (done, total) => seen.push([done, total]) === 0 });
  expect(run).toThrow(CheckCancelled);
  expect(seen).toEqual([[1, 2]]);
});

describe('checkBoard – the limit moved about the junction – over, close, within', () => {
  const limited = (atMostC: number) =>
    only((document) => {
      document.parts.five!.junctionMaxC = 400;
      document.criteria.rules = [{ quantity: 'junctionC', atMostC }];
    });
  const { junctionC, uncertaintyK } = check(limited(400)).conditions[0]!.regulators[0]!;
  test.each([
    ['0.01 K below it', -0.01, 'over'],
    ['at it', 0, 'close'],
    ['just inside its band', uncertaintyK! * 0.99, 'close'],
    ['just outside its band', uncertaintyK! * 1.01, 'within'],
  ] as const)('limit %s', (_, aboveK, verdict) => {
    const result = check(limited(junctionC! + aboveK));
    expect(result.conditions[0]!.regulators[0]!.verdict).toBe(verdict);
    expect(result.verdict).toBe(verdict);
  });
});

describe('checkBoard – something missing – never a pass', () => {
  const twoParts = (change: (document: BoardDocument) => void) =>
    only((document) => {
      document.regulators.push({ ...document.regulators[0]!, ref: 'U2', at: [30, 8], dropper: null });
      document.conditions[0]!.loadsA = { U1: 0.03, U2: 0.01 };
      change(document);
    });

  test('the load of a neighbour – neither it nor the other is evaluated', () => {
    const result = check(twoParts((document) => (document.conditions[0]!.loadsA = { U1: 0.03 })));
    const [known, unknown] = result.conditions[0]!.regulators;
    expect(known!.verdict).toBe('not evaluated');
    expect(known!.junctionC).toBeGreaterThan(60);
    expect(unknown).toMatchObject({ junctionC: null, dissipationW: null, verdict: 'not evaluated' });
    expect(result.verdict).toBe('not evaluated');
  });

  test('the load of a neighbour, and the other is over without it – over all the same', () => {
    const result = check(
      twoParts((document) => {
        document.conditions[0]!.loadsA = { U1: 0.03 };
        document.criteria.rules = [{ quantity: 'junctionC', atMostC: 61 }];
      }),
    );
    expect(result.conditions[0]!.regulators.map(({ verdict }) => verdict)).toEqual(['over', 'not evaluated']);
    expect(result.verdict).toBe('over');
  });

  test('the power of a heat source – no regulator beside it is evaluated', () => {
    const result = check(
      twoParts((document) => document.sources!.push({ ref: 'Q1', at: [22, 22], sizeMm: [2, 2], powerW: null })),
    );
    expect(result.conditions[0]!.regulators.map(({ verdict }) => verdict)).toEqual(['not evaluated', 'not evaluated']);
  });

  test('a rule for the junction – not evaluated although the maker’s maximum holds', () => {
    const result = check(
      only((document) => {
        document.conditions[0]!.loadsA = { U1: 0.03 };
        document.criteria.rules = [{ quantity: 'inputV', ratio: 0.8 }];
      }),
    );
    const [regulator] = result.conditions[0]!.regulators;
    expect(regulator!.limits.map(({ verdict }) => verdict)).toEqual(['within', 'within']);
    expect(regulator!.verdict).toBe('not evaluated');
  });

  test('every regulator – heat is solved, the verdict stays open', () => {
    const board = only((document) => {
      document.regulators = [];
      document.conditions[0]!.loadsA = {};
    });
    const result = check(board);
    expect(result.verdict).toBe('not evaluated');
    expect(result.conditions[0]!.sources[0]!.temperatureC).toBeGreaterThan(60);
  });

  test('every condition – nothing evaluated, and a stop finding says so', () => {
    const result = check(soundBoard((document) => (document.conditions = [])));
    expect(result.verdict).toBe('not evaluated');
    expect(result.findings.map(({ rule }) => rule)).toContain('no-condition');
  });
});

test('checkBoard – no heat anywhere – solved, at the ambient', () => {
  const board = only((document) => {
    document.regulators[0] = { ...document.regulators[0]!, powerW: 0, feed: null, dropper: null };
    document.sources = [];
    document.conditions[0]!.loadsA = {};
  });
  const [condition] = check(board).conditions;
  expect(condition).toMatchObject({ status: 'converged', verdict: 'within' });
  expect(condition!.regulators[0]).toMatchObject({ junctionC: 60, thetaJaKPerW: null });
});

test('checkBoard – a known dissipation without electrical data – evaluated by its junction', () => {
  const board = only((document) => {
    document.regulators[0] = { ...document.regulators[0]!, powerW: 0.3, feed: null, dropper: null };
    document.conditions[0]!.loadsA = {};
    document.criteria.rules.push({ quantity: 'inputV', ratio: 0.8 });
  });
  const [regulator] = check(board).conditions[0]!.regulators;
  expect(regulator).toMatchObject({ dissipationW: 0.3, inputV: null, verdict: 'within' });
});

describe('checkBoard – output short – full heat below the shutdown, mean heat at it above', () => {
  const shorted = (limitA: number, shutdownC: number | null) =>
    boardDocument.parse(
      only((document) => {
        document.regulators[0]!.dropper = null;
        document.parts.five!.currentLimit = { kind: 'constant', limitA };
        document.parts.five!.shutdownC = shutdownC;
        document.conditions[0]!.fault = { kind: 'output-short', ref: 'U1' };
      }),
    );

  test('20 mA – 15 V · 21 mA, no shutdown', () => {
    const [regulator] = check(shorted(0.02, 165)).conditions[0]!.regulators;
    expect(regulator!.dissipationW).toBeCloseTo(15 * 0.021, 12);
    expect(regulator).toMatchObject({ shutsDown: false, regulating: false, outputV: 0 });
  });

  test('1 A – the junction is held at 165 °C by a mean power below 15 W, over the maker’s 150 °C', () => {
    const result = check(shorted(1, 165));
    const [regulator] = result.conditions[0]!.regulators;
    expect(regulator!.junctionC).toBeCloseTo(165, 1);
    expect(regulator!.dissipationW).toBeLessThan(15);
    expect(regulator!.dissipationW).toBeGreaterThan(0.5);
    expect(regulator).toMatchObject({ shutsDown: true, verdict: 'over' });
    expect(result.conditions[0]!.energy!.inW).toBeCloseTo(regulator!.dissipationW! + 0.2, 9);
    expect(result.findings.map(({ rule }) => rule)).toContain('shutdown-cycling');
  });

  test('air warmer than the shutdown – no heat of its own is left, and no number is missing', () => {
    const board = shorted(1, 165);
    const hot = { ...board, conditions: board.conditions.map((condition) => ({ ...condition, ambientC: 200 })) };
    const [regulator] = check(hot).conditions[0]!.regulators;
    expect(regulator!.dissipationW).toBe(0);
    expect(regulator!.junctionC).toBeGreaterThanOrEqual(200);
    expect(regulator!.verdict).toBe('over');
  });

  test('0.3 A without a shutdown – the full 4.5 W are solved', () => {
    const [regulator] = check(shorted(0.3, null)).conditions[0]!.regulators;
    expect(regulator!.dissipationW).toBeCloseTo(15 * 0.301, 12);
    expect(regulator).toMatchObject({ shutsDown: false, verdict: 'over' });
  });

  test('0.1 A with a shutdown just below and just above the junction – cycles there, and does not', () => {
    const [free] = check(shorted(0.1, null)).conditions[0]!.regulators;
    // Neither twice nor half of it: 2 K away.
    const [below, above] = [-2, 2].map((by) => {
      const shutdownC = free!.junctionC! + by;
      return { shutdownC, found: check(shorted(0.1, shutdownC)).conditions[0]!.regulators[0]! };
    });
    expect(below!.found.junctionC).toBeCloseTo(below!.shutdownC, 1);
    expect(below!.found.dissipationW).toBeLessThan(free!.dissipationW!);
    expect(below!.found.shutsDown).toBe(true);
    expect(above!.found).toMatchObject({ dissipationW: free!.dissipationW, shutsDown: false });
  });
});

test('checkBoard – θJA in a warm box – is that of the air around the board, not of the air outside', () => {
  const theta = (boxRiseK: number) => {
    const board = only((document) => {
      document.conditions[0]!.filmWPerM2K = 10;
      document.conditions[0]!.boxRiseK = boxRiseK;
    });
    return check(board).conditions[0]!.regulators[0]!.thetaJaKPerW!;
  };
  // A fixed film does not know how warm the air is.
  expect(theta(30)).toBeCloseTo(theta(0), 6);
});

test('checkBoard – a source a little below its limit – is close, as the model may be off by more; far below – within', () => {
  const source = (limitC: number | null) => {
    const board = only((document) => {
      document.sources![0]!.limitC = limitC;
    });
    return check(board).conditions[0]!.sources[0]!;
  };
  const { temperatureC } = source(null);
  // Still air: 13 % of a rise of some 15 K.
  expect(temperatureC! - 60).toBeGreaterThan(8);
  expect(source(temperatureC! + 0.5).verdict).toBe('close');
  expect(source(temperatureC! + 40).verdict).toBe('within');
  expect(source(temperatureC! - 0.5).verdict).toBe('over');
});
