import { createWriteStream, mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { loadavg, tmpdir } from 'node:os';
import { join } from 'node:path';
import { matrixMarket, vectorMarket } from '#core/numerics/matrix-market.ts';
import { conductanceSums } from '#core/numerics/layered-network.ts';
import { dragFrame } from './drag-frame.ts';
import { hardModel } from './hard-model.ts';
import { junctionAccuracy, landAccuracy } from './land-accuracy.ts';
import { linearSpeed, type LinearSpeed } from './linear-speed.ts';
import { installReference, startReference } from './reference.ts';
import { worstIterations } from './worst-iterations.ts';

/**
 * `make bench`: speed, memory and accuracy of the solver on hard boards that are made from seeds, as ratios against a general-purpose
 * solver in the same run. `BENCH_MATRIX=folder` writes the systems in Matrix Market form; `BENCH_QUICK=1` leaves the long parts out.
 */
const print = (line: string) => process.stdout.write(`${line}\n`);
const ms = (value: number) => `${value.toFixed(value < 10 ? 1 : 0)} ms`;
const quick = process.env['BENCH_QUICK'] === '1';

/** A goal, what was reached, and whether the must is met. */
function goal(name: string, reached: string, must: string, met: boolean, aim: string) {
  print(`${name.padEnd(58)} ${reached.padEnd(26)} must ${must.padEnd(9)} ${met ? 'met   ' : 'MISSED'} aim ${aim}`);
}

installReference();
const folder = mkdtempSync(join(tmpdir(), 'dropwatt-bench-'));
try {
  const reference = await startReference(folder);
  print(`Reference: ${reference.name}, one thread. Machine load ${loadavg()[0]!.toFixed(1)}.\n`);
  const speeds: LinearSpeed[] = [];
  for (const [cellMm, rounds] of quick
    ? ([[1, 3]] as const)
    : ([
        [1, 7],
        [0.5, 5],
        [0.25, 3],
      ] as const)) {
    const one = await linearSpeed(reference, folder, cellMm, rounds);
    speeds.push(one);
    print(
      `${one.unknowns} unknowns: ours ${ms(one.oursMs)} (first ${ms(one.firstMs)}), ${one.iterations} iterations, residual ${one.residual.toExponential(1)}; ` +
        `reference ${ms(one.referenceMs)}, ${one.referenceIterations} iterations; largest difference ${one.differenceK.toExponential(1)} K; ` +
        `with films ${ms(one.nonlinearMs)}; kernel ${one.kernelMB.toFixed(0)} MB`,
    );
  }
  reference.end();
  print('');
  const musts = [6, 5, 3];
  const aims = ['40×', '30×', '20×'];
  speeds.forEach((one, k) => {
    const ratio = one.referenceMs / one.oursMs;
    goal(
      `S${k === 0 ? 1 : 2} cold solve, ${one.unknowns} unknowns`,
      `${ratio.toFixed(1)}×`,
      `${musts[k]}×`,
      ratio >= musts[k]!,
      aims[k]!,
    );
  });
  for (const [cellMm, must] of [
    [1, 40],
    [0.5, 70],
  ] as const) {
    const boards = quick ? 6 : 50;
    const { worst, of } = worstIterations(cellMm, boards);
    goal(
      `S3 most iterations, ${boards} boards, ${cellMm} mm (${of})`,
      String(worst),
      String(must),
      worst <= must,
      '15',
    );
  }
  const share = speeds[0]!.nonlinearMs / speeds[0]!.oursMs;
  goal('S4 cold solution with films ÷ linear solve', share.toFixed(2), '1.5', share <= 1.5, '1.0');
  const { frameMs, modelMs } = dragFrame(9);
  goal(`S5 one frame at 64k, all anew (model ${ms(modelMs)})`, ms(frameMs), '33 ms', frameMs <= 33, '16 ms');
  if (!quick) {
    const land = landAccuracy();
    goal(
      'S6 isolated land of 1 mm, 16 shifts, cells of 1 mm',
      `${(100 * land).toFixed(1)} %`,
      '5 %',
      land <= 0.05,
      '1.5 %',
    );
    const { rmsK, junctions } = junctionAccuracy(0.73);
    goal(
      `S7 rms error of ${junctions} junctions against 0.1 mm`,
      `${rmsK.toFixed(2)} K`,
      '0.8 K',
      rmsK <= 0.8,
      '0.3 K',
    );
  }
  print('S8 batches of conditions and samples: no batched solution is built yet.');
  if (speeds.length === 3) {
    const peak = process.resourceUsage().maxRSS / 1024;
    goal(
      'S9 kernel at 1M unknowns (peak of this process)',
      `${speeds[2]!.kernelMB.toFixed(0)} MB (${peak.toFixed(0)} MB)`,
      '300 MB',
      speeds[2]!.kernelMB <= 300,
      '150 MB',
    );
    const exponent =
      Math.log(speeds[2]!.oursMs / speeds[0]!.oursMs) / Math.log(speeds[2]!.unknowns / speeds[0]!.unknowns);
    goal('S10 growth of time from 64k to 1M', `exponent ${exponent.toFixed(2)}`, '1.3', exponent <= 1.3, '1.05');
  }
  const target = process.env['BENCH_MATRIX'];
  if (target) {
    mkdirSync(target, { recursive: true });
    const { model, b } = hardModel(7001, 4, 1);
    const diagonal = conductanceSums(model.network).map((sum, n) => sum + model.network.anchor[n]! || 1);
    await write(join(target, 'matrix.mtx'), matrixMarket(model.network, diagonal));
    await write(join(target, 'right-side.mtx'), vectorMarket(b));
    print(`\nWrote ${join(target, 'matrix.mtx')} and right-side.mtx, ${b.length} unknowns.`);
  }
} finally {
  rmSync(folder, { recursive: true, force: true });
}

async function write(path: string, chunks: Iterable<string>) {
  const stream = createWriteStream(path);
  for (const chunk of chunks)
    if (!stream.write(chunk)) await new Promise<void>((done) => stream.once('drain', () => done()));
  await new Promise<void>((done) => stream.end(() => done()));
}
