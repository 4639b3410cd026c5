import type { CellGrid } from './cell-grid.ts';
import { wakeShares } from './wake-shares.ts';

/** One face of the board in moving air: what its cells and bodies shed into the streaks that run over them. */
export type StreakFace = {
  /** Convection film of each cell, W/(m²·K), also where a body covers it. */
  film: Float64Array;
  /** Share of the film that forced flow makes: 1 in pure forced flow, 0 where buoyancy rules and no wake holds. */
  forced: Float64Array;
  /** Area of each cell that sees the air ÷ area of the cell. */
  exposed: Float64Array;
  bodies: StreakBody[];
};

/** A body in the stream; it convects own·junction rise + air·(air rise before it), W. */
export type StreakBody = {
  /** Node of the junction behind the body; not read here. */
  junction: number;
  /** First cells of the body that the air meets, in the order of the streaks. */
  lead: Int32Array;
  /** Footprint, and how much of the body's heat each of its cells sheds, 1/m². */
  cell: Int32Array;
  shed: Float64Array;
  own: number;
  air: number;
  /** Heat that 1 K of air rise before the body brings to the junction, W. */
  back: number;
};

/**
 * Straight streaks of air over the cells. The air rise at a cell is Σ share·(heat shed upstream − heat shed here) ÷ film: zero
 * where everything upstream sheds as much as the cell itself, above zero in the wake of warmer parts, below it on a warm
 * spot that fresh air reaches.
 */
export class AirStreaks {
  readonly #order: Int32Array;
  readonly #position: Int32Array;
  readonly #upstream: Int32Array;
  readonly #offsets: Int32Array;
  readonly #shares: Float64Array;
  readonly #cellAreaM2: number;

  /** @param towardDeg where the air goes, degrees counter-clockwise from +x */
  constructor({ columns, rows, dxMm, dyMm }: CellGrid, towardDeg: number) {
    const [ux, uy] = [Math.cos((towardDeg * Math.PI) / 180), Math.sin((towardDeg * Math.PI) / 180)];
    const alongX = Math.abs(ux) / dxMm >= Math.abs(uy) / dyMm;
    const slope = alongX ? ((uy / Math.abs(ux)) * dxMm) / dyMm : ((ux / Math.abs(uy)) * dyMm) / dxMm;
    const forward = (alongX ? ux : uy) > 0;
    const [length, width] = alongX ? [columns, rows] : [rows, columns];
    const [major, minor] = alongX ? [1, columns] : [columns, 1];
    const aside = (k: number) => Math.round(k * slope);
    this.#cellAreaM2 = dxMm * dyMm * 1e-6;
    this.#offsets = Int32Array.from({ length }, (_, k) => (forward ? -k : k) * major - aside(k) * minor);
    this.#order = new Int32Array(columns * rows);
    this.#position = new Int32Array(columns * rows);
    this.#upstream = new Int32Array(columns * rows);
    for (let p = 0, next = 0; p < length; p++) {
      for (let m = 0; m < width; m++) {
        const cell = (forward ? p : length - 1 - p) * major + m * minor;
        let n = p;
        while (n > 0 && (m - aside(n) < 0 || m - aside(n) >= width)) n--;
        this.#position[cell] = p;
        this.#upstream[cell] = n;
        this.#order[next++] = cell;
      }
    }
    this.#shares = wakeShares(length - 1);
  }

  /** Those of a body's cells that the air meets first. */
  leadOf(cells: Int32Array): Int32Array {
    const first = cells.reduce((least, cell) => Math.min(least, this.#position[cell]!), Infinity);
    return cells.filter((cell) => this.#position[cell] === first).sort((a, b) => a - b);
  }

  /**
   * Heat that the air brings back, for given rises.
   * @param rise of each cell of the face, K
   * @param junctionRise behind each body, K
   * @param back written: W into each cell
   * @param airRise written: rise of the air before each body, K
   */
  forward(face: StreakFace, rise: Float64Array, junctionRise: Float64Array, back: Float64Array, airRise: Float64Array) {
    const shed = new Float64Array(rise.length);
    const arriving = new Float64Array(rise.length);
    const bodyAt = lastLeads(face);
    for (const cell of this.#order) {
      const n = this.#upstream[cell]!;
      const base = (n * (n + 1)) / 2;
      let sum = 0;
      for (let k = 1; k <= n; k++) sum += this.#shares[base + k]! * shed[cell + this.#offsets[k]!]!;
      const forced = face.forced[cell]!;
      arriving[cell] = forced * sum;
      for (const index of bodyAt.get(cell) ?? []) {
        const body = face.bodies[index]!;
        let air = 0;
        for (const at of body.lead) air += arriving[at]! / face.film[at]!;
        airRise[index] = air / body.lead.length;
        const heat = body.own * junctionRise[index]! + body.air * airRise[index]!;
        body.cell.forEach((at, k) => (shed[at]! += body.shed[k]! * heat));
      }
      const full = face.film[cell]! * rise[cell]!;
      const flux = (full - arriving[cell]!) / (1 - forced * (1 - this.#shares[base]!));
      back[cell] = face.exposed[cell]! * this.#cellAreaM2 * (full - flux);
      shed[cell]! += face.exposed[cell]! * flux;
    }
  }

  /**
   * The transpose of `forward`, for adjoint solutions: from weights of the heat brought back (to cells and, by `back`, to
   * junctions) to weights of the rises.
   */
  backward(
    face: StreakFace,
    backWeight: Float64Array,
    junctionWeight: Float64Array,
    riseWeight: Float64Array,
    junctionRiseWeight: Float64Array,
  ) {
    const shed = new Float64Array(backWeight.length);
    const arriving = new Float64Array(backWeight.length);
    const bodyAt = lastLeads(face);
    for (let index = this.#order.length - 1; index >= 0; index--) {
      const cell = this.#order[index]!;
      const n = this.#upstream[cell]!;
      const base = (n * (n + 1)) / 2;
      const weight = face.exposed[cell]! * this.#cellAreaM2 * backWeight[cell]!;
      const forced = face.forced[cell]!;
      const flux = (face.exposed[cell]! * shed[cell]! - weight) / (1 - forced * (1 - this.#shares[base]!));
      riseWeight[cell] = face.film[cell]! * (flux + weight);
      arriving[cell]! -= flux;
      for (const at of bodyAt.get(cell) ?? []) {
        const body = face.bodies[at]!;
        let heat = 0;
        body.cell.forEach((other, k) => (heat += body.shed[k]! * shed[other]!));
        junctionRiseWeight[at] = body.own * heat;
        const air = (body.back * junctionWeight[at]! + body.air * heat) / body.lead.length;
        for (const other of body.lead) arriving[other]! += air / face.film[other]!;
      }
      const onward = forced * arriving[cell]!;
      if (onward === 0) continue;
      for (let k = 1; k <= n; k++) shed[cell + this.#offsets[k]!]! += this.#shares[base + k]! * onward;
    }
  }
}

/** Bodies by the last of their lead cells: there the air before them is known, and nothing behind them has been met. */
function lastLeads(face: StreakFace): Map<number, number[]> {
  const found = new Map<number, number[]>();
  face.bodies.forEach((body, index) => {
    const last = body.lead.at(-1);
    if (last !== undefined) found.set(last, [...(found.get(last) ?? []), index]);
  });
  return found;
}
