import { governingConditions, governingOf } from '../governing.ts';
import type { RecordBlock, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** The board with its heat, one drawing per governing condition (all conditions where there is no regulator). */
export function drawingsSection({ board, result, fields }: RecordInput): RecordSection {
  const refs = board.regulators.map(({ ref }) => ref);
  const chosen = refs.length > 0 ? governingConditions(result, refs) : result.conditions;
  const layer = board.stackup.copper[0]!.name;
  const blocks = chosen.flatMap((condition): RecordBlock[] => {
    const field = fields.get(condition.name);
    const settings = board.conditions.find(({ name }) => name === condition.name);
    if (!field || !settings) return [];
    const limits = new Map<number, string[]>();
    for (const regulator of condition.regulators) {
      const limit = governingOf(result, regulator.ref)?.limit?.limit;
      if (limit !== null && limit !== undefined) limits.set(limit, [...(limits.get(limit) ?? []), regulator.ref]);
    }
    return [
      {
        kind: 'drawing',
        drawing: {
          condition: condition.name,
          board,
          field,
          layer,
          airC: settings.ambientC + settings.boxRiseK,
          limits: [...limits].map(([valueC, names]) => ({ valueC, label: `limit ${names.join(', ')}` })),
          junctions: condition.regulators.flatMap(({ ref, junctionC, verdict }) =>
            junctionC === null ? [] : [{ ref, junctionC, verdict }],
          ),
        },
      },
    ];
  });
  return {
    id: 'drawings',
    title: 'Board and heat',
    blocks: blocks.length > 0 ? blocks : [{ kind: 'text', text: 'No condition has a converged heat field.' }],
  };
}
