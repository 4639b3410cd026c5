import { spawnSync } from 'node:child_process';
import { copyFileSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

const root = join(import.meta.dirname, '../..');
export const kernelBinaryFile = join(root, 'core/numerics/kernel/kernel-binary.ts');

/** Text of the module that holds the kernel's binary, compiled anew from its sources. */
export function compileKernel() {
  const folder = mkdtempSync(join(tmpdir(), 'dropwatt-kernel-'));
  try {
    // The compiler knows its sources by the ending of another language.
    const sources = join(root, 'core/numerics/kernel/assembly');
    for (const file of readdirSync(sources)) copyFileSync(join(sources, file), join(folder, file.replace(/as$/, 'ts')));
    const binary = join(folder, 'kernel.wasm');
    const words = ['asc', join(folder, 'kernel.ts'), '--outFile', binary, '--runtime', 'stub', '--importMemory'];
    words.push('--noExportMemory', '--enable', 'simd', '-O3', '--noAssert', '--disableWarning');
    const { status, stderr } = spawnSync('npx', words, { cwd: root, encoding: 'utf8' });
    if (status !== 0) throw new Error(`The kernel does not compile:\n${stderr}`);
    const lines = readFileSync(binary, 'hex').match(/.{1,112}/g) ?? [];
    const text = lines.map((line) => `  '${line}'`).join(' +\n');
    return `/** The kernel of assembly/ as \`make kernel\` compiles it, hexadecimal. Not to be edited. */\nexport const kernelBinary =\n${text};\n`;
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

if (process.argv[1] === import.meta.filename) writeFileSync(kernelBinaryFile, compileKernel());
