import fc from 'fast-check';
import { expect, test } from 'vitest';
import { canonicalJson } from '#core/board/canonical.ts';
import { hashBoard } from '#core/board/hash-board.ts';
import { readBoard } from '#core/board/read-board.ts';
import { changedDocument } from './changed-document.ts';
import { smallDocument } from './small-board.ts';

test('canonicalJson – the sorting example of RFC 8785, 3.2.3 – keys by UTF-16 code units', () => {
  const sample = {
    '\u20ac': 'Euro Sign',
    '\r': 'Carriage Return',
    '\ufb33': 'Hebrew Letter Dalet With Dagesh',
    '1': 'One',
    '\ud83d\ude00': 'Emoji: Grinning Face',
    '\u0080': 'Control',
    '\u00f6': 'Latin Small Letter O With Diaeresis',
  };
  expect(
    Object.values(
      JSON.parse(
        `[${canonicalJson(sample)
          .slice(1, -1)
          .replaceAll(/"[^"]*":/g, '')}]`,
      ),
    ),
  ).toEqual([
    'Carriage Return',
    'One',
    'Control',
    'Latin Small Letter O With Diaeresis',
    'Euro Sign',
    'Emoji: Grinning Face',
    'Hebrew Letter Dalet With Dagesh',
  ]);
});

test('canonicalJson – numbers of RFC 8785, appendix B – their shortest form', () => {
  expect(canonicalJson([-0, 5e-324, 1e21, 1e-7, 333333333.3333333, 0.000001])).toBe(
    '[0,5e-324,1e+21,1e-7,333333333.3333333,0.000001]',
  );
});

test('hashBoard – keys of every object in another order – the same hash', () => {
  const two = changedDocument(({ packages }) => (packages.crate = { ...packages.box!, name: 'Crate' }));
  const hash = hashOf(two);
  expect(hash).toMatch(/^sha256:[0-9a-f]{64}$/);
  fc.assert(
    fc.property(fc.infiniteStream(fc.nat()), (numbers) => hashOf(shuffled(two, numbers)) === hash),
    { seed: 40217, numRuns: 30 },
  );
});

test('hashBoard – a pour moved by a nanometre, or a default stated – another hash', () => {
  const moved = changedDocument((document) => (document.pours[0]!.points[0] = [5.000001, 5]));
  const stated = changedDocument((document) => (document.stackup.emissivityTop = 0.9));
  expect(new Set([hashOf(smallDocument), hashOf(moved), hashOf(stated)]).size).toBe(3);
});

function hashOf(document: unknown): string {
  const reading = readBoard(document);
  if (!reading.ok) throw new Error(JSON.stringify(reading.faults));
  return hashBoard(reading.board, reading.assumptions);
}

function shuffled(value: unknown, numbers: Iterator<number>): unknown {
  if (Array.isArray(value)) return value.map((item) => shuffled(item, numbers));
  if (value === null || typeof value !== 'object') return value;
  const entries = Object.entries(value).map(([key, item]) => ({
    place: Number(numbers.next().value),
    entry: [key, shuffled(item, numbers)] as const,
  }));
  return Object.fromEntries(entries.sort((a, b) => a.place - b.place).map(({ entry }) => entry));
}
