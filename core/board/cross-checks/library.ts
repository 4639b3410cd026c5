import type { Report } from '../cross-check.ts';
import type { Board } from '../document.ts';
import { shown } from '../quantity.ts';

/** Parts and packages that are referred to are in the document; tables rise; land nets name lands of the package. */
export function checkLibrary(board: Board, report: Report) {
  const partNames = Object.keys(board.parts);
  board.regulators.forEach((regulator, i) => {
    if (!Object.hasOwn(board.parts, regulator.part)) {
      report(
        ['regulators', i, 'part'],
        `must be a part of this document (${list(partNames)}), found ${shown(regulator.part)}`,
      );
    }
  });
  for (const [key, part] of Object.entries(board.parts)) {
    const model = Object.hasOwn(board.packages, part.package) ? board.packages[part.package] : undefined;
    if (!model) {
      report(
        ['parts', key, 'package'],
        `must be a package of this document (${list(Object.keys(board.packages))}), found ${shown(part.package)}`,
      );
    } else {
      const lands = model.lands.map((land) => land.name);
      for (const land of Object.keys(part.landNets)) {
        if (!lands.includes(land)) {
          report(['parts', key, 'landNets', land], `must be a land of ${part.package} (${list(lands)})`);
        }
      }
    }
    for (const table of ['dropoutV', 'groundA'] as const) {
      part[table].forEach(([current], i) => {
        const before = part[table][i - 1]?.[0];
        if (before !== undefined && current <= before) {
          report(['parts', key, table, i, 0], `must be a current above ${before} A, found ${current} A`);
        }
      });
    }
  }
  for (const [key, model] of Object.entries(board.packages)) {
    model.lands.forEach((land, i) => {
      if (model.lands.findIndex((other) => other.name === land.name) !== i) {
        report(['packages', key, 'lands', i, 'name'], `${shown(land.name)} is used twice`);
      }
    });
  }
}

const list = (names: readonly string[]) => {
  if (names.length === 0) return 'there is none';
  return names.length > 8 ? `${names.slice(0, 8).join(', ')}, …` : names.join(', ');
};
