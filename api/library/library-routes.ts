import { criteriaSets } from '#core/catalog/criteria-sets.ts';
import { laminates } from '#core/catalog/laminates.ts';
import { typicalPackages } from '#core/catalog/typical-packages.ts';
import type { LibraryView } from '#core/contract/solving.ts';
import { listLibraryItems } from '#db/library-items.ts';
import type { Routes } from '../http/route.ts';

export const libraryRoutes: Routes<'readLibrary'> = {
  readLibrary: async ({ database, actor }) => {
    const items = await listLibraryItems(database, actor.team.id);
    const own = (kind: 'package' | 'part') =>
      Object.fromEntries(items.filter((item) => item.kind === kind).map((item) => [item.key, item.document]));
    const body: LibraryView = {
      // A team's own package goes before the typical one of the same name.
      packages: { ...typicalPackages, ...(own('package') as LibraryView['packages']) },
      parts: own('part') as LibraryView['parts'],
      criteria: [...criteriaSets],
      laminates: [...laminates],
    };
    return { body };
  },
};
