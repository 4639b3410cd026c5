import { boardFormat, boardVersion } from './document.ts';
import type { FieldFault } from './fault.ts';
import { shown } from './quantity.ts';

/** One step of the chain: a document of version n to one of version n + 1, shape unchecked. */
export type UpgradeStep = (document: Record<string, unknown>) => Record<string, unknown>;

/** Steps by the version they start from; version 1 is the first, so there is none yet. */
export const upgradeSteps: ReadonlyMap<number, UpgradeStep> = new Map();

/**
 * Brings a document of an older version to the present one, one step per version.
 * @param steps,target replaced in tests, so that the chain is proved before it has a step
 * @returns the document, or the fault that keeps it from being read (a version that is newer, or no version)
 */
export function upgrade(
  value: Record<string, unknown>,
  steps: ReadonlyMap<number, UpgradeStep> = upgradeSteps,
  target: number = boardVersion,
): { document: Record<string, unknown> } | { fault: FieldFault } {
  const { format, version } = value;
  if (format !== boardFormat) {
    return { fault: { path: 'format', message: `must be "${boardFormat}", found ${shown(format)}` } };
  }
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1) {
    return {
      fault: { path: 'version', message: `must be a whole number from 1 to ${target}, found ${shown(version)}` },
    };
  }
  if (version > target) {
    return {
      fault: {
        path: 'version',
        message: `is ${version}, newer than the ${target} that this release reads; update Dropwatt`,
      },
    };
  }
  let document = value;
  for (let from = version; from < target; from++) {
    const step = steps.get(from);
    if (!step) return { fault: { path: 'version', message: `${from} can no longer be upgraded` } };
    document = { ...step(document), version: from + 1 };
  }
  return { document };
}
