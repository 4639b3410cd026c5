import { kernelBinary } from './kernel-binary.ts';

/** What the compiled kernel exports (see assembly/); addresses are bytes in its memory. */
export type Kernel = {
  setHierarchy(
    first: number,
    count: number,
    dense: number,
    index: number,
    rowOf: number,
    size: number,
    work: number,
  ): void;
  buildLevels(share: number): void;
  refreshLevels(): number;
  setMatrix(level: number, e: number, n: number, z: number, d: number, linkG: number, length: number): void;
  addConductances(): void;
  multiply(x: number, y: number): void;
  dot(a: number, b: number): number;
  precondition(r: number): void;
  answerDot(r: number): number;
  turn(p: number, beta: number): void;
  step(x: number, r: number, p: number, q: number, alpha: number): number;
  residual(b: number, x: number, r: number): number;
};

/** The part of the standard WebAssembly interface that is used; every runtime of the product has it. */
type Engine = {
  Module: new (bytes: Uint8Array) => object;
  Instance: new (module: object, imports: object) => { exports: object };
  Memory: new (size: { initial: number }) => { buffer: ArrayBuffer };
};

const engine = (globalThis as unknown as { WebAssembly: Engine }).WebAssembly;
const pageBytes = 65_536;
let compiled: object | null = null;

/** A running kernel and its memory. */
export type RunningKernel = { kernel: Kernel; buffer: ArrayBuffer };

/** Kernels that were given back: touching new memory costs more than the work that is done in it. */
const idle: RunningKernel[] = [];
const mostIdle = 3;
const mostIdleBytes = 100e6;

/** A kernel with at least the given memory, zeroed, that nobody else uses. */
export function takeKernel(bytes: number): RunningKernel {
  const fitting = idle.filter(({ buffer }) => buffer.byteLength >= bytes && buffer.byteLength < 4 * bytes + 4e6);
  const used = fitting.sort((a, b) => a.buffer.byteLength - b.buffer.byteLength)[0];
  if (used) {
    idle.splice(idle.indexOf(used), 1);
    new Uint8Array(used.buffer, 0, bytes).fill(0);
    return used;
  }
  compiled ??= new engine.Module(bytesOf(kernelBinary));
  const memory = new engine.Memory({ initial: Math.ceil(bytes / pageBytes) });
  const { exports } = new engine.Instance(compiled, { env: { memory } });
  return { kernel: exports as Kernel, buffer: memory.buffer };
}

/** Gives a kernel back for the next one that needs as much memory. */
export function giveKernel(running: RunningKernel) {
  if (running.buffer.byteLength > mostIdleBytes) return;
  idle.push(running);
  if (idle.length > mostIdle) idle.shift();
}

function bytesOf(hexadecimal: string): Uint8Array {
  const bytes = new Uint8Array(hexadecimal.length / 2);
  for (let k = 0; k < bytes.length; k++) bytes[k] = Number.parseInt(hexadecimal.slice(2 * k, 2 * k + 2), 16);
  return bytes;
}
