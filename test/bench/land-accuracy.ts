import { boardDocument, type BoardDocument } from '#core/board/document.ts';
import { buildBoardModel, releaseBoardModel } from '#core/thermal/board-model.ts';
import { solveRises } from '#core/thermal/solve-rises.ts';
import { hardBoard } from './hard-board.ts';

const shifts = [0, 0.25, 0.5, 0.75];

/**
 * S6: an isolated land of 1 mm on bare laminate at 16 places within a cell of 1 mm, against cells of 0.05 mm.
 * @returns the largest error of the land's rise, as a share
 */
export function landAccuracy(): number {
  let worst = 0;
  for (const dx of shifts) {
    for (const dy of shifts) {
      const board = isolatedLand(dx, dy);
      const [coarse, fine] = [1, 0.05].map((cellMm) => junctionRises(board, cellMm)[0]!) as [number, number];
      worst = Math.max(worst, Math.abs(coarse / fine - 1));
    }
  }
  return worst;
}

/**
 * S7: the middle of four hard boards, 80 × 50 mm with a handful of regulators, on the cells that the whole board would get, against
 * cells of 0.1 mm.
 * @returns root mean square of the error of their junctions, K, and how many there are
 */
export function junctionAccuracy(cellMm: number): { rmsK: number; junctions: number } {
  const errors: number[] = [];
  for (const seed of [811, 823, 827, 829]) {
    const board = middleOf(seed);
    const coarse = junctionRises(board, cellMm);
    junctionRises(board, 0.1).forEach((fine, k) => errors.push(coarse[k]! - fine));
  }
  return {
    rmsK: Math.sqrt(errors.reduce((sum, error) => sum + error * error, 0) / errors.length),
    junctions: errors.length,
  };
}

export function junctionRises(board: ReturnType<typeof hardBoard>, cellMm: number): number[] {
  const model = buildBoardModel(board, { cellMm });
  const heat = {
    regulatorsW: new Map(board.regulators.map(({ ref, powerW }) => [ref, powerW ?? 0])),
    sourcesW: new Map(),
  };
  const rises = solveRises(model, board.conditions[0]!, heat);
  releaseBoardModel(model);
  if (rises.status !== 'converged') throw new Error(`${board.title}: ${rises.message}`);
  return model.packages.map(({ junction }) => rises.rise[junction]!);
}

function middleOf(seed: number) {
  const board = hardBoard(seed, 4);
  const [x0, y0, x1, y1] = [40, 25, 120, 75];
  const inside = ({ at: [x, y] }: { at: [number, number] }) => x > x0 + 8 && x < x1 - 8 && y > y0 + 8 && y < y1 - 8;
  const points: [number, number][] = [
    [x0, y0],
    [x1, y0],
    [x1, y1],
    [x0, y1],
  ];
  return { ...board, outline: { points, cutouts: [] }, regulators: board.regulators.filter(inside) };
}

export function isolatedLand(dx: number, dy: number) {
  const board = hardBoard(1, 2);
  const points: [number, number][] = [
    [0, 0],
    [20, 0],
    [20, 20],
    [0, 20],
  ];
  const land = { name: 'tab', kind: 'tab', kPerW: 0.01, pads: [{ at: [0, 0], sizeMm: [1, 1] }] } as const;
  return boardDocument.parse({
    ...board,
    title: 'Isolated land',
    outline: { points },
    stackup: { ...board.stackup, dielectric: [{ ...board.stackup.dielectric[0]!, thicknessMm: 1.5 }] },
    pours: [],
    viaFields: [],
    packages: { ...board.packages, small: { ...board.packages['small']!, lands: [land], caseTopKPerW: 1e6 } },
    parts: { ...board.parts, small: { ...board.parts['small']!, landNets: { tab: 'ground' } } },
    regulators: [{ ...board.regulators[0]!, at: [10 + dx, 10 + dy], part: 'small', powerW: 0.1 }],
  } as unknown as BoardDocument);
}
