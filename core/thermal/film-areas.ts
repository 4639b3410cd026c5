import type { Board } from '#core/board/document.ts';
import { placedRectangle } from '#core/geometry/placed-rectangle.ts';
import type { CopperMap } from './copper-map.ts';
import { scanFill } from './scan-fill.ts';

/** One face of the board on the cells: area that sees the air (m²) and its emissivity. */
export type Face = { area: Float64Array; emissivity: Float64Array };

/** Top and bottom face: board area less what bodies cover, more the sides of bodies that stand on heat sources. */
export function faces(board: Board, map: CopperMap): { top: Face; bottom: Face } {
  return { top: face(board, map, 'top'), bottom: face(board, map, 'bottom') };
}

function face(board: Board, map: CopperMap, side: 'top' | 'bottom'): Face {
  const { grid, inside } = map;
  const subColumns = grid.columns * grid.split;
  const base = side === 'top' ? board.stackup.emissivityTop : board.stackup.emissivityBottom;
  const surface = new Float32Array(inside.length).fill(base);
  const exposed = Float32Array.from(inside);
  const outer = board.stackup.copper.at(side === 'top' ? 0 : -1)!;
  for (const pour of board.pours) {
    if (pour.layer !== outer.name || pour.emissivity === null) continue;
    const value = pour.emissivity;
    scanFill(grid, [pour.points, ...pour.holes], (row, from, to) =>
      surface.fill(value, row * subColumns + from, row * subColumns + to),
    );
  }
  for (const regulator of board.regulators) {
    const model = board.packages[board.parts[regulator.part]?.package ?? ''];
    if (!model || regulator.side !== side) continue;
    const body = placedRectangle(regulator, [0, 0], [model.bodyMm[0], model.bodyMm[1]]);
    scanFill(grid, [body], (row, from, to) => exposed.fill(0, row * subColumns + from, row * subColumns + to));
  }
  for (const source of board.sources) {
    if (!source.bodyMm || source.side !== side) continue;
    const [length, width, height] = source.bodyMm;
    const more = (2 * (length + width) * height) / (length * width);
    scanFill(grid, [placedRectangle(source, [0, 0], [length, width])], (row, from, to) => {
      for (let at = row * subColumns + from; at < row * subColumns + to; at++) exposed[at]! *= 1 + more;
    });
  }
  return toCells(map, exposed, surface);
}

function toCells({ grid }: CopperMap, exposed: Float32Array, surface: Float32Array): Face {
  const { columns, rows, split } = grid;
  const subArea = (grid.dxMm * grid.dyMm * 1e-6) / (split * split);
  const area = new Float64Array(columns * rows);
  const emissivity = new Float64Array(columns * rows);
  for (let j = 0, at = 0; j < rows * split; j++) {
    for (let i = 0; i < columns * split; i++, at++) {
      const cell = Math.floor(j / split) * columns + Math.floor(i / split);
      area[cell]! += exposed[at]! * subArea;
      emissivity[cell]! += exposed[at]! * subArea * surface[at]!;
    }
  }
  for (let cell = 0; cell < area.length; cell++) emissivity[cell] = area[cell] ? emissivity[cell]! / area[cell]! : 0;
  return { area, emissivity };
}
