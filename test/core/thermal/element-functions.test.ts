import { expect, test } from 'vitest';
import { airProperties, pressureRatio } from '#core/thermal/air-properties.ts';
import { copperWPerMK, patternedShare } from '#core/thermal/materials.ts';
import { naturalNusselt } from '#core/thermal/natural-convection.ts';
import { radiationFilm } from '#core/thermal/radiation.ts';
import { gridError } from '#core/thermal/grid-error.ts';
import { barrelConductanceLength } from '#core/thermal/via-conductance.ts';

test('via barrel – 0.3 mm finished hole, 25 µm, 1.6 mm – is 163 K/W at 385 W/(m·K)', () => {
  // Arithmetic: 1.6e-3 / (385 · π/4 · (0.35² − 0.3²)e-6) = 162.8; ours is 390 W/(m·K).
  const resistance = 1.6e-3 / barrelConductanceLength({ drillMm: 0.3, platingUm: 25, filling: 'open' });
  expect((resistance * copperWPerMK) / 385).toBeCloseTo(162.8, 0);
});

test('via barrel – filled with copper – conducts as a rod of its outer diameter', () => {
  const rod = (Math.PI / 4) * 0.35e-3 ** 2 * copperWPerMK;
  expect(barrelConductanceLength({ drillMm: 0.3, platingUm: 25, filling: 'copper' })).toBeCloseTo(rod, 12);
});

test('a square of 1 oz copper – 71.4 K/W at 400 W/(m·K) – follows from the sheet conductance', () => {
  // Texas Instruments SLVA959, equation 2: 71.4 K/W per square of 35 µm.
  expect(1 / (copperWPerMK * 35e-6) / (71.4 * (400 / copperWPerMK))).toBeCloseTo(1, 3);
});

test('upright plate – Cengel, example 9-2: Ra 7.65e8, Pr 0.7202 – Nu 113.3', () => {
  expect(naturalNusselt('upright', 7.65e8, 0.7202)).toBeCloseTo(113.3, 0);
});

test.each([
  ['face-up', 1e5, 0.54 * 1e5 ** 0.25],
  ['face-down', 1e5, 0.27 * 1e5 ** 0.25],
] as const)('plate %s – Ra %d – lies within 25 %% of the older fit of Cengel, table 9-1', (attitude, ra, nusselt) => {
  // The two fits differ by some 10 to 20 % in the literature; the check is against a slip, not between fits.
  expect(Math.abs(naturalNusselt(attitude, ra, 0.72) / nusselt - 1)).toBeLessThan(0.25);
});

test('radiation – ε 0.9 between 85 and 25 °C – is 7.27 W/(m²·K)', () => {
  // ε·σ·(Ts² + Ta²)·(Ts + Ta), arithmetic.
  expect(radiationFilm(0.9, 358.15, 298.15)).toBeCloseTo(7.27, 2);
});

test.each([
  [300, 0.02566, 1.58e-5],
  [333, 0.02808, 1.896e-5],
  [400, 0.0338, 2.641e-5],
])('air – %d K – agrees with the textbook tables within 3 %%', (filmK, conductivity, viscosity) => {
  // Cengel 9-5 and 9-2, Incropera 7.2; the authors differ by about 2 % among themselves.
  const air = airProperties(filmK, 1);
  expect(Math.abs(air.conductivity / conductivity - 1)).toBeLessThan(0.03);
  expect(Math.abs(air.viscosity / viscosity - 1)).toBeLessThan(0.03);
});

test.each([
  [0, 1],
  [1000, 0.887],
  [3000, 0.692],
  [5000, 0.533],
])('pressure – %d m – is that of the standard atmosphere', (altitudeM, ratio) => {
  expect(pressureRatio(altitudeM)).toBeCloseTo(ratio, 3);
});

test('background copper – covering nothing or all – conducts nothing or all', () => {
  expect(patternedShare(0)).toBe(0);
  expect(patternedShare(1)).toBe(1);
  expect(patternedShare(0.2)).toBeCloseTo(1 / 9, 12);
});

test('grid error – second order on three grids – bounds the true error', () => {
  // Values 100 + h²: the fine one is off by 1 K, Roache’s index with 1.25 is 1.25 K.
  expect(gridError([101, 104, 116])).toBeCloseTo(1.25, 6);
  // No sane order: three times the last change.
  expect(gridError([101, 104, 103])).toBe(9);
});
