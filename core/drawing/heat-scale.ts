import { interpolateInferno } from 'd3-scale-chromatic';

/** Bands of equal width from cool (pale) to hot (dark), the same in both themes and in print. */
export type HeatScale = {
  minC: number;
  maxC: number;
  stepC: number;
  /** Lower borders of the bands, rising, the first at `minC`. */
  levels: readonly number[];
};

const widths = [0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 25, 50, 100, 200];
const mostBands = 16;

/**
 * Scale of one picture. It starts at the air and reaches at least to the limits, so that a cool board is never shown hot.
 * @param airC temperature of the air around the board, °C
 * @param hottestC highest temperature to be shown, °C
 * @param limitsC limits that the scale must hold, °C
 */
export function heatScale(airC: number, hottestC: number, limitsC: readonly number[] = []): HeatScale {
  const top = Math.max(hottestC, airC + 5, ...limitsC);
  const stepC = widths.find((width) => (top - airC) / width <= mostBands - 1) ?? 500;
  const minC = Math.floor(airC / stepC) * stepC;
  const count = Math.max(1, Math.ceil((top - minC) / stepC));
  const levels = Array.from({ length: count }, (_, index) => tidy(minC + index * stepC));
  return { minC, maxC: tidy(minC + count * stepC), stepC, levels };
}

/** Colour of the band whose lower border is `levels[index]`. */
export function bandColour(scale: HeatScale, index: number): string {
  const share = scale.levels.length === 1 ? 0 : index / (scale.levels.length - 1);
  return heatColours[Math.round(share * (heatColours.length - 1))] ?? '';
}

export function bandIndex(scale: HeatScale, temperatureC: number): number {
  const index = Math.floor((temperatureC - scale.minC) / scale.stepC + 1e-9);
  return Math.min(scale.levels.length - 1, Math.max(0, index));
}

const palest = 251;
const darkest = 40;

/**
 * 212 colours, `#rrggbb`, cool to hot. Inferno (Smith and van der Walt, matplotlib 1.5) read from its light end:
 * perceptually uniform, ordered by lightness, kept in order by every kind of colour-vision deficiency.
 * Its darkest part is left out so that lines and labels stay readable on it.
 */
export const heatColours: readonly string[] = Array.from({ length: palest - darkest + 1 }, (_, index) =>
  interpolateInferno((palest - index + 0.5) / 256),
);

/** Removes the dust of binary fractions from multiples of the step. */
function tidy(value: number): number {
  return Number(value.toPrecision(10));
}
