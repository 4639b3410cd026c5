import { spawnSync } from 'node:child_process';
import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { errorOf, errorStatistics, movingCases, stillCases } from '#core/accuracy/error-statistics.ts';
import { modelErrorShare } from '#core/accuracy/model-error.ts';
import type { PublishedCase } from '#core/accuracy/published-case.ts';
import { boardOf, predict, published } from './published-board.ts';
import { withinPublication } from './within-publication.ts';

/** `make accuracy`: every published board by one convention. `WRITE=1` keeps the table for the product. */
const print = (line: string) => process.stdout.write(`${line}\n`);
const percent = (share: number) => `${share >= 0 ? '+' : '−'}${Math.abs(100 * share).toFixed(1)} %`;

const cases = published.map(predict);
print('case            published  predicted  ratio  grade  1σ      inside 2σ');
const inside = (one: PublishedCase) =>
  Math.abs(errorOf(one)) * one.publishedKPerW <= 2 * shareOf(one) * one.predictedKPerW;
const shareOf = (one: PublishedCase) => modelErrorShare(boardOf(one.id).conditions[0]!, one.path);
for (const one of cases) {
  const { id, publishedKPerW, predictedKPerW, grade, contradiction } = one;
  print(
    `${id.padEnd(16)}${publishedKPerW.toFixed(1).padStart(8)}${predictedKPerW.toFixed(1).padStart(11)}` +
      `${(predictedKPerW / publishedKPerW).toFixed(2).padStart(8)}  ${grade.padEnd(5)}  ${(100 * shareOf(one)).toFixed(1).padStart(4)} %  ` +
      (contradiction ? `not counted: ${contradiction}` : inside(one) ? 'yes' : 'NO'),
  );
}
const still = stillCases(cases);
print('\n                       cases   mean     mean abs.  RMS      worst');
const line = (name: string, of: PublishedCase[]) => {
  const { cases: n, mean, meanAbsolute, rms, worst } = errorStatistics(of);
  print(
    `${name.padEnd(24)}${String(n).padStart(4)}  ${percent(mean).padStart(8)}  ${percent(meanAbsolute).padStart(8)}  ${percent(rms).padStart(8)}  ${percent(worst).padStart(8)}`,
  );
};
for (const family of new Set(still.map((one) => one.family)))
  line(
    family,
    still.filter((one) => one.family === family),
  );
for (const path of ['tab', 'pad', 'leads'] as const)
  line(
    `heat path: ${path}`,
    still.filter((one) => one.path === path),
  );
line('still air', still);
line('moving air', movingCases(cases));
print('\nSteps within one publication: published, predicted, ratio of the two');
let steps = 0;
for (const { name, publishedStep, predictedStep } of withinPublication(cases)) {
  const ratio = predictedStep / publishedStep;
  if (Math.abs(ratio - 1) > 0.15) steps++;
  print(
    `${name.padEnd(52)}${publishedStep.toFixed(2)}  ${predictedStep.toFixed(2)}  ${ratio.toFixed(2)}${Math.abs(ratio - 1) > 0.15 ? '  beyond 15 %' : ''}`,
  );
}
const all = errorStatistics(still);
const covered = still.filter(inside).length / still.length;
print(
  `\nStill air: mean absolute ${percent(all.meanAbsolute)} (must 11, aim 7), RMS ${percent(all.rms)} (must 14, aim 9), ` +
    `inside twice the stated uncertainty ${(100 * covered).toFixed(0)} % (must 90); ${steps} steps beyond 15 %.`,
);
if (all.meanAbsolute > 0.11 || all.rms > 0.14 || covered < 0.9) process.exitCode = 1;
if (process.env['WRITE'] === '1') {
  const file = join(import.meta.dirname, '../../core/accuracy/published-accuracy.json');
  const rows = cases.map((one) => ({ ...one, predictedKPerW: Number(one.predictedKPerW.toPrecision(5)) }));
  writeFileSync(file, JSON.stringify(rows));
  spawnSync('npx', ['prettier', '--write', file]);
}
