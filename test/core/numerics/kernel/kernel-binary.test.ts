import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { compileKernel, kernelBinaryFile } from '#test/support/compile-kernel.js';

test('the committed binary – compiled anew from its sources – is the same', () => {
  expect(readFileSync(kernelBinaryFile, 'utf8')).toBe(compileKernel());
}, 60_000);
