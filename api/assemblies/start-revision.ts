import { appendAuditEvent } from '#db/audit-events.ts';
import type { Database } from '#db/database.ts';
import { insertRevision } from '#db/revisions.ts';
import { insertSketchVersion } from '#db/sketch-versions.ts';
import type { Deps } from '../deps.ts';
import type { Actor } from '../session/actor.ts';
import type { WrittenBoard } from '../sketch/read-written-board.ts';

/** Adds a revision in state `sketch` with its first sketch version; gives its id. */
export async function startRevision(
  deps: Pick<Deps, 'newId'>,
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  start: {
    assembly: { id: string; number: string };
    letter: string;
    ordinal: number;
    written: WrittenBoard;
    /** Letter of the revision that it continues. */
    from: string | null;
  },
): Promise<string> {
  const id = deps.newId();
  const { document, hash } = start.written;
  await insertRevision(database, {
    id,
    teamId: actor.team.id,
    assemblyId: start.assembly.id,
    letter: start.letter,
    ordinal: start.ordinal,
    sketchHash: hash,
    createdBy: actor.member.id,
  });
  await insertSketchVersion(database, {
    revisionId: id,
    version: 1,
    board: document,
    boardHash: hash,
    savedBy: actor.member.id,
  });
  await appendAuditEvent(database, {
    teamId: actor.team.id,
    actor: actor.member,
    kind: 'revision.opened',
    subject: `${start.assembly.number} revision ${start.letter}`,
    revisionId: id,
    facts: { continues: start.from, sketchHash: hash },
  });
  return id;
}
