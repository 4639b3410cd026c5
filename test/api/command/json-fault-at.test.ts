import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { jsonFaultAt } from '#api/command/json-fault-at.ts';

describe('jsonFaultAt – text that is not JSON – the first token that may not stand there', () => {
  test.each([
    ['{ "a": dropwatt }', 7],
    ['{ "a" 1 }', 6],
    ['{ "a": 1, }', 10],
    ['[1, 2,]', 6],
    ['[1 2]', 3],
    ["{ 'a': 1 }", 2],
    ['{ "a": 0,5 }', 9],
    ['{ "a": 01 }', 8],
    ['[1] [2]', 4],
    ['[}', 1],
    ['{ "a": "tab\there" }', 7],
  ])('%s – %d', (source, at) => expect(jsonFaultAt(source)).toBe(at));

  test.each(['', '   ', '{ "a": ', '[1, 2', '"open'])(
    '%j ends too early – its length, or where the open text begins',
    (source) => {
      expect(jsonFaultAt(source)).toBe(source === '"open' ? 0 : source.length);
    },
  );
});

test('jsonFaultAt – whatever JSON.stringify writes, however deep – null', () => {
  fc.assert(
    fc.property(
      fc.jsonValue(),
      fc.nat(3),
      (value, indent) => jsonFaultAt(JSON.stringify(value, null, indent)) === null,
    ),
    { seed: 90531, numRuns: 300 },
  );
  expect(jsonFaultAt('['.repeat(200_000) + ']'.repeat(200_000))).toBeNull();
});

test('jsonFaultAt – a document with one character changed – a fault exactly when JSON.parse throws', () => {
  const source = JSON.stringify({ a: [1, -2.5e3, 'x\\"y', { b: null, c: true }], d: {} });
  fc.assert(
    fc.property(fc.nat(source.length - 1), fc.constantFrom(...'{}[]:,"x0 -.'.split('')), (at, character) => {
      const changed = source.slice(0, at) + character + source.slice(at + 1);
      return (jsonFaultAt(changed) === null) === parses(changed);
    }),
    { seed: 11947, numRuns: 500 },
  );
});

function parses(source: string): boolean {
  try {
    JSON.parse(source);
    return true;
  } catch {
    return false;
  }
}
