import { expect, test } from 'vitest';
import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import { mostCorrectedLands } from '#core/thermal/land-corrections.ts';
import { rectangle } from '#test/cases/board-of.ts';
import { hardBoard } from './hard-board.ts';
import { solved } from './solved-board.ts';

const board = hardBoard();
const codes = (given: Board, change: Partial<Condition> = {}, powers = { U1: 0.5, U2: 0.2, Q1: 0.1 }, cellMm = 2) =>
  solved(given, powers, change, cellMm).notices.map(({ code }) => code);

const slab = (change: Partial<Board['stackup']['dielectric'][number]>): Board => ({
  ...board,
  stackup: {
    ...board.stackup,
    dielectric: board.stackup.dielectric.map((one, k) => (k === 1 ? { ...one, ...change } : one)),
  },
});
const via = (change: Partial<Board['viaFields'][number]>): Board => ({
  ...board,
  viaFields: board.viaFields.map((one) => ({ ...one, ...change })),
});
const blowing = (speedMPerS: number): Partial<Condition> => ({ air: { kind: 'moving', speedMPerS, towardDeg: 0 } });

/** A large board, so that its Rayleigh and Reynolds numbers are large. */
const large = (mm: number): Board => ({
  ...hardBoard({ second: false, viaFields: [], sinks: [] }),
  outline: { points: rectangle(mm, mm), cutouts: [] },
});

test('a usual board in usual air – notices – none', () => {
  expect(codes(board)).toEqual([]);
  expect(codes(board, { orientation: 'vertical', altitudeM: 3000, boxRiseK: 15 })).toEqual([]);
  expect(codes(board, blowing(1))).toEqual([]);
});

test.each<[string, Board, Board]>([
  ['laminate-range', slab({ inPlaneWPerMK: 2.5 }), slab({ inPlaneWPerMK: 2 })],
  ['laminate-range', slab({ inPlaneWPerMK: 0.19 }), slab({ inPlaneWPerMK: 0.2 })],
  ['laminate-range', slab({ throughWPerMK: 1.1 }), slab({ throughWPerMK: 1 })],
  ['laminate-range', slab({ throughWPerMK: 0.14 }), slab({ throughWPerMK: 0.15 })],
  // The board is 1.45 mm thick from the first layer to the third.
  ['via-range', via({ drillMm: 3 }), via({ drillMm: 0.8 })],
  ['via-range', via({ drillMm: 0.1 }), via({ drillMm: 0.125 })],
  ['via-overlap', via({ pitchMm: 0.34 }), via({ pitchMm: 0.36 })],
  ['via-overlap', via({ pitchMm: [1, 0.3] }), via({ pitchMm: [1, 0.3], rows: 1 })],
  ['emissivity-range', emissive(0.02), emissive(0.03)],
  ['no-laminate', oneLayer(), board],
])('%s – just outside and at the end of the range – told and not told', (code, outside, inside) => {
  expect(codes(outside)).toContain(code);
  expect(codes(inside)).not.toContain(code);
});

function emissive(emissivity: number): Board {
  return { ...board, pours: board.pours.map((pour, k) => (k === 0 ? { ...pour, emissivity } : pour)) };
}

function oneLayer(): Board {
  const { stackup, pours } = hardBoard({ second: false });
  return {
    ...hardBoard({ second: false, viaFields: [], sinks: [] }),
    stackup: { ...stackup, copper: stackup.copper.slice(0, 1), dielectric: [] },
    pours: pours.filter(({ layer }) => layer === 'L1'),
  };
}

test.each<[string, Partial<Condition>, Partial<Condition>]>([
  ['altitude-range', { altitudeM: 11_500 }, { altitudeM: 11_000 }],
  ['air-range', { ambientC: 250, boxRiseK: 90 }, { ambientC: 250, boxRiseK: 20 }],
  ['box-range', { boxRiseK: 61 }, { boxRiseK: 60 }],
  ['slow-air', blowing(0.2), blowing(0.3)],
  ['fast-air', blowing(3.1), blowing(3)],
  // Bodies of 4 × 4 mm in air of 25 to 40 °C: Re 50 at about 0.2 m/s.
  ['body-range', blowing(0.15), blowing(0.25)],
])('%s – just outside and at the end of the range – told and not told', (code, outside, inside) => {
  expect(codes(board, outside)).toContain(code);
  expect(codes(board, inside)).not.toContain(code);
});

test('lying-board-range and rayleigh-range – a board of 2 m and one of 30 cm, warm all over – told by their size', () => {
  const warm = (mm: number) => {
    const given: Board = {
      ...large(mm),
      sources: [{ ...board.sources[0]!, at: [0, 0], sizeMm: [mm, mm], bodyMm: null, rotationDeg: 0 }],
    };
    return (orientation: Condition['orientation']) =>
      codes(given, { orientation }, { U1: 0, U2: 0, Q1: (500 * mm * mm) / 1e6 }, mm / 20);
  };
  expect(warm(2000)('horizontal')).toContain('lying-board-range');
  expect(warm(300)('horizontal')).toEqual([]);
  expect(warm(2000)('vertical')).toContain('rayleigh-range');
  expect(warm(2000)('vertical')).not.toContain('lying-board-range');
});

test('reynolds-range – 2 m of board in 5 m/s and 20 cm of it – told by the length', () => {
  expect(codes(large(2000), blowing(5), { U1: 1, U2: 0, Q1: 0 }, 100)).toContain('reynolds-range');
  expect(codes(large(200), blowing(3), { U1: 1, U2: 0, Q1: 0 }, 10)).not.toContain('reynolds-range');
});

test('rise-range – a part some hundred kelvins too hot – told', () => {
  expect(codes(board, {}, { U1: 9, U2: 0, Q1: 0 })).toContain('rise-range');
});

test('lands-uncorrected – more lands than are corrected – told', () => {
  const [first] = board.regulators;
  const many = (count: number): Board => ({
    ...board,
    regulators: Array.from({ length: count / 2 }, (_, k) => ({ ...first!, ref: `U${k}` })),
  });
  expect(codes(many(mostCorrectedLands + 2))).toContain('lands-uncorrected');
  expect(codes(many(mostCorrectedLands))).not.toContain('lands-uncorrected');
});

test('a fixed film – its conditions – are outside no correlation', () => {
  const storm = { ...blowing(30), filmWPerM2K: 50, altitudeM: 20_000, ambientC: -100 };
  expect(codes(board, storm)).toEqual([]);
});
