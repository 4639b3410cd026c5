import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** How the figures were made, where they hold, and what they do not cover. */
export function methodSection({ result }: RecordInput): RecordSection {
  return {
    id: 'method',
    title: 'Method and its limits',
    blocks: [
      {
        kind: 'text',
        text: `Method version ${result.method}. The board is solved as layers of cells with the copper of every layer by net, laminate, via barrels, lands, and a star of thermal resistances for each package; heat leaves by natural or forced convection and by radiation from both faces and from the case tops. No data-sheet θJA is used. Each solution states its residual, its energy balance and its grid error.`,
      },
      {
        kind: 'text',
        text: 'The band of a junction combines the grid error with the model error, which is taken from published test boards: one standard deviation of 13 % of the rise in still air and 26 % in moving air. “Close” means inside the limit, but by no more than this band.',
      },
      {
        kind: 'text',
        text: 'Not covered: transients and start-up, ageing and dust, solder voids, heat that leaves through cables and connectors, sunlight, potting, and parts that are not drawn. Package values marked as typical are those of the outline, not of the part. Steady state is assumed.',
      },
      {
        kind: 'text',
        text: 'A calculation is no measurement: verify it on the built board before people or property depend on it. Local codes, product standards and the judgement of a licensed engineer go before this record.',
      },
    ],
  };
}
