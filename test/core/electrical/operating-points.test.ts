import { describe, expect, test } from 'vitest';
import { boardDocument } from '#core/board/document.ts';
import { operatingPoints } from '#core/electrical/operating-points.ts';
import { sourcePowers } from '#core/electrical/source-powers.ts';
import { smallDocument } from '../board/small-board.ts';
import { oneRail, pointOf } from './one-rail.ts';

describe('operatingPoints – printed worked examples – their numbers', () => {
  // MIC5209 data sheet, worst case 3.3 V → 2.5 V: (3.6 − 2.375)·0.320 + 3.6·0.004 = 0.4064 W (printed 407 mW); 2.375 V is
  // 2.5 V − 5 %.
  test('3.6 V to 2.5 V − 5 % at 320 mA with 4 mA of ground current – 0.4064 W', () => {
    const board = oneRail({
      part: { outputV: 2.5, outputTolerancePct: 5, groundA: [[0, 0.004]], dropoutV: [[0, 0.4]] },
      supply: { minV: 3, nominalV: 3.3, maxV: 3.6 },
      condition: { loadsA: { U1: 0.32 } },
    });
    expect(pointOf(board).dissipationW).toBeCloseTo(0.4064, 10);
  });

  // DS20006021A, SOT-23-5 on minimum copper: 220 K/W from 125 to 25 °C are 455 mW; 3.3 V at 150 mA with 3 mA of ground
  // current then allow 6.2 V, printed to one decimal.
  test('3.3 V at 150 mA with 3 mA of ground current – inside 455 mW at 6.2 V, outside at 6.3 V', () => {
    const allowedW = (125 - 25) / 220;
    expect(allowedW).toBeCloseTo(0.455, 3);
    const at = (inputV: number) =>
      pointOf(
        oneRail({
          part: { outputV: 3.3, outputTolerancePct: 0, groundA: [[0, 0.003]], dropoutV: [[0, 0.3]] },
          supply: { minV: 5, nominalV: 5, maxV: inputV },
          condition: { loadsA: { U1: 0.15 } },
        }),
      ).dissipationW!;
    expect(at(6.2)).toBeLessThan(allowedW);
    expect(at(6.3)).toBeGreaterThan(allowedW);
  });

  // LX8415 data sheet, page 6, worked example: 5.0 V + 5 % in, 2.5 V − 3 % out, 0.5 A, ground current left
  // out: 1.41 W. By hand (5.25 − 2.425)·0.5 = 1.4125 W.
  test('5 V + 5 % to 2.5 V − 3 % at 0.5 A – 1.41 W', () => {
    const board = oneRail({
      part: { outputV: 2.5, outputTolerancePct: 3, groundA: [[0, 0]], dropoutV: [[0, 0.5]] },
      supply: { minV: 4.75, nominalV: 5, maxV: 5.25 },
      condition: { loadsA: { U1: 0.5 } },
    });
    expect(pointOf(board).dissipationW).toBeCloseTo(1.4125, 10);
  });

  // SNOS412 table: quasi-LDO, dropout 1.20 / 1.25 / 1.30 V at 0.1 / 0.5 / 0.8 A, straight between: 1.225 V at 0.3 A.
  // Ground current 5 … 10 mA: 7 mA lies between by our own choice of the table.
  test('a quasi-LDO at 0.3 A – dropout and ground current between the points of its tables', () => {
    const board = oneRail({
      part: {
        passElement: 'npn-pnp',
        outputTolerancePct: 0,
        dropoutV: [
          [0.1, 1.2],
          [0.5, 1.25],
          [0.8, 1.3],
        ],
        groundA: [
          [0.1, 0.006],
          [0.5, 0.008],
        ],
      },
      condition: { loadsA: { U1: 0.3 } },
    });
    const point = pointOf(board);
    expect(point.groundA).toBeCloseTo(0.007, 12);
    expect(point.headroomV).toBeCloseTo(9 - 5 - 1.225, 12);
  });
});

describe('operatingPoints – pass elements – the ground current of their tables counts', () => {
  // A PNP of β = 30 draws Iout/30; a PMOS 0.1 mA at any load. 15 V → 5 V at 0.3 A: 3 W in the pass element either way.
  test.each([
    ['pnp', 0.3 / 30, 3 + 15 * 0.01],
    ['pmos', 0.0001, 3 + 15 * 0.0001],
  ] as const)('%s', (passElement, groundA, expectedW) => {
    const board = oneRail({
      part: { passElement, outputTolerancePct: 0, groundA: [[0.3, groundA]] },
      condition: { loadsA: { U1: 0.3 } },
    });
    expect(pointOf(board).dissipationW).toBeCloseTo(expectedW, 12);
  });
});

describe('operatingPoints – series resistor of the demo’s story – cools and starves', () => {
  // 14.8 V and 10.5 V less a diode of 0.45 V; 130 mA + 4 mA of ground current; 5 V + 2 %, dropout 0.9 V.
  // 27 Ω: 10.05 − 27·0.134 = 6.432 V ≥ 6.0 V. 47 Ω: 10.05 − 47·0.134 = 3.752 V.
  const through = (resistanceOhm: number) =>
    pointOf(
      oneRail({
        part: { outputTolerancePct: 2, groundA: [[0, 0.004]], dropoutV: [[0, 0.9]] },
        regulator: { dropper: { resistanceOhm, dropV: 0.45 } },
        supply: { minV: 10.5, nominalV: 12, maxV: 14.8 },
        condition: { loadsA: { U1: 0.13 } },
      }),
    );

  test('27 Ω – regulates at low line with 6.43 − 5.1 − 0.9 V to spare; takes 27·0.134² W off the part', () => {
    const point = through(27);
    expect(point.headroomV).toBeCloseTo(6.432 - 6.0, 10);
    expect(point.regulating).toBe(true);
    // (14.35 − 3.618 − 4.9)·0.13 + 10.732·0.004
    expect(point.dissipationW).toBeCloseTo(5.832 * 0.13 + 10.732 * 0.004, 10);
    // Resistor and diode: (14.8 − 10.732)·0.134
    expect(point.dropperW).toBeCloseTo(4.068 * 0.134, 10);
  });

  test('27 Ω – board heat as without it – moved, not gone', () => {
    const [bare, dropped] = [through(0), through(27)];
    expect(dropped.dissipationW! + dropped.dropperW!).toBeCloseTo(bare.dissipationW! + bare.dropperW!, 12);
  });

  test('47 Ω – starves at low line by 2.2 V', () => {
    expect(through(47).headroomV).toBeCloseTo(3.752 - 6.0, 10);
  });
});

describe('operatingPoints – dropout – the output follows the input and the part does not regulate', () => {
  test('5.2 V in, 0.5 V of dropout – 4.7 V out', () => {
    const board = oneRail({
      part: { outputTolerancePct: 0 },
      condition: { supplies: { VIN: 5.2 }, loadsA: { U1: 0.1 } },
    });
    const point = pointOf(board);
    expect(point.regulating).toBe(false);
    expect(point.outputV).toBeCloseTo(4.7, 12);
    // 0.5 V · 0.1 A + 5.2 V · 1 mA
    expect(point.dissipationW).toBeCloseTo(0.0552, 12);
  });

  test('a resistor that cannot carry the load – its current is what brings the pin to 0 V, and all heat is in it', () => {
    const board = oneRail({
      regulator: { dropper: { resistanceOhm: 1000 } },
      condition: { loadsA: { U1: 0.1 } },
    });
    const point = pointOf(board);
    expect(point.inputV).toBe(0);
    expect(point.dissipationW).toBe(0);
    // 15 V across 1 kΩ
    expect(point.dropperW).toBeCloseTo(0.225, 12);
    expect(point.regulating).toBe(false);
  });

  test('a condition below the supply’s lowest voltage – headroom is judged there', () => {
    const board = oneRail({ part: { outputTolerancePct: 0 }, condition: { supplies: { VIN: 6 } } });
    expect(pointOf(board).headroomV).toBeCloseTo(6 - 5 - 0.5, 12);
  });
});

describe('operatingPoints – a regulator behind another – currents add up the tree, voltages come down', () => {
  const chain = boardDocument.parse({
    ...smallDocument,
    parts: {
      five: { ...smallDocument.parts.five!, outputTolerancePct: 2 },
      three: { ...smallDocument.parts.five!, outputV: 3, outputTolerancePct: 0, groundA: [[0, 0.002]] },
    },
    regulators: [
      { ...smallDocument.regulators[0]!, ref: 'U2', part: 'three', feed: { regulator: 'U1' }, dropper: null },
      { ...smallDocument.regulators[0]!, ref: 'U1', dropper: null },
    ],
    conditions: [{ ...smallDocument.conditions[0]!, loadsA: { U1: 0.1, U2: 0.2 } }],
  });
  const points = operatingPoints(chain, chain.conditions[0]!);

  test('the upper one – its own load, the lower one’s load and ground current', () => {
    expect(points.get('U1')!.outputA).toBeCloseTo(0.1 + 0.2 + 0.002, 12);
    // Its own output at the lowest: (15 − 4.9)·0.302 + 15·0.001
    expect(points.get('U1')!.dissipationW).toBeCloseTo(10.1 * 0.302 + 0.015, 12);
  });

  test('the lower one – fed at the upper one’s highest output for heat, at its lowest for headroom', () => {
    expect(points.get('U2')!.inputV).toBeCloseTo(5.1, 12);
    expect(points.get('U2')!.dissipationW).toBeCloseTo((5.1 - 3) * 0.2 + 5.1 * 0.002, 12);
    expect(points.get('U2')!.headroomV).toBeCloseTo(4.9 - 3 - 0.5, 12);
  });

  test('the upper one shorted – the lower one stands at 0 V and gives no heat', () => {
    const shorted = {
      ...chain,
      parts: {
        ...chain.parts,
        five: { ...chain.parts.five!, currentLimit: { kind: 'constant' as const, limitA: 0.9 } },
      },
    };
    const after = operatingPoints(shorted, { ...chain.conditions[0]!, fault: { kind: 'output-short', ref: 'U1' } });
    expect(after.get('U1')!.dissipationW).toBeCloseTo(15 * 0.9 + 15 * 0.001, 12);
    expect(after.get('U2')).toMatchObject({ inputV: 0, dissipationW: 0, regulating: false });
  });
});

describe('operatingPoints – output short – input times the limit', () => {
  const short = { fault: { kind: 'output-short' as const, ref: 'U1' } };
  // 15 V · limit, and 15 V · 1 mA of ground current.
  test.each([
    ['constant limit', { kind: 'constant' as const, limitA: 0.8 }, 15 * 0.801],
    ['foldback', { kind: 'foldback' as const, kneeA: 0.8, shortA: 0.1 }, 15 * 0.101],
  ])('%s', (_, currentLimit, expectedW) => {
    const point = pointOf(oneRail({ part: { currentLimit }, condition: short }));
    expect(point.dissipationW).toBeCloseTo(expectedW, 12);
    expect(point).toMatchObject({ outputV: 0, regulating: false, headroomV: null, missing: [] });
  });

  test('no limit stated – not evaluated, even where a dissipation in operation is known', () => {
    const point = pointOf(oneRail({ regulator: { powerW: 0.4 }, condition: short }));
    expect(point.dissipationW).toBeNull();
    expect(point.missing).toEqual(['its current limit']);
  });
});

describe('operatingPoints – something missing – null and its name, never a number', () => {
  test.each([
    ['no load', { condition: { loadsA: {} } }, ['its load current']],
    ['no feed', { regulator: { feed: null } }, ['its feed (a supply or another regulator)']],
    [
      'a dropper of a known dissipation, without a load',
      { regulator: { powerW: 0.3, dropper: { resistanceOhm: 5 } }, condition: { loadsA: {} } },
      ['its load current'],
    ],
  ])('%s', (_, rail, missing) => {
    expect(pointOf(oneRail(rail)).missing).toEqual(missing);
  });

  test('a known dissipation – needs neither load nor feed', () => {
    const point = pointOf(oneRail({ regulator: { powerW: 0.3, feed: null }, condition: { loadsA: {} } }));
    expect(point).toMatchObject({ dissipationW: 0.3, missing: [], dropperW: 0 });
  });
});

describe('sourcePowers – own power, the condition’s power, droppers that name it', () => {
  const withSource = (powerW: number | null, resistanceOhm: number | null, powersW = {}) =>
    boardDocument.parse({
      ...smallDocument,
      regulators: [
        { ...smallDocument.regulators[0]!, dropper: resistanceOhm === null ? null : { resistanceOhm, source: 'R1' } },
      ],
      sources: [{ ...smallDocument.sources![0]!, powerW }],
      conditions: [{ ...smallDocument.conditions[0]!, powersW }],
    });
  const heat = (board: ReturnType<typeof withSource>) =>
    sourcePowers(board, board.conditions[0]!, operatingPoints(board, board.conditions[0]!)).get('R1');

  // 10 Ω at 100 mA + 1 mA: 10 · 0.101² = 0.10201 W
  test('its own 0.2 W and the resistor’s heat', () => expect(heat(withSource(0.2, 10))).toBeCloseTo(0.30201, 12));
  test('the condition’s power in place of its own', () => {
    expect(heat(withSource(0.2, 10, { R1: 0.05 }))).toBeCloseTo(0.15201, 12);
  });
  test('no power of its own – the resistor’s heat alone', () =>
    expect(heat(withSource(null, 10))).toBeCloseTo(0.10201, 12));
  test('nothing says how much – null', () => expect(heat(withSource(null, null))).toBeNull());
});
