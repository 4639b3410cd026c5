import { expect, test } from 'vitest';
import { boardDocument, type Board, type BoardDocument } from '#core/board/document.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { copperWPerMK } from '#core/thermal/materials.ts';
import { solveCondition } from '#core/thermal/solve-condition.ts';
import { barrelConductanceLength } from '#core/thermal/via-conductance.ts';
import { publishedBoard, rectangle } from '#test/cases/board-of.ts';
import { oneRail, pointOf } from '../../electrical/one-rail.ts';

const apart = (found: number, printed: number) => Math.abs(found / printed - 1);

type Plate = {
  sideMm: number;
  thicknessMm: number;
  conductivity: number;
  /** Junction to the whole upper face, K/W. */
  contactKPerW: number;
  caseTopKPerW: number;
  film: { top: number; bottom: number };
  ambientC: number;
  sink?: NonNullable<BoardDocument['sinks']>[number];
};

/** A square plate as a board: one part whose land and body cover the whole of its upper face. */
function plate({ sideMm, thicknessMm, conductivity, contactKPerW, caseTopKPerW, film, ambientC, sink }: Plate): Board {
  const base = publishedBoard({
    bodyMm: [sideMm, sideMm, 0.05],
    caseTopKPerW,
    lands: [{ name: 'face', kind: 'lead', kPerW: contactKPerW, pads: [{ at: [0, 0], sizeMm: [sideMm, sideMm] }] }],
    outline: { points: rectangle(sideMm, sideMm) },
    stackup: {
      copper: [
        { name: 'L1', thicknessUm: 1 },
        { name: 'L2', thicknessUm: 1 },
      ],
      dielectric: [{ thicknessMm, inPlaneWPerMK: conductivity, throughWPerMK: conductivity }],
      maxOperatingC: 130,
    },
    ambientC,
  });
  const [condition] = base.conditions;
  return boardDocument.parse({
    ...base,
    sinks: sink ? [sink] : [],
    conditions: [{ ...condition, filmWPerM2K: film }],
  });
}

function junctionAt(board: Board, powerW: number) {
  const model = buildBoardModel(board, { cellMm: board.packages.model!.bodyMm[0] / 12 });
  const solution = solveCondition(model, board.conditions[0]!, {
    regulatorsW: new Map([['U1', powerW]]),
    sourcesW: new Map(),
  });
  expect(solution.status).toBe('converged');
  return { ...solution.regulators.get('U1')!, solution };
}

test('Cengel, example 3-5 – case, contact of 8 cm² at 42 000 W/(m²·K), 10 mm of copper, 25 W/(m²·K) – 12.4 W at 70 and 20 °C', () => {
  const board = plate({
    sideMm: 100,
    thicknessMm: 10,
    conductivity: 386,
    contactKPerW: 1 / (42000 * 8e-4),
    caseTopKPerW: 1e6,
    film: { top: 0.1, bottom: 25 },
    ambientC: 20,
  });
  const { junctionC, landC } = junctionAt(board, 12.4);
  expect(apart((junctionC - 20) / 12.4, 4.032)).toBeLessThan(0.01);
  // The printed jump at the contact: 0.37 K.
  expect(apart(junctionC - landC, 0.37)).toBeLessThan(0.01);
});

/** Hardly any film: what is left is the sink. */
const sinkAlone = (contactKPerW: number, conductanceWPerK: number, ambientC: number) =>
  plate({
    sideMm: 30,
    thicknessMm: 1,
    conductivity: 500,
    contactKPerW,
    caseTopKPerW: 1e6,
    film: { top: 0.1, bottom: 0.1 },
    ambientC,
    sink: { id: 's', at: [0, 0], sizeMm: [30, 30], layer: 'L2', conductanceWPerK, toC: 'ambient' },
  });

test('Cengel, example 3-10 – case at 85 °C, 20 K/W to air of 25 °C – 3.0 W', () => {
  expect(apart(junctionAt(sinkAlone(0.01, 1 / 20, 25), 3).landC - 25, 60)).toBeLessThan(0.01);
});

test('Cengel, example 3-11 – 60 W at 90 °C in air of 30 °C – a sink of 1.0 K/W', () => {
  expect(apart(junctionAt(sinkAlone(0.01, 1, 30), 60).landC - 30, 60)).toBeLessThan(0.01);
});

test('Incropera, example 3.2 – chip of 1e4 W/m² on 0.9e-4 m²·K/W of epoxy, 8 mm of aluminium, 100 W/(m²·K) on both faces – 75.3 °C', () => {
  const areaM2 = 2.5e-3;
  const board = plate({
    sideMm: 50,
    thicknessMm: 8,
    conductivity: 239,
    contactKPerW: 0.9e-4 / areaM2,
    caseTopKPerW: 0.01,
    film: { top: 100, bottom: 100 },
    ambientC: 25,
  });
  expect(apart(junctionAt(board, 1e4 * areaM2).junctionC - 25, 50.3)).toBeLessThan(0.01);
});

// Texas Instruments SLVA959, section 2.5: holes of 8 mil in copper of 20 mil, 1.561 mm, k 400 W/(m·K). The sheet prints 5.73 K/W,
// with diameters taken for radii; right is 22.9. The other two lines: arithmetic with k 385 W/(m·K) over 1.6 mm.
test.each([
  ['SLVA959, 8 mil drilled in 20 mil', 0.2032, (0.508 - 0.2032) / 2, 1.561, 400, 22.9],
  ['0.3 mm drill, 25 µm inside it', 0.25, 0.025, 1.6, 385, 192],
  ['0.3 mm finished hole, 25 µm around it', 0.3, 0.025, 1.6, 385, 163],
])('one via – %s – its printed resistance', (_, drillMm, platingMm, lengthMm, conductivity, printed) => {
  const barrel = barrelConductanceLength({ drillMm, platingUm: platingMm * 1000, filling: 'open' });
  expect(apart(((lengthMm * 1e-3) / barrel) * (copperWPerMK / conductivity), printed)).toBeLessThan(0.01);
});

// Texas Instruments SLVA959, equations 2 and 3: 71.4 and 35.7 K/W per square of 1 oz and 2 oz at 400 W/(m·K).
test.each([
  [35, 71.4],
  [70, 35.7],
])('a square of copper – %d µm – %d K/W between two cells of the assembled board', (thicknessUm, printed) => {
  const board = plate({
    sideMm: 20,
    thicknessMm: 0.01,
    conductivity: 0.05,
    contactKPerW: 1,
    caseTopKPerW: 1e6,
    film: { top: 10, bottom: 10 },
    ambientC: 25,
  });
  const [, below] = board.stackup.copper;
  const sheet = {
    ...board,
    stackup: { ...board.stackup, copper: [{ ...below!, name: 'L1', thicknessUm }, below!] },
    pours: [
      {
        id: 'p',
        layer: 'L1',
        net: 'T',
        points: rectangle(20, 20),
        holes: [],
        coverage: 1,
        emissivity: null,
      },
    ],
  };
  const { network } = buildBoardModel(sheet, { cellMm: 1, correctLands: false });
  expect(apart((1 / network.gx[0]!) * (copperWPerMK / 400), printed)).toBeLessThan(0.01);
  expect(apart((1 / network.gy[0]!) * (copperWPerMK / 400), printed)).toBeLessThan(0.01);
});

// LX8415 data sheet, page 6: 5.0 V + 5 % to 2.5 V − 3 % at 0.5 A is 1.41 W.
test('LX8415, worked example – 5.25 V to 2.425 V at 0.5 A – 1.41 W', () => {
  const point = pointOf(
    oneRail({
      part: { outputV: 2.5, outputTolerancePct: 3, groundA: [[0, 0]], dropoutV: [[0, 1]], outputMaxA: 0.5 },
      supply: { minV: 4.75, nominalV: 5, maxV: 5.25 },
      condition: { loadsA: { U1: 0.5 } },
    }),
  );
  expect(apart(point.dissipationW!, 1.41)).toBeLessThan(0.01);
});

// TPS725 data sheet SLVS341E, page 12: 3.3 V to 2.5 V at 1 A is 0.8 W; 55 °C and 125 °C ask for 87.5 K/W.
test('TPS725, worked example – 3.3 V to 2.5 V at 1 A – 0.8 W, at most 87.5 K/W', () => {
  const point = pointOf(
    oneRail({
      part: { outputV: 2.5, outputTolerancePct: 0, groundA: [[0, 0]], dropoutV: [[0, 0.2]], outputMaxA: 1 },
      supply: { minV: 3.3, nominalV: 3.3, maxV: 3.3 },
      condition: { loadsA: { U1: 1 } },
    }),
  );
  expect(point.dissipationW).toBeCloseTo(0.8, 12);
  expect((125 - 55) / point.dissipationW!).toBeCloseTo(87.5, 9);
});
