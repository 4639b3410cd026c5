import { formatNumber } from '#core/format.ts';
import { uncertaintyWords } from '#core/result/uncertainty-words.ts';
import { deference, notCovered } from '../method-limits.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** How the figures were made, where they hold, what they do not cover and what takes precedence. */
export function methodSection({ result }: RecordInput): RecordSection {
  return {
    id: 'method',
    title: 'Method, validity and limits',
    blocks: [
      {
        kind: 'text',
        text: `Method version ${result.method}. The board is solved as layers of cells: the copper of every layer by net, laminate, via barrels and lands, with a star of thermal resistances for each package. Heat leaves by natural or forced convection and by radiation from both faces and from the case tops, with air of the stated temperature and altitude. No data-sheet θJA enters. Every solution states its residual, its heat balance and its grid error; a verdict comes from a converged solution only.`,
      },
      {
        kind: 'text',
        text: `The band (±) of a junction combines the grid error with the model error, one standard deviation each. The model error is the share of the rise by which published test boards are missed: ${modelErrors(result)} in the conditions of this record. “Close” means inside the limit, but by no more than this band.`,
      },
      { kind: 'heading', text: 'Which error dominates the widest band of each part' },
      { kind: 'list', items: widestBands(result) },
      { kind: 'heading', text: 'What the calculation does not cover' },
      { kind: 'list', items: notCovered },
      { kind: 'heading', text: 'What takes precedence' },
      ...deference.map((text) => ({ kind: 'text' as const, text })),
    ],
  };
}

/** One line for each regulator: its widest band, where, and which error it is made of. */
function widestBands(result: RecordInput['result']): string[] {
  const widest = new Map<string, { bandK: number; line: string }>();
  for (const { name, regulators } of result.conditions) {
    for (const regulator of regulators) {
      const { ref, uncertaintyK: bandK } = regulator;
      if (bandK === null || bandK <= (widest.get(ref)?.bandK ?? -1)) continue;
      widest.set(ref, {
        bandK,
        line: `${ref}, ${name}: ± ${formatNumber(bandK, 1)} K, ${uncertaintyWords(regulator)}.`,
      });
    }
  }
  return widest.size > 0 ? [...widest.values()].map(({ line }) => line) : ['No junction was evaluated.'];
}

/** Shares as they were used, read back from the result: later versions of the method may use others. */
function modelErrors(result: RecordInput['result']): string {
  const shares = result.conditions.flatMap(({ regulators }) =>
    regulators.flatMap(({ modelErrorK, ladderK }) => {
      if (modelErrorK === null || !ladderK) return [];
      const riseK = ladderK.air + ladderK.neighbours + ladderK.board + ladderK.package;
      return riseK > 0 ? [Math.round((100 * modelErrorK) / riseK)] : [];
    }),
  );
  const different = [...new Set(shares)].toSorted((a, b) => a - b);
  return different.length > 0 ? `${different.map((share) => `${share} %`).join(' and ')}` : 'not evaluated';
}
