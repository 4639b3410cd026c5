import { expect, test } from 'vitest';
import { bandIndex, heatColours, heatScale } from '#core/drawing/heat-scale.ts';

/** CIELAB L* of an sRGB colour (IEC 61966-2-1 to CIE 1976, white of relative luminance 1). */
function lightness(hex: string): number {
  const linear = [1, 3, 5].map((place) => {
    const share = Number.parseInt(hex.slice(place, place + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  const [r = 0, g = 0, b = 0] = linear;
  const y = 0.2126 * r + 0.7152 * g + 0.0722 * b;
  return y > 216 / 24389 ? 116 * Math.cbrt(y) - 16 : (24389 / 27) * y;
}

test('heat colours – every sample from cool to hot – lightness falls strictly and nearly straight', () => {
  const values = heatColours.map(lightness);
  expect(values).toHaveLength(212);
  for (let index = 1; index < values.length; index++) {
    expect(values[index]).toBeLessThan(values[index - 1] ?? 0);
  }
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  const middle = (values.length - 1) / 2;
  let [xy, xx, yy] = [0, 0, 0];
  values.forEach((value, index) => {
    xy += (index - middle) * (value - mean);
    xx += (index - middle) ** 2;
    yy += (value - mean) ** 2;
  });
  // R² > 0.99: the criterion for perceptual uniformity of lightness that colour-map tables use.
  expect(xy ** 2 / (xx * yy)).toBeGreaterThan(0.99);
});

test('heat scale – air 55 °C, hottest 112 °C, limits 110 and 130 °C – bands of 5 K from 55 to 130 °C', () => {
  const scale = heatScale(55, 112, [110, 130]);
  expect(scale.levels).toEqual([55, 60, 65, 70, 75, 80, 85, 90, 95, 100, 105, 110, 115, 120, 125]);
  expect([scale.minC, scale.maxC, scale.stepC]).toEqual([55, 130, 5]);
});

test('heat scale – a board barely warmer than its air – reaches to the limit all the same, so that it looks cool', () => {
  const scale = heatScale(25, 27, [110]);
  expect(scale.maxC).toBeGreaterThanOrEqual(110);
  expect(bandIndex(scale, 27)).toBe(0);
});

test('heat scale – any span – sixteen bands at most, and both ends inside', () => {
  for (const [airC, hottestC] of [
    [-40, -33],
    [20, 20.4],
    [23.7, 611],
    [85, 170],
  ] as const) {
    const scale = heatScale(airC, hottestC);
    expect(scale.levels.length).toBeLessThanOrEqual(16);
    expect(scale.minC).toBeLessThanOrEqual(airC);
    expect(scale.maxC).toBeGreaterThanOrEqual(hottestC);
  }
});

test('band of a temperature – on a border – the band above it; outside – the nearest band', () => {
  const scale = heatScale(50, 100);
  expect(scale.levels[bandIndex(scale, 60)]).toBe(60);
  expect(bandIndex(scale, 0)).toBe(0);
  expect(bandIndex(scale, 500)).toBe(scale.levels.length - 1);
});
