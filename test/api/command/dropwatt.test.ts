import { spawn } from 'node:child_process';
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { text } from 'node:stream/consumers';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { BoardDocument } from '#core/board/document.ts';
import { checkResult } from '#core/result/result.ts';
import { soundBoard } from '#test/core/derating/sound-board.ts';

const launcher = fileURLToPath(new URL('../../../api/command/dropwatt.js', import.meta.url));
let folder: string;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'dropwatt-command-'));
});
afterAll(async () => {
  await rm(folder, { recursive: true });
});

/** Runs the command line from a folder that is not the project's, as an installed one would be. */
async function dropwatt(words: readonly string[], input = '') {
  const child = spawn(process.execPath, [launcher, ...words], { cwd: folder, stdio: 'pipe' });
  child.stdin.end(input);
  const ended = new Promise<number | null>((resolve) => child.on('close', resolve));
  const [output, errors, code] = await Promise.all([text(child.stdout), text(child.stderr), ended]);
  return { output, errors, code };
}

/** A cool board in one condition, spoiled a little. */
const document = (change: (document: BoardDocument) => void = () => undefined) =>
  JSON.stringify(
    soundBoard((board) => {
      board.conditions.pop();
      board.conditions[0]!.loadsA = { U1: 0.03 };
      change(board);
    }),
  );
const check = (input: string, ...words: string[]) => dropwatt(['check', '-', '--cell', '2', ...words], input);

describe('dropwatt check – exit code – 0 fine, 1 over or open, 2 not valid', () => {
  test('a board within its limits, from a file – 0 and one JSON result', async () => {
    await writeFile(join(folder, 'board.json'), document());
    const { output, errors, code } = await dropwatt(['check', 'board.json', '--cell', '2']);
    expect({ code, errors }).toEqual({ code: 0, errors: '' });
    expect(checkResult.parse(JSON.parse(output))).toMatchObject({ format: 'dropwatt-result', verdict: 'within' });
  });

  test('a limit that is passed – 1', async () => {
    const { output, code } = await check(
      document((board) => (board.criteria.rules = [{ quantity: 'junctionC', atMostC: 61 }])),
    );
    expect(code).toBe(1);
    expect(JSON.parse(output)).toMatchObject({ verdict: 'over' });
  });

  test('a load that is missing – 1, never a pass', async () => {
    const { output, code } = await check(document((board) => (board.conditions[0]!.loadsA = {})));
    expect(code).toBe(1);
    expect(JSON.parse(output)).toMatchObject({ verdict: 'not evaluated' });
  });

  test('a document with two faults – 2; both as JSON and as lines with their paths', async () => {
    const spoiled = JSON.parse(document()) as Record<string, unknown>;
    delete spoiled.title;
    spoiled.colour = 'green';
    const { output, errors, code } = await check(JSON.stringify(spoiled));
    expect(code).toBe(2);
    expect(JSON.parse(output)).toEqual({
      faults: [
        { path: 'title', message: 'is missing; it must be text of 1 to 200 characters' },
        { path: 'colour', message: 'is not a known field' },
      ],
    });
    expect(errors).toBe('title: is missing; it must be text of 1 to 200 characters\ncolour: is not a known field\n');
  });

  test('text that is not JSON – 2, with line and column', async () => {
    const { errors, code } = await check('{\n  "format": dropwatt }');
    expect({ errors, code }).toEqual({ errors: 'standard input is not JSON, line 2, column 13\n', code: 2 });
  });
});

describe('dropwatt – words that make no sense – 2, and what is allowed', () => {
  test.each<[string, string[], string]>([
    ['no command', [], 'dropwatt: a command is missing; see dropwatt --help\n'],
    ['an unknown command', ['chek'], 'dropwatt: "chek" is no command; see dropwatt --help\n'],
    ['no file', ['check'], 'check needs a file, or - for standard input\n'],
    ['a file that is not there', ['check', 'gone.json'], 'gone.json does not exist\n'],
    ['a cell of nothing', ['check', '-', '--cell', '0'], '--cell must be a number from 0.05 to 10 mm, found "0"\n'],
  ])('%s', async (_, words, errors) => {
    expect(await dropwatt(words)).toMatchObject({ errors, code: 2 });
  });

  test('an option that does not exist – named', async () => {
    const { errors, code } = await dropwatt(['check', '-', '--fast']);
    expect(code).toBe(2);
    expect(errors).toContain('--fast');
  });

  test('a condition that does not exist – those that do are listed', async () => {
    const { errors, code } = await check(document(), '--condition', 'Warm');
    expect(code).toBe(2);
    expect(errors).toBe('--condition: there is no condition "Warm"; there is "Hot"\n');
  });
});

test('dropwatt check --table – for people – verdicts, units, findings and cautions in words', async () => {
  const { output, code } = await check(document(), '--table');
  expect(code).toBe(0);
  for (const words of ['Hot: within', 'junction °C', 'rise in K', '[warn] Only one operating condition', 'CAUTION ']) {
    expect(output).toContain(words);
  }
});

test('dropwatt check --table – an input over its rule beside a cool junction – which limit, by how much, after which source', async () => {
  const rules = [
    { quantity: 'junctionC' as const, belowMaxK: 25, source: 'tests' },
    { quantity: 'inputV' as const, ratio: 0.7, source: 'voltage rule' },
  ];
  const { output, code } = await check(
    document((board) => {
      board.criteria.rules = rules;
      board.regulators[0]!.dropper = null;
    }),
    '--table',
  );
  expect(code).toBe(1);
  // 0.7 · 20 V = 14 V against 15 V
  expect(output.replaceAll('\u00a0', ' ')).toContain(
    'U1 over: input 15.00 V, limit 14.00 V, margin −1.00 V (Tests: voltage rule)',
  );
});

test('dropwatt check --condition – one of two – that one alone', async () => {
  const both = JSON.stringify(soundBoard());
  const { output } = await check(both, '--condition', 'Cold');
  expect((JSON.parse(output) as { conditions: { name: string }[] }).conditions.map(({ name }) => name)).toEqual([
    'Cold',
  ]);
});

test('dropwatt check --pdf – a file – the record as a PDF beside the result', async () => {
  const { errors, code } = await check(document(), '--pdf', 'record.pdf');
  expect({ errors, code }).toEqual({ errors: '', code: 0 });
  expect((await readFile(join(folder, 'record.pdf'))).subarray(0, 5).toString()).toBe('%PDF-');
});

test('dropwatt check --pdf – into a folder that is not there – 2, and which option', async () => {
  const { errors, code } = await check(document(), '--pdf', 'gone/record.pdf');
  expect(code).toBe(2);
  expect(errors).toContain('--pdf: cannot be written');
});

test('dropwatt schema – the JSON Schema of the document', async () => {
  const { output, code } = await dropwatt(['schema']);
  expect(code).toBe(0);
  expect(JSON.parse(output)).toMatchObject({ $schema: 'https://json-schema.org/draft/2020-12/schema' });
});

test('dropwatt --help – what it does, every option and exit code, and the standing caution', async () => {
  const { output, code } = await dropwatt(['--help']);
  expect(code).toBe(0);
  for (const words of ['--table', '--condition', '--cell', '--pdf', '  3  ', 'Heat burns'])
    expect(output).toContain(words);
});
