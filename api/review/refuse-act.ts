import type { Refusal as Reason } from '#core/review/permissions.ts';
import type { RevisionState } from '#core/review/revision-state.ts';
import { Refusal, roleRefused } from '../http/refusal.ts';

/** The problem that tells why a member may not act on a revision. */
export function refuseAct(reason: Reason, revision: { letter: string; state: RevisionState }): Refusal {
  switch (reason) {
    case 'role':
      return roleRefused();
    case 'author':
      return new Refusal(
        403,
        'author',
        'Not your own work',
        'You saved or submitted this revision; somebody else must do this.',
      );
    case 'state':
      return new Refusal(
        409,
        'state',
        'Not in this state',
        `Revision ${revision.letter} is ${revision.state}; this cannot be done to it now.`,
      );
  }
}
