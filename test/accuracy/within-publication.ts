import type { PublishedCase } from '#core/accuracy/published-case.ts';

/** Two boards of one publication that differ in one thing: from, to. */
const steps: readonly [what: string, from: string, to: string][] = [
  ['area: SOT-223, top copper 0.066 to 1 in²', 'D1-02', 'D1-06'],
  ['area: SOT-223, other side 0.2 to 1 in²', 'D1-07', 'D1-11'],
  ['area: TO-252, 14 to 29.7 mm', 'D4-14.0', 'D4-29.7'],
  ['area: TO-263, 0.2 to 2.2 in²', 'D6-0.2', 'D6-2.2'],
  ['area: SO-8, footprint to 600 mm²', 'D7-foot', 'D7-600'],
  ['area: TO-252, 168 to 736 mm²', 'D18-168', 'D18-736'],
  ['layers: SO-8, one layer to four', 'D7-foot', 'D7-2s2p'],
  ['layers: TO-252, one layer to four', 'D5-1L', 'D5-4L70'],
  ['layers: TO-252, two layers, back 15 to 70 mm', 'D5-2L15', 'D5-2L70'],
  ['layers: SO-8 with pad, one layer to four', 'D8-1L', 'D8-4L70'],
  ['layers: SO-8 with pad, two layers, back 15 to 70 mm', 'D8-2L15', 'D8-2L70'],
  ['vias: QFN, one to four', 'D11-1via', 'D11-4via'],
  ['vias: QFN, four to eight', 'D11-4via', 'D11-8via'],
  ['air: BGA, 0 to 1 m/s', 'D17-0', 'D17-1'],
  ['air: BGA, 0 to 3 m/s', 'D17-0', 'D17-3'],
  ['air: HTSSOP, 0 to 1.5 m/s', 'D10a', 'D10b'],
];

/** Ratios of the second to the first board, as published and as predicted. */
export function withinPublication(cases: readonly PublishedCase[]) {
  const of = (id: string) => cases.find((one) => one.id === id)!;
  return steps.map(([name, from, to]) => ({
    name,
    publishedStep: of(to).publishedKPerW / of(from).publishedKPerW,
    predictedStep: of(to).predictedKPerW / of(from).predictedKPerW,
  }));
}
