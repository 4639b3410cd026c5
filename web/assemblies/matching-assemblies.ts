import type { AssemblyView } from '#core/contract/assemblies.ts';

/** Assemblies whose number, title, state or verdict holds every word of the search, letter case aside. */
export function matchingAssemblies(assemblies: readonly AssemblyView[], search: string): AssemblyView[] {
  const words = search.toLowerCase().split(/\s+/).filter(Boolean);
  return assemblies.filter(({ number, title, revisions }) => {
    const newest = revisions[0];
    const text = [number, title, newest?.state, newest?.verdict].join(' ').toLowerCase();
    return words.every((word) => text.includes(word));
  });
}
