import type { Board } from './document.ts';
import { type FieldFault, pathText } from './fault.ts';
import { checkCurrentLimits } from './cross-checks/current-limits.ts';
import { checkElectrical } from './cross-checks/electrical.ts';
import { checkGeometry } from './cross-checks/geometry.ts';
import { checkLibrary } from './cross-checks/library.ts';
import { checkNames } from './cross-checks/names.ts';
import { checkStackup } from './cross-checks/stackup.ts';

/** Reports a fault at a path. */
export type Report = (path: readonly PropertyKey[], message: string) => void;

/** What the shape alone cannot tell: references, orders, names used twice, rings that cross themselves, feeds in a circle. */
export function crossCheck(board: Board): FieldFault[] {
  const faults: FieldFault[] = [];
  const report: Report = (path, message) => faults.push({ path: pathText(path), message });
  checkStackup(board, report);
  checkNames(board, report);
  checkGeometry(board, report);
  checkLibrary(board, report);
  checkElectrical(board, report);
  checkCurrentLimits(board, report);
  return faults;
}
