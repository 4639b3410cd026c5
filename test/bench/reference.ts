import { spawn, spawnSync } from 'node:child_process';
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import { cellCount, nodeCount, type LayeredNetwork } from '#core/numerics/layered-network.ts';

export type ReferenceAnswer = { seconds: number; iterations: number; residual: number; x: Float64Array };

/** A general-purpose solver in a process of its own, one thread, that answers one system at a time. */
export type Reference = {
  name: string;
  solve: (name: string, tolerance: number) => Promise<ReferenceAnswer>;
  end: () => void;
};

const packages = ['python3-scipy', 'python3-petsc4py'];

/** Installs Debian's packages as root where they are missing; without them the bench says so and goes on with what there is. */
export function installReference() {
  const missing = packages.filter((name) => spawnSync('dpkg', ['-s', name], { stdio: 'ignore' }).status !== 0);
  if (missing.length === 0 || process.getuid?.() !== 0) return;
  spawnSync('apt-get', ['install', '-y', '--no-install-recommends', ...missing], { stdio: 'ignore' });
}

export async function startReference(folder: string): Promise<Reference> {
  const child = spawn('/usr/bin/python3', [join(import.meta.dirname, 'reference.py'), folder], {
    stdio: ['pipe', 'pipe', 'inherit'],
    env: { ...process.env, OMP_NUM_THREADS: '1', OPENBLAS_NUM_THREADS: '1', PYTHONPATH: '' },
  });
  const lines = createInterface({ input: child.stdout })[Symbol.asyncIterator]();
  const answer = async () => {
    const { value, done } = await lines.next();
    if (done) throw new Error('The reference solver ended; it needs Debian’s python3-scipy (and python3-petsc4py).');
    return JSON.parse(value) as Record<string, unknown>;
  };
  const { name } = (await answer()) as { name: string };
  return {
    name,
    async solve(system, tolerance) {
      child.stdin.write(`${system} ${tolerance}\n`);
      const { seconds, iterations, residual } = (await answer()) as Omit<ReferenceAnswer, 'x'>;
      const bytes = readFileSync(join(folder, `${system}.x`));
      return {
        seconds,
        iterations,
        residual,
        x: new Float64Array(bytes.buffer, bytes.byteOffset, bytes.byteLength / 8).slice(),
      };
    },
    end: () => child.stdin.end(),
  };
}

/** Writes a system as compressed rows for the reference. */
export function writeSystem(folder: string, name: string, network: LayeredNetwork, b: Float64Array) {
  const { columns, layers, gx, gy, gz, links, anchor } = network;
  const cells = cellCount(network);
  const n = nodeCount(network);
  const alongY = columns * layers;
  const start = new Int32Array(n + 1);
  const column = new Int32Array(7 * cells + links.node.length + n);
  const value = new Float64Array(column.length);
  let at = 0;
  for (let k = 0; k < n; k++) {
    let sum = anchor[k]!;
    const own = at++;
    const join = (other: number, g: number) => {
      if (!g) return;
      column[at] = other;
      value[at++] = -g;
      sum += g;
    };
    if (k < cells) {
      if (k >= alongY) join(k - alongY, gy[k - alongY]!);
      if (k >= layers) join(k - layers, gx[k - layers]!);
      if (k >= 1) join(k - 1, gz[k - 1]!);
      join(k + 1, gz[k]!);
      join(k + layers, gx[k]!);
      join(k + alongY, gy[k]!);
    }
    for (let q = links.start[k]!; q < links.start[k + 1]!; q++) join(links.node[q]!, links.g[q]!);
    column[own] = k;
    value[own] = sum > 0 ? sum : 1;
    start[k + 1] = at;
  }
  writeFileSync(join(folder, `${name}.ptr`), start);
  writeFileSync(join(folder, `${name}.col`), column.subarray(0, at));
  writeFileSync(join(folder, `${name}.val`), value.subarray(0, at));
  writeFileSync(join(folder, `${name}.b`), b);
}
