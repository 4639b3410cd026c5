import { expect, test } from 'vitest';
import { readQuantity } from '#web/ui/read-quantity.ts';

/** Typed text, unit of the field, value; factors by definition (1 in = 25.4 mm, 0 °C = 32 °F), copper 34.3 µm for 1 oz by IPC-4562. */
const read: [string, string, number][] = [
  ['0.035', 'mm', 0.035],
  ['1 000', 'm', 1000],
  ['1.234,5', 'm', 1234.5],
  ['1,234.5', 'm', 1234.5],
  ['\u22125', '°C', -5],
  ['131 F', '°C', 55],
  ['35um', 'µm', 35],
  ['1 oz', 'µm', 34.3],
  ['1.4mil', 'µm', 35.56],
  ['130 mA', 'A', 0.13],
  ['4k', 'Ω', 4000],
  ['200 ft/min', 'm/s', 1.016],
  ['0.3 W/mK', 'W/(m·K)', 0.3],
  ['1e-3', 'W', 0.001],
  ['0.4in', 'mm', 10.16],
  ['12 mil', 'mm', 0.3048],
  ['200 lfm', 'm/s', 1.016],
  ['2*3.5', 'mm', 7],
  ['3 × 0,1', 'mm', 0.3],
  ['2*0.4in', 'mm', 20.32],
  ['25/4 mm', 'mm', 6.25],
  ['10/4*2', 'mm', 5],
  ['-2*3', 'mm', -6],
  ['12 mK/W', 'K/W', 0.012],
  // A rise: 18 °F are 10 K, and 18 °C are 18 K; no zero point is shifted.
  ['18 °F', 'K', 10],
  ['18 °C', 'K', 18],
  // A temperature, worked out before its unit is turned: 2 × 61 °F = 122 °F = 50 °C.
  ['2*61 °F', '°C', 50],
];

test.each(read)('typed quantity – %s in a field of %s – %d', (text, unit, value) => {
  const result = readQuantity(text, unit);
  expect(result).toEqual({ value: expect.closeTo(value, 9) as number });
});

test.each(['1e400', '--1', 'abc', '1,000', '5 V', '1.2.3,4,5', '2*', '*3', '1/0', '2 mm*3', '2**3', '1,000*2'])(
  'typed quantity – %s in mm – refused with a reason',
  (text) => {
    const result = readQuantity(text, 'mm');
    expect(result).toHaveProperty('error');
  },
);
