import type { Board } from '#core/board/document.ts';
import type { Side } from '#core/board/placement.ts';

/** Smallest rectangle of a part's own frame that holds its body and its lands. */
export type Footprint = {
  ref: string;
  placement: { at: [number, number]; rotationDeg: number; side: Side };
  centre: [number, number];
  size: [number, number];
};

export function footprints(board: Board): Footprint[] {
  const regulators = board.regulators.flatMap((regulator): Footprint[] => {
    const model = board.packages[board.parts[regulator.part]?.package ?? ''];
    if (!model) return [];
    const [length, width] = model.bodyMm;
    const boxes = [
      [-length / 2, -width / 2, length / 2, width / 2],
      ...model.lands.flatMap((land) =>
        land.pads.map(({ at: [x, y], sizeMm: [w, h] }) => [x - w / 2, y - h / 2, x + w / 2, y + h / 2]),
      ),
    ];
    const low = [0, 1].map((k) => Math.min(...boxes.map((box) => box[k]!)));
    const high = [2, 3].map((k) => Math.max(...boxes.map((box) => box[k]!)));
    return [
      {
        ref: regulator.ref,
        placement: regulator,
        centre: [(low[0]! + high[0]!) / 2, (low[1]! + high[1]!) / 2],
        size: [high[0]! - low[0]!, high[1]! - low[1]!],
      },
    ];
  });
  const sources = board.sources.map((source): Footprint => ({
    ref: source.ref,
    placement: source,
    centre: [0, 0],
    size: [Math.max(source.sizeMm[0], source.bodyMm?.[0] ?? 0), Math.max(source.sizeMm[1], source.bodyMm?.[1] ?? 0)],
  }));
  return [...regulators, ...sources];
}
