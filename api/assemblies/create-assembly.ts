import { nextLetter } from '#core/review/next-letter.ts';
import { insertAssembly, numberTaken } from '#db/assemblies.ts';
import { appendAuditEvent } from '#db/audit-events.ts';
import type { Database } from '#db/database.ts';
import type { Deps } from '../deps.ts';
import { Refusal } from '../http/refusal.ts';
import type { Actor } from '../session/actor.ts';
import { readWrittenBoard } from '../sketch/read-written-board.ts';
import { blankBoard } from '#core/board/blank-board.ts';
import { startRevision } from './start-revision.ts';

type Given = { number: string; title: string; board: unknown };

/** Creates an assembly with revision A, drawn by the actor. */
export async function createAssembly(
  deps: Pick<Deps, 'newId'>,
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  given: Given,
): Promise<{ assemblyId: string; revisionId: string }> {
  const written = readWrittenBoard(given.board ?? blankBoard(given.title));
  if (await numberTaken(database, actor.team.id, given.number, null)) throw taken(given.number);
  const assemblyId = deps.newId();
  await insertAssembly(database, {
    id: assemblyId,
    teamId: actor.team.id,
    number: given.number,
    title: given.title,
    createdBy: actor.member.id,
  });
  await appendAuditEvent(database, {
    teamId: actor.team.id,
    actor: actor.member,
    kind: 'assembly.created',
    subject: given.number,
    facts: { title: given.title },
  });
  const assembly = { id: assemblyId, number: given.number };
  const start = { assembly, letter: nextLetter(null), ordinal: 1, written, from: null };
  return { assemblyId, revisionId: await startRevision(deps, database, actor, start) };
}

export const taken = (number: string) =>
  new Refusal(409, 'number-taken', 'Number taken', `Your team has an assembly ${number} already.`);
