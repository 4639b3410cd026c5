import { readdirSync, readFileSync } from 'node:fs';
import { loadavg } from 'node:os';
import { join } from 'node:path';
import { readBoard } from '#core/board/read-board.ts';
import { measureBoard } from './measure-board.ts';

/** `make bench`: the boards of the demo, each with the figures that can be compared between machines as ratios. */
const folder = join(import.meta.dirname, '../../db/seeds/demo');
const files = readdirSync(folder).filter((file) => /revision.*\.json$/.test(file));
const print = (line: string) => process.stdout.write(`${line}\n`);

print(
  `Machine load ${loadavg()[0]!.toFixed(1)}; medians of five rounds; yardstick: conjugate gradients with the diagonal.`,
);
for (const file of files) {
  const reading = readBoard(JSON.parse(readFileSync(join(folder, file), 'utf8')));
  if (!reading.ok) throw new Error(`${file}: ${reading.faults[0]?.message ?? 'not a board'}`);
  const one = measureBoard(reading.board);
  const ms = (value: number) => `${value.toFixed(value < 10 ? 1 : 0)} ms`;
  print(`
${file} · ${one.board}
  unknowns                 ${one.unknowns}
  model from the document  ${ms(one.buildMs)}
  cold solution            ${ms(one.solveMs)} (films settled, one condition)
  buffers                  ${one.buffersMB.toFixed(0)} MB
  one linear solution      ${ms(one.linearMs)}, ${one.iterations} iterations
  yardstick                ${ms(one.yardstickMs)}, ${one.yardstickIterations} iterations
  ratio                    ${(one.yardstickMs / one.linearMs).toFixed(1)} in time, ${(one.yardstickIterations / one.iterations).toFixed(1)} in iterations
  largest difference       ${one.differenceK.toExponential(1)} K`);
}
print(`\nPeak memory of this process ${Math.round(process.resourceUsage().maxRSS / 1024)} MB`);
