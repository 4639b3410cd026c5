import type { LiveSession } from '#db/sessions.ts';

/** Who acts: a signed-in member with their team and the session they act in. */
export type Actor = LiveSession;
