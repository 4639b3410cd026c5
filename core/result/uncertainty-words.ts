import type { RegulatorResult } from './result.ts';

/** Which of the two errors dominates a junction's band, in words; null where nothing is stated. */
export function uncertaintyWords({
  gridErrorK,
  modelErrorK,
}: Pick<RegulatorResult, 'gridErrorK' | 'modelErrorK'>): string | null {
  if (modelErrorK === null) return null;
  if (gridErrorK === null) return 'model error alone, the grid error was not evaluated';
  const [larger, smaller] = [Math.max(gridErrorK, modelErrorK), Math.min(gridErrorK, modelErrorK)];
  const name = modelErrorK >= gridErrorK ? 'model error' : 'grid error';
  const share = larger ** 2 / (larger ** 2 + smaller ** 2);
  return share > 0.9 ? `nearly all ${name}` : share > 0.6 ? `mostly ${name}` : 'grid and model error alike';
}
