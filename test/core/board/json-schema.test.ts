import { expect, test } from 'vitest';
import { boardJsonSchema } from '#core/board/json-schema.ts';

type Schema = Record<string, unknown>;

/** Every subschema with the path to it. */
function subschemas(value: unknown, path: string): { path: string; schema: Schema }[] {
  if (value === null || typeof value !== 'object') return [];
  const below = Object.entries(value).flatMap(([key, item]) => subschemas(item, `${path}/${key}`));
  return Array.isArray(value) ? below : [{ path, schema: value as Schema }, ...below];
}

const schema = boardJsonSchema();
const all = subschemas(schema, '');

test('boardJsonSchema – the whole – draft 2020-12 of the document as it may be written', () => {
  expect(schema.$schema).toBe('https://json-schema.org/draft/2020-12/schema');
  const root = (schema.$defs as Record<string, Schema>).BoardDocument!;
  // What may be left out is not required: sources, sinks, probes and supplies have defaults.
  expect(root.required).toEqual([
    'format',
    'version',
    'title',
    'outline',
    'stackup',
    'pours',
    'viaFields',
    'packages',
    'parts',
    'regulators',
    'conditions',
    'criteria',
  ]);
});

test('boardJsonSchema – every number – carries its range, and its unit in the schema', () => {
  const numbers = all.filter(({ schema: { type, const: fixed } }) => type === 'number' && fixed === undefined);
  expect(numbers.length).toBeGreaterThan(40);
  expect(
    numbers.filter(({ schema: { unit, minimum, maximum } }) => [unit, minimum, maximum].includes(undefined)),
  ).toEqual([]);
});

test('boardJsonSchema – every object with fields – refuses others', () => {
  const objects = all.filter(({ schema: { type, properties } }) => type === 'object' && properties);
  expect(objects.length).toBeGreaterThan(25);
  expect(objects.filter(({ schema: { additionalProperties } }) => additionalProperties !== false)).toEqual([]);
});
