import type { GuardFailure } from '#core/review/guards.ts';
import { guarded } from '../http/refusal.ts';

/** @throws Refusal 422 with everything that stands in the way */
export function refuseGuarded(failures: readonly GuardFailure[]): void {
  if (failures.length > 0) throw guarded([...failures]);
}
