import type { RecordHeader } from '#core/record/record-document.ts';
import { stateWords } from '#core/record/state-words.ts';
import { pairsSetter } from './blocks/pairs.ts';
import { copper, type Sheet } from './sheet.ts';
import { rule, tagged } from './structure.ts';
import { lineHeight, linesOf, writeLines } from './typeset.ts';
import { drawVerdict } from './verdict-mark.ts';

/** Assembly and revision as they stand at the head and at the foot: "PCA-0617 Main board, revision B". */
export function subjectOf({ assembly, letter }: RecordHeader): string {
  return letter ? `${assembly}, revision ${letter}` : assembly;
}

/** Title block of the first page. */
export function drawHeader(sheet: Sheet, header: RecordHeader) {
  const title = { face: 'semibold', size: 20 } as const;
  tagged(sheet, 'H1', () => writeLines(sheet, ['Derating record'], sheet.left, sheet.y, sheet.width, title));
  sheet.y += lineHeight(title.size) + 2;
  rule(sheet, 1.6, copper);
  sheet.y += 7;
  const name = { face: 'semibold', size: 13 } as const;
  const lines = linesOf(sheet, subjectOf(header), sheet.width, name);
  tagged(sheet, 'P', () => writeLines(sheet, lines, sheet.left, sheet.y, sheet.width, name));
  sheet.y += lines.length * lineHeight(name.size) + 4;
  const words = { face: 'semibold', size: 11 } as const;
  tagged(sheet, 'P', () => {
    drawVerdict(sheet, header.verdict, sheet.left, sheet.y + 3, 9);
    const text = `Verdict: ${header.verdict}  ·  ${stateWords[header.state]}`;
    writeLines(sheet, [text], sheet.left + 15, sheet.y, sheet.width - 15, words);
  });
  sheet.y += lineHeight(words.size) + 7;
  pairsSetter.draw(sheet, { kind: 'pairs', rows: header.facts });
}
