import type { Board } from '#core/board/document.ts';
import { type ObjectKey, idOf, kindOf, objectKeys, objectName } from '#core/board/object-key.ts';

/** What changed from one board to another, object by object, in words. */
export function objectDifferences(before: Board, after: Board): string[] {
  const lines: string[] = [];
  const keys = new Set([...objectKeys(before), ...objectKeys(after)]);
  for (const key of keys) {
    const [old, present] = [valueOf(before, key), valueOf(after, key)];
    if (JSON.stringify(old) === JSON.stringify(present)) continue;
    lines.push(`${objectName(key)} ${old === undefined ? 'added' : present === undefined ? 'deleted' : 'changed'}`);
  }
  const others = [
    ['title', 'Title'],
    ['stackup', 'Stack-up'],
    ['parts', 'Parts'],
    ['packages', 'Packages'],
    ['supplies', 'Supplies'],
    ['conditions', 'Conditions'],
    ['criteria', 'Criteria'],
  ] as const;
  for (const [field, word] of others) {
    if (JSON.stringify(before[field]) !== JSON.stringify(after[field])) lines.push(`${word} changed`);
  }
  return lines;
}

function valueOf(board: Board, key: ObjectKey): unknown {
  const id = idOf(key);
  switch (kindOf(key)) {
    case 'regulator':
      return board.regulators.find((item) => item.ref === id);
    case 'source':
      return board.sources.find((item) => item.ref === id);
    case 'pour':
      return board.pours.find((item) => item.id === id);
    case 'via-field':
      return board.viaFields.find((item) => item.id === id);
    case 'sink':
      return board.sinks.find((item) => item.id === id);
    case 'probe':
      return board.probes.find((item) => item.id === id);
    case 'cutout':
      return board.outline.cutouts[Number(id)];
    case 'outline':
      return board.outline.points;
  }
}
