import { expect, test } from 'vitest';
import { buildLinks, type LayeredNetwork } from '#core/numerics/layered-network.ts';
import { matrixMarket, vectorMarket } from '#core/numerics/matrix-market.ts';

/** Two cells of two layers and one node more; the link between the layers of cell 0 lies beside their own conductance. */
const network: LayeredNetwork = {
  columns: 2,
  rows: 1,
  layers: 2,
  extras: 1,
  gx: Float64Array.of(3, 5, 0, 0),
  gy: new Float64Array(4),
  gz: Float64Array.of(0.1, 0, 0, 0),
  links: buildLinks(5, [
    { a: 0, b: 1, g: 0.25 },
    { a: 4, b: 2, g: 7 },
  ]),
  anchor: Float64Array.of(1, 1, 1, 1, 1),
};

test('a network – in Matrix Market form – is its lower triangle by rows, each pair once', () => {
  const text = [...matrixMarket(network, Float64Array.of(4.35, 6.35, 11, 6, 8), ['W/K'])].join('');
  expect(text).toBe(
    [
      '%%MatrixMarket matrix coordinate real symmetric',
      '% W/K',
      '5 5 9',
      '1 1 4.35',
      '2 1 -0.35',
      '2 2 6.35',
      '3 1 -3',
      '3 3 11',
      '4 2 -5',
      '4 4 6',
      '5 3 -7',
      '5 5 8',
      '',
    ].join('\n'),
  );
});

test('a vector – in Matrix Market form – keeps every digit', () => {
  const values = Float64Array.of(1 / 3, -0, 1e-300, 12345678.901234567);
  const [, size, ...lines] = [...vectorMarket(values)].join('').trim().split('\n');
  expect(size).toBe('4 1');
  expect(lines.map(Number)).toEqual([1 / 3, 0, 1e-300, 12345678.901234567]);
});

test('a long vector – in chunks – is the same text', () => {
  const chunks = [...vectorMarket(new Float64Array(45_000).fill(2))];
  expect(chunks.length).toBeGreaterThan(1);
  expect(chunks.join('').match(/^2$/gm)).toHaveLength(45_000);
});
