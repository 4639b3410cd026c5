import type { sketchEndpoints } from '#core/contract/sketch-endpoints.ts';
import { findSketchVersion, listSketchVersions, type SketchVersion } from '#db/sketch-versions.ts';
import { notFound } from '../http/refusal.ts';
import type { Routes } from '../http/route.ts';
import { presentLoaded } from '../review/present-revision.ts';
import { readWrittenBoard } from './read-written-board.ts';
import { saveSketch } from './save-sketch.ts';

export const sketchRoutes: Routes<keyof typeof sketchEndpoints> = {
  readRevision: async ({ database, actor, revision }) => {
    const view = await presentLoaded(database, actor, revision);
    return { body: view, version: view.version };
  },

  // The version is the revision's, not that of the save: it is what the next save must name.
  readSketch: async ({ database, revision }) => {
    const sketch = await findSketchVersion(database, revision.id, revision.sketchVersion);
    if (!sketch) throw new Error(`revision ${revision.id} has no sketch`);
    const body = { ...present(sketch), version: revision.version, board: sketch.board };
    return { body, version: revision.version };
  },

  saveSketch: async ({ database, actor, params, overVersion, written }) => {
    const given = { ...params, overVersion, written: readWrittenBoard(written) };
    const { version, savedAt, savedBy } = await saveSketch(database, actor, given);
    return { body: { version, savedAt: savedAt.toISOString(), savedBy }, version };
  },

  listSketchVersions: async ({ database, revision }) => ({
    body: { items: (await listSketchVersions(database, revision.id)).map(present) },
  }),

  readSketchVersion: async ({ database, revision, params }) => {
    const sketch = await findSketchVersion(database, revision.id, params.version);
    if (!sketch) throw notFound('This version');
    return { body: { ...present(sketch), board: sketch.board } };
  },
};

function present({ version, savedAt, savedBy }: SketchVersion) {
  return { version, savedAt: savedAt.toISOString(), savedBy };
}
