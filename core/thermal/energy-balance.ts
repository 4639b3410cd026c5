import { celsiusOffset } from '#core/units.ts';
import type { BoardModel } from './board-model.ts';
import type { HeatInput } from './solution.ts';
import { caseConductance } from './case-film.ts';
import type { Rises } from './solve-rises.ts';

/** Heat in against heat out by path, W, from the finished temperatures alone; compensated sums (Kahan). */
export function energyBalance(model: BoardModel, heat: HeatInput, solved: Rises) {
  const layers = model.layers.count;
  const into = new Sum();
  const out = new Sum();
  for (const nodes of model.packages) into.add(heat.regulatorsW.get(nodes.ref) ?? 0);
  for (const source of model.sources) if (source.weights.cell.length) into.add(heat.sourcesW.get(source.ref) ?? 0);
  for (let cell = 0; cell < solved.films.top.length; cell++) {
    out.add(solved.films.top[cell]! * solved.rise[cell * layers]!);
    out.add(solved.films.bottom[cell]! * solved.rise[cell * layers + layers - 1]!);
  }
  model.packages.forEach((nodes, index) =>
    out.add(caseConductance(nodes, solved.films.cases[index]!) * solved.rise[nodes.junction]!),
  );
  for (const { face, packages, back } of solved.films.air ? [solved.films.air.top, solved.films.air.bottom] : []) {
    for (const heatBack of back) out.add(-heatBack);
    packages.forEach((index, k) => out.add(-face.bodies[k]!.back * solved.films.air!.caseAir[index]!));
  }
  for (const sink of model.sinks) {
    const sinkRise = sink.toC === 'ambient' ? 0 : sink.toC + celsiusOffset - solved.ambientK;
    sink.weights.cell.forEach((cell, k) =>
      out.add(sink.conductanceWPerK * sink.weights.weight[k]! * (solved.rise[cell * layers + sink.layer]! - sinkRise)),
    );
  }
  const difference = Math.abs(into.total - out.total);
  return { inW: into.total, outW: out.total, imbalance: into.total > 0 ? difference / into.total : difference };
}

class Sum {
  total = 0;
  #lost = 0;
  add(value: number) {
    const corrected = value - this.#lost;
    const next = this.total + corrected;
    this.#lost = next - this.total - corrected;
    this.total = next;
  }
}
