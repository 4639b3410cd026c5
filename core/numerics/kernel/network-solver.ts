import type { IterationRecord } from '../conjugate-gradients.ts';
import type { LayeredNetwork } from '../layered-network.ts';
import { iterate, type IterationLimits } from './iterate.ts';
import { giveKernel, takeKernel } from './kernel.ts';
import { layOut } from './lay-out.ts';
import { packLinks } from './packed-links.ts';
import { packing, placeLevels } from './place-levels.ts';
import { narrow, pack, writeNetwork } from './write-network.ts';

/**
 * A layered network in the memory of a compiled kernel: conjugate gradients in double precision, with a multigrid cycle in single
 * precision as preconditioner (two sweeps of red-black line Gauss–Seidel before and after, 2 × 2 columns merged, layers kept).
 * The plain path with the same parts is `multigrid.ts`; the two are held against each other.
 */
export type NetworkSolver = {
  /** Takes the network's present anchors; false when the matrix is not positive definite. */
  refresh: () => boolean;
  /** Conjugate gradients for A·x = b from the `x` that is given. Record and limits as in `conjugateGradients`. */
  solve: (b: Float64Array, x: Float64Array, limits: IterationLimits) => IterationRecord;
  /** y = A·x. */
  multiply: (x: Float64Array, y: Float64Array) => void;
  /** z ≈ A⁻¹·r, one cycle. */
  precondition: (r: Float64Array, z: Float64Array) => void;
  /** Gives the memory back for another network; the solver is of no use afterwards. */
  release: () => void;
  /** Memory of the kernel. */
  bytes: number;
};

/** @param network its conductances are copied, its anchors are read at every refresh */
export function networkSolver(network: LayeredNetwork): NetworkSolver {
  const levels = placeLevels(network);
  const links = packLinks(network, levels);
  const places = packing(network, levels[0]!);
  const laid = layOut(levels, links);
  const running = takeKernel(laid.bytes);
  const { kernel, buffer } = running;
  writeNetwork(network, levels, links, places, laid, running);
  const { length } = levels[0]!;
  const b64 = new Float64Array(buffer, laid.b, length);
  const x64 = new Float64Array(buffer, laid.x, length);
  const r64 = new Float64Array(buffer, laid.r, length);
  const p64 = new Float64Array(buffer, laid.p, length);
  const q64 = new Float64Array(buffer, laid.q, length);
  const diagonal = new Float64Array(buffer, laid.diagonal, length);
  const anchor32 = new Float32Array(buffer, laid.levels[0]!.anchor, length);
  const unknown32 = new Float32Array(buffer, laid.levels[0]!.unknown, length);
  let released = false;
  return {
    bytes: laid.bytes,
    refresh() {
      pack(places, network.anchor, diagonal);
      narrow(diagonal, anchor32);
      kernel.addConductances();
      // A node without any conductance (no board there) stands alone with a unit diagonal.
      for (let n = 0; n < places.length; n++) if (!(diagonal[places[n]!]! > 0)) diagonal[places[n]!] = 1;
      return kernel.refreshLevels() !== 0;
    },
    solve(b, x, limits) {
      pack(places, b, b64);
      pack(places, x, x64);
      const record = iterate(kernel, laid, limits);
      for (let n = 0; n < places.length; n++) x[n] = x64[places[n]!]!;
      return record;
    },
    multiply(x, y) {
      pack(places, x, p64);
      kernel.multiply(laid.p, laid.q);
      for (let n = 0; n < places.length; n++) y[n] = q64[places[n]!]!;
    },
    precondition(r, z) {
      pack(places, r, r64);
      kernel.precondition(laid.r);
      for (let n = 0; n < places.length; n++) z[n] = unknown32[places[n]!]!;
    },
    release() {
      if (!released) giveKernel(running);
      released = true;
    },
  };
}
