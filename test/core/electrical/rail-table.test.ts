import { describe, expect, test } from 'vitest';
import { boardDocument } from '#core/board/document.ts';
import { railTable } from '#core/electrical/rail-table.ts';
import { smallDocument } from '../board/small-board.ts';
import { oneRail } from './one-rail.ts';

const railOf = (rail: Parameters<typeof oneRail>[0]) => {
  const board = oneRail(rail);
  return railTable(board, board.conditions[0]!)[0]!;
};

describe('railTable – quiescent share – ground current ÷ input current', () => {
  // Common practice: 1 mA beside a load of 350 mA costs about 0.28 % (1 ÷ 351), beside 1 mA it costs half.
  test.each([
    [0.35, 1 / 351],
    [0.001, 0.5],
  ])('1 mA beside %s A', (load, share) => {
    const rail = railOf({ part: { groundA: [[0, 0.001]] }, condition: { loadsA: { U1: load } } });
    expect(rail.quiescentShare).toBeCloseTo(share, 12);
  });
});

describe('railTable – both corners in one row', () => {
  // 5 V − 2 % = 4.9 V and + 2 % = 5.1 V, dropout 0.9 V, 4 mA of ground current, 27 Ω and 0.45 V in series, 134 mA in all:
  // 14.8, 12 and 10.5 V come down by 0.45 + 3.618 V.
  const story = {
    part: {
      outputTolerancePct: 2,
      groundA: [[0, 0.004]] as [number, number][],
      dropoutV: [[0, 0.9]] as [number, number][],
    },
    supply: { minV: 10.5, nominalV: 12, maxV: 14.8 },
    condition: { loadsA: { U1: 0.13 } },
  };

  test('27 Ω – input, heat, headroom and efficiency by hand', () => {
    const rail = railOf({ ...story, regulator: { dropper: { resistanceOhm: 27, dropV: 0.45 } } });
    expect(rail.inputV.lowest).toBeCloseTo(6.432, 10);
    expect(rail.inputV.nominal).toBeCloseTo(7.932, 10);
    expect(rail.inputV.highest).toBeCloseTo(10.732, 10);
    expect(rail.heatW).toBeCloseTo(5.832 * 0.13 + 10.732 * 0.004, 10);
    expect(rail.lowInputHeatW).toBeCloseTo(1.532 * 0.13 + 6.432 * 0.004, 10);
    expect(rail.headroomV).toBeCloseTo(0.432, 10);
    expect(rail.efficiency).toBeCloseTo((4.9 * 0.13) / (14.8 * 0.134), 10);
    expect(rail.state).toBe('regulates');
  });

  test('a condition at the supply’s maximum – nominal stays nominal', () => {
    const rail = railOf({ ...story, condition: { ...story.condition, supplies: { VIN: 14.8 } } });
    expect(rail.inputV).toEqual({ lowest: 10.5, nominal: 12, highest: 14.8 });
  });

  test('47 Ω – starves: at the lowest input the output is 3.752 − 0.9 V', () => {
    const rail = railOf({ ...story, regulator: { dropper: { resistanceOhm: 47, dropV: 0.45 } } });
    expect(rail.state).toBe('starves');
    expect(rail.lowInputHeatW).toBeCloseTo(0.9 * 0.13 + 3.752 * 0.004, 10);
  });
});

describe('railTable – a rail behind another', () => {
  const board = boardDocument.parse({
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

  test('in regulation – after its source, whose tolerance spans its input', () => {
    const [upper, lower] = railTable(board, board.conditions[0]!);
    expect([upper!.ref, lower!.ref, lower!.source]).toEqual(['U1', 'U2', 'U1']);
    // 5 V ± 2 %
    expect(lower!.inputV.lowest).toBeCloseTo(4.9, 12);
    expect(lower!.inputV.nominal).toBeCloseTo(5, 12);
    expect(lower!.inputV.highest).toBeCloseTo(5.1, 12);
    expect(upper!.inputA).toBeCloseTo(0.1 + 0.202 + 0.001, 12);
  });

  test('its source starved at 5.2 V – the input of both follows down', () => {
    const [upper, lower] = railTable(board, { ...board.conditions[0]!, supplies: { VIN: 5.2 } });
    expect(upper!.state).toBe('out of regulation');
    // 0.5 V of dropout in the upper part
    expect(lower!.inputV.nominal).toBeCloseTo(4.7, 12);
  });
});

test('railTable – no load – nothing is made up', () => {
  expect(railOf({ condition: { loadsA: {} } })).toMatchObject({
    state: 'not evaluated',
    heatW: null,
    lowInputHeatW: null,
    efficiency: null,
    quiescentShare: null,
    inputV: { lowest: null, nominal: null, highest: null },
  });
});

test('railTable – a short – all input on the part at either corner, no headroom', () => {
  const rail = railOf({
    part: { currentLimit: { kind: 'constant', limitA: 0.8 }, groundA: [[0, 0.001]] },
    condition: { fault: { kind: 'output-short', ref: 'U1' } },
  });
  expect(rail).toMatchObject({ state: 'shorted', headroomV: null, efficiency: 0 });
  // 15 V and 9 V, 800 mA + 1 mA
  expect(rail.heatW).toBeCloseTo(15 * 0.801, 12);
  expect(rail.lowInputHeatW).toBeCloseTo(9 * 0.801, 12);
});
