import type { AssemblyView } from '#core/contract/assemblies.ts';
import type { Assembly } from '#db/assemblies.ts';
import type { RevisionLine } from '#db/revisions.ts';

/** An assembly with those of the lines that are its own, in their order. */
export function presentAssembly(assembly: Assembly, lines: readonly RevisionLine[]): AssemblyView {
  return {
    id: assembly.id,
    number: assembly.number,
    title: assembly.title,
    createdAt: assembly.createdAt.toISOString(),
    revisions: lines
      .filter(({ assemblyId }) => assemblyId === assembly.id)
      .map(({ id, letter, state, verdict, changedAt }) => ({
        id,
        letter,
        state,
        verdict,
        changedAt: changedAt.toISOString(),
      })),
  };
}
