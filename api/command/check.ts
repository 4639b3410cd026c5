import { writeFile } from 'node:fs/promises';
import { parseArgs } from 'node:util';
import { readBoard } from '#core/board/read-board.ts';
import { checkBoard } from '#core/check/check-board.ts';
import { BoardTooLarge } from '#core/thermal/cell-grid.ts';
import { exitCodeOf } from './exit-code-of.ts';
import { exitCodes } from './exit-codes.ts';
import { print, printError } from './print.ts';
import { readInput } from './read-input.ts';
import { resultTable } from './result-table.ts';

const finestCellMm = 0.05;
const coarsestCellMm = 10;

type Options = {
  file: string;
  table: boolean;
  conditions: string[] | undefined;
  cellMm: number | undefined;
  pdf: string | undefined;
};

/** `dropwatt check`. @returns the exit code */
export async function check(words: readonly string[]): Promise<number> {
  const options = readOptions(words);
  if ('fault' in options) return await refuse([{ path: '', message: options.fault }]);
  const input = await readInput(options.file);
  if ('fault' in input) return await refuse([{ path: '', message: input.fault }]);
  const reading = readBoard(input.value);
  if (!reading.ok) return await refuse(reading.faults);
  const { board, assumptions } = reading;
  const unknown = options.conditions?.find((name) => !board.conditions.some((condition) => condition.name === name));
  if (unknown !== undefined) {
    const names = board.conditions.map((condition) => `"${condition.name}"`).join(', ') || 'none';
    return await refuse([{ path: '--condition', message: `there is no condition "${unknown}"; there is ${names}` }]);
  }
  try {
    const { result, fields } = checkBoard(board, assumptions, {
      conditions: options.conditions,
      cellMm: options.cellMm,
      gridError: true,
      now: () => performance.now(),
    });
    if (options.pdf !== undefined) {
      // Loaded only when asked for: most runs need no PDF.
      const { recordOfDocument } = await import('./record-of-document.ts');
      await writeFile(options.pdf, await recordOfDocument(board, result, fields));
    }
    await print(options.table ? resultTable(board, result) : `${JSON.stringify(result, null, 2)}\n`);
    return exitCodeOf(board, result);
  } catch (error) {
    if (error instanceof BoardTooLarge) return await refuse([{ path: 'outline', message: error.message }]);
    if (options.pdf !== undefined && (error as NodeJS.ErrnoException).syscall === 'open') {
      return await refuse([{ path: '--pdf', message: `cannot be written: ${(error as Error).message}` }]);
    }
    throw error;
  }
}

async function refuse(faults: readonly { path: string; message: string }[]): Promise<number> {
  for (const { path, message } of faults) printError(path ? `${path}: ${message}` : message);
  await print(`${JSON.stringify({ faults }, null, 2)}\n`);
  return exitCodes.invalid;
}

function readOptions(words: readonly string[]): Options | { fault: string } {
  try {
    const { values, positionals } = parseArgs({
      args: [...words],
      allowPositionals: true,
      options: {
        table: { type: 'boolean', default: false },
        condition: { type: 'string', multiple: true },
        cell: { type: 'string' },
        pdf: { type: 'string' },
      },
    });
    const [file, more] = positionals;
    if (file === undefined) return { fault: 'check needs a file, or - for standard input' };
    if (more !== undefined) return { fault: `check takes one file, found "${more}" as well` };
    const cellMm = values.cell === undefined ? undefined : Number(values.cell);
    if (cellMm !== undefined && !(cellMm >= finestCellMm && cellMm <= coarsestCellMm)) {
      return { fault: `--cell must be a number from ${finestCellMm} to ${coarsestCellMm} mm, found "${values.cell}"` };
    }
    return { file, table: values.table, conditions: values.condition, cellMm, pdf: values.pdf };
  } catch (error) {
    return { fault: (error as Error).message };
  }
}
