import type { Board } from '#core/board/document.ts';

/** Every net that the board names, in alphabetical order. */
export function netNames(board: Board): string[] {
  const names = [
    ...board.pours.map((pour) => pour.net),
    ...board.viaFields.map((field) => field.net),
    ...board.stackup.copper.flatMap((layer) => (layer.plane ? [layer.plane.net] : [])),
    ...board.regulators.flatMap(({ nets }) => [nets.ground, nets.input, nets.output]),
    ...board.supplies.map((supply) => supply.name),
  ];
  return [...new Set(names)].sort((a, b) => a.localeCompare(b));
}
