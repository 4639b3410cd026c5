import { governingByRegulator, junctionLimit } from '../governing.ts';
import type { RecordLadder, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** The rise ladder of every regulator in its governing condition. */
export function laddersSection({ board, result }: RecordInput): RecordSection {
  const governing = governingByRegulator(result);
  const ladders = board.regulators.flatMap(({ ref }): RecordLadder[] => {
    const found = governing.get(ref);
    const settings = board.conditions.find(({ name }) => name === found?.condition.name);
    const regulator = found?.regulator;
    if (!settings || !regulator?.ladderK || regulator.junctionC === null) return [];
    return [
      {
        ref,
        condition: settings.name,
        ambientC: settings.ambientC,
        steps: regulator.ladderK,
        junctionC: regulator.junctionC,
        uncertaintyK: regulator.uncertaintyK ?? 0,
        limitC: junctionLimit(regulator)?.limit ?? null,
        verdict: regulator.verdict,
      },
    ];
  });
  return {
    id: 'ladders',
    title: 'Rise ladders',
    blocks:
      ladders.length > 0
        ? [
            {
              kind: 'text',
              text: 'Each junction in its governing condition: the outside ambient, then the rises of box, preheated air, neighbours, own board and package, up to the junction.',
            },
            { kind: 'ladders', ladders },
          ]
        : [{ kind: 'text', text: 'No junction was evaluated.' }],
  };
}
