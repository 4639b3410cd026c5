import { readFile } from 'node:fs/promises';
import { describe, expect, test } from 'vitest';
import { readBoard } from '#core/board/read-board.ts';
import { checkBoard } from '#core/check/check-board.ts';

async function demo(name: string) {
  const text = await readFile(new URL(`../../../db/seeds/demo/${name}.json`, import.meta.url), 'utf8');
  const reading = readBoard(JSON.parse(text));
  if (!reading.ok) throw new Error(JSON.stringify(reading.faults));
  return checkBoard(reading.board, reading.assumptions, { gridError: false }).result;
}

describe('demo boards – as they are seeded – tell their story', () => {
  test('PCA-0617 revision A – all four regulators over their derated junction limits', async () => {
    const result = await demo('pca-0617-revision-a');
    expect(result.conditions.map(({ regulators }) => regulators.map(({ verdict }) => verdict))).toEqual([
      ['over', 'over', 'over', 'over'],
    ]);
    expect(result.findings.filter(({ severity }) => severity === 'stop')).toEqual([]);
  }, 60_000);

  test('PCA-0617 revision B – nothing over in any condition, nothing that stops it', async () => {
    const result = await demo('pca-0617-revision-b');
    expect(result.conditions.length).toBeGreaterThanOrEqual(6);
    for (const { name, verdict } of result.conditions) expect(['within', 'close'], name).toContain(verdict);
    expect(result.findings.filter(({ severity }) => severity === 'stop')).toEqual([]);
    // The series resistor takes heat from U1 and keeps it regulating at the lowest battery: 6.43 V against 6.0 V.
    const u1 = result.conditions[0]!.regulators.find(({ ref }) => ref === 'U1')!;
    expect(u1.headroomV).toBeGreaterThan(0.4);
  }, 60_000);

  test('PCA-0702 revision A – everything within', async () => {
    const result = await demo('pca-0702-revision-a');
    expect(result.verdict).toBe('within');
    expect(result.findings).toEqual([]);
  }, 60_000);
});
