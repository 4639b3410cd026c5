import { governingOf } from '../governing.ts';
import type { RecordLadder, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** The rise ladder of every regulator in its governing condition. */
export function laddersSection({ board, result }: RecordInput): RecordSection {
  const ladders = board.regulators.flatMap(({ ref }): RecordLadder[] => {
    const governing = governingOf(result, ref);
    const settings = board.conditions.find(({ name }) => name === governing?.condition.name);
    const regulator = governing?.regulator;
    if (!settings || !regulator?.ladderK || regulator.junctionC === null) return [];
    return [
      {
        ref,
        condition: settings.name,
        ambientC: settings.ambientC,
        steps: regulator.ladderK,
        junctionC: regulator.junctionC,
        uncertaintyK: regulator.uncertaintyK ?? 0,
        limitC: governing?.limit?.limit ?? null,
        verdict: regulator.verdict,
      },
    ];
  });
  return {
    id: 'ladders',
    title: 'Rise ladders',
    blocks:
      ladders.length > 0 ? [{ kind: 'ladders', ladders }] : [{ kind: 'text', text: 'No junction was evaluated.' }],
  };
}
