import { readFile } from 'node:fs/promises';
import { text } from 'node:stream/consumers';
import { jsonFaultAt } from './json-fault-at.ts';

/** A file, or standard input for "-", as parsed JSON. Faults name line and column. */
export async function readInput(file: string): Promise<{ value: unknown } | { fault: string }> {
  let source: string;
  try {
    source = file === '-' ? await text(process.stdin) : await readFile(file, 'utf8');
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code;
    const reasons: Record<string, string> = {
      ENOENT: 'does not exist',
      EISDIR: 'is a folder',
      EACCES: 'may not be read',
    };
    return { fault: `${file} ${reasons[code ?? ''] ?? `cannot be read (${code})`}` };
  }
  const json = source.replace(/^\uFEFF/, '');
  try {
    return { value: JSON.parse(json) };
  } catch {
    return { fault: `${file === '-' ? 'standard input' : file} is not JSON${placeOf(json)}` };
  }
}

function placeOf(source: string): string {
  const position = jsonFaultAt(source);
  if (source.trim() === '') return ': it is empty';
  if (position === null || position === source.length) return ': it ends too early';
  const before = source.slice(0, position).split('\n');
  return `, line ${before.length}, column ${before.at(-1)!.length + 1}`;
}
