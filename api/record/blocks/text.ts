import type { RecordBlock } from '#core/record/record-document.ts';
import type { BlockSetter } from '../block.ts';
import { copper, ensure, type Sheet } from '../sheet.ts';
import { group, tagged, type StructureType } from '../structure.ts';
import { lineHeight, linesOf, writeLines, type Style } from '../typeset.ts';

type Of<K extends RecordBlock['kind']> = Extract<RecordBlock, { kind: K }>;

const headingStyle = { face: 'semibold', size: 10, colour: copper } as const;
const textStyle = { size: 9 } as const;

export const headingSetter: BlockSetter<Of<'heading'>> = {
  lead: (sheet, { text }) => linesOf(sheet, text, sheet.width, headingStyle).length * lineHeight(10) + 7,
  draw(sheet, { text }) {
    sheet.y += 4;
    const lines = linesOf(sheet, text, sheet.width, headingStyle);
    tagged(sheet, 'H3', () => writeLines(sheet, lines, sheet.left, sheet.y, sheet.width, headingStyle));
    sheet.y += lines.length * lineHeight(10) + 3;
  },
};

export const textSetter: BlockSetter<Of<'text'>> = {
  lead: (sheet, { text }) => Math.min(6, linesOf(sheet, text, sheet.width, textStyle).length) * lineHeight(9) + 6,
  draw(sheet, { text }) {
    flow(sheet, linesOf(sheet, text, sheet.width, textStyle), sheet.left, sheet.width, textStyle, 'P');
    sheet.y += 6;
  },
};

const indent = 12;

export const listSetter: BlockSetter<Of<'list'>> = {
  lead: () => 2 * lineHeight(9),
  draw(sheet, { items }) {
    group(sheet, 'L', () => {
      for (const item of items) {
        const lines = linesOf(sheet, item, sheet.width - indent, textStyle);
        flow(sheet, lines, sheet.left + indent, sheet.width - indent, textStyle, 'LI', '–');
        sheet.y += 2;
      }
    });
    sheet.y += 6;
  },
};

/** Lines over as many pages as they need; a page takes at least two of them, or what is left. */
function flow(
  sheet: Sheet,
  lines: readonly string[],
  left: number,
  width: number,
  style: Style,
  type: StructureType,
  sign = '',
) {
  const height = lineHeight(style.size);
  let rest = lines;
  while (rest.length > 0) {
    ensure(sheet, Math.min(2, rest.length) * height);
    const room = Math.max(1, Math.floor((sheet.bottom - sheet.y) / height));
    const piece = rest.slice(0, room);
    tagged(sheet, type, () => {
      if (sign && rest === lines) writeLines(sheet, [sign], left - indent + 2, sheet.y, indent, style);
      writeLines(sheet, piece, left, sheet.y, width, style);
    });
    sheet.y += piece.length * height;
    rest = rest.slice(room);
  }
}
