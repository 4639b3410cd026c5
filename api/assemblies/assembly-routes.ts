import type { assemblyEndpoints } from '#core/contract/assembly-endpoints.ts';
import { findAssembly, listAssemblies, lockAssembly, numberTaken, updateAssembly } from '#db/assemblies.ts';
import { appendAuditEvent } from '#db/audit-events.ts';
import type { Database } from '#db/database.ts';
import { revisionLines } from '#db/revisions.ts';
import { transaction } from '#db/transaction.ts';
import { notFound } from '../http/refusal.ts';
import type { Routes } from '../http/route.ts';
import { presentRevision } from '../review/present-revision.ts';
import type { Actor } from '../session/actor.ts';
import { methodVersion as method } from '#core/thermal/method.ts';
import { createAssembly, taken } from './create-assembly.ts';
import { openNextRevision } from './open-next-revision.ts';
import { presentAssembly } from './present-assembly.ts';

export const assemblyRoutes: Routes<keyof typeof assemblyEndpoints> = {
  listAssemblies: async ({ database, actor }) => {
    const [assemblies, lines] = await Promise.all([
      listAssemblies(database, actor.team.id),
      revisionLines(database, actor.team.id, method),
    ]);
    const byAssembly = new Map<string, typeof lines>();
    for (const line of lines) byAssembly.set(line.assemblyId, [...(byAssembly.get(line.assemblyId) ?? []), line]);
    return {
      body: { items: assemblies.map((assembly) => presentAssembly(assembly, byAssembly.get(assembly.id) ?? [])) },
    };
  },

  createAssembly: async ({ deps, database, actor, body, written }) => {
    const { number, title } = body;
    const board = (written as { board?: unknown }).board;
    const { assemblyId } = await createAssembly(deps, database, actor, { number, title, board });
    return { body: await read(database, actor, assemblyId) };
  },

  readAssembly: async ({ database, actor, params }) => ({ body: await read(database, actor, params.assemblyId) }),

  changeAssembly: async ({ database, actor, params, body }) =>
    transaction(database, async (trx) => {
      const before = await lockAssembly(trx, actor.team.id, params.assemblyId);
      if (!before) throw notFound('This assembly');
      const { number = before.number, title = before.title } = body;
      if (await numberTaken(trx, actor.team.id, number, before.id)) throw taken(number);
      const facts = {
        ...(number === before.number ? {} : { number: { from: before.number, to: number } }),
        ...(title === before.title ? {} : { title: { from: before.title, to: title } }),
      };
      if (Object.keys(facts).length > 0) {
        await updateAssembly(trx, before.id, { number, title });
        await appendAuditEvent(trx, {
          teamId: actor.team.id,
          actor: actor.member,
          kind: 'assembly.changed',
          subject: number,
          facts,
        });
      }
      return { body: await read(trx, actor, before.id) };
    }),

  openNextRevision: async ({ deps, database, actor, params, body }) => {
    const id = await openNextRevision(deps, database, actor, { ...params, from: body.from });
    const view = await presentRevision(database, actor, id);
    return { body: view, version: view.version };
  },
};

async function read(database: Database, actor: Actor, id: string) {
  const assembly = await findAssembly(database, actor.team.id, id);
  if (!assembly) throw notFound('This assembly');
  return presentAssembly(assembly, await revisionLines(database, actor.team.id, method, id));
}
