import type { Probe } from '#core/board/placement.ts';
import { celsiusOffset } from '#core/units.ts';
import type { BoardModel } from './board-model.ts';
import type { Rises } from './solve-rises.ts';

/** Temperature at a point of an outer face, °C, bilinear between cell centres and straight on to the edge; NaN off the board. */
export function probeTemperature(
  model: BoardModel,
  { rise, ambientK }: Rises,
  probe: Pick<Probe, 'at' | 'side'>,
): number {
  const { grid, layers, filled } = model;
  const x = (probe.at[0] - grid.x0Mm) / grid.dxMm - 0.5;
  const y = (probe.at[1] - grid.y0Mm) / grid.dyMm - 0.5;
  if (x < -0.5 || y < -0.5 || x > grid.columns - 0.5 || y > grid.rows - 0.5) return NaN;
  const own = Math.min(grid.rows - 1, Math.round(y)) * grid.columns + Math.min(grid.columns - 1, Math.round(x));
  if (!(filled[Math.max(0, own)]! > 0)) return NaN;
  const i = Math.max(0, Math.min(grid.columns - 2, Math.floor(x)));
  const j = Math.max(0, Math.min(grid.rows - 2, Math.floor(y)));
  const offset = probe.side === 'top' ? 0 : layers.count - 1;
  const fx = Math.max(0, Math.min(1, x - i));
  const fy = Math.max(0, Math.min(1, y - j));
  let sum = 0;
  let weight = 0;
  for (const [di, dj, share] of [
    [0, 0, (1 - fx) * (1 - fy)],
    [1, 0, fx * (1 - fy)],
    [0, 1, (1 - fx) * fy],
    [1, 1, fx * fy],
  ] as const) {
    const cell = Math.min(grid.rows - 1, j + dj) * grid.columns + Math.min(grid.columns - 1, i + di);
    if (!(filled[cell]! > 0)) continue;
    sum += share * rise[cell * layers.count + offset]!;
    weight += share;
  }
  return weight > 0 ? sum / weight + ambientK - celsiusOffset : NaN;
}
