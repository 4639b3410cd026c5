import { readFile } from 'node:fs/promises';
import { text } from 'node:stream/consumers';

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
  try {
    return { value: JSON.parse(source.replace(/^\uFEFF/, '')) };
  } catch (error) {
    return {
      fault: `${file === '-' ? 'standard input' : file} is not JSON${placeOf(source, (error as Error).message)}`,
    };
  }
}

function placeOf(source: string, message: string): string {
  const position = /position (\d+)/.exec(message)?.[1];
  if (position === undefined) return source.trim() === '' ? ': it is empty' : ': it ends too early';
  const before = source.slice(0, Number(position)).split('\n');
  return `, line ${before.length}, column ${before.at(-1)!.length + 1}`;
}
