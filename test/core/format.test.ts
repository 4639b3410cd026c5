import { expect, test } from 'vitest';
import { formatChange, formatGiven, formatNumber, formatQuantity, formatRatio } from '#core/format.ts';

const space = '\u00a0';

test('quantity – decimals follow the unit, joined by a no-break space', () => {
  expect(formatQuantity(121, '°C')).toBe(`121.0${space}°C`);
  expect(formatQuantity(1.285, 'K/W')).toBe(`1.3${space}K/W`);
  expect(formatQuantity(0.13, 'A')).toBe(`0.130${space}A`);
  expect(formatQuantity(90, '°')).toBe('90°');
});

test('quantity – null, undefined and what is not finite – an en dash and no unit', () => {
  for (const value of [null, undefined, Number.NaN, Infinity]) expect(formatQuantity(value, '°C')).toBe('–');
});

test('number – below zero – a true minus, and no minus before a rounded zero', () => {
  expect(formatNumber(-11, 1)).toBe('\u221211.0');
  expect(formatNumber(-0.04, 1)).toBe('0.0');
});

test('change – sign in front of a rise, none at zero', () => {
  expect(formatChange(3.21, 'K')).toBe(`+3.2${space}K`);
  expect(formatChange(-3.21, 'K')).toBe(`\u22123.2${space}K`);
  expect(formatChange(0.01, 'K')).toBe(`0.0${space}K`);
});

test('ratio and given value – percent and as many digits as the value has', () => {
  expect(formatRatio(0.834)).toBe(`83${space}%`);
  expect(formatGiven(0.0004, 'A')).toBe(`0.0004${space}A`);
  expect(formatGiven(0.1 + 0.2)).toBe('0.3');
});
