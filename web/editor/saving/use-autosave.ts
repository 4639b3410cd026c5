import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, useRef } from 'react';
import { asWritten } from '#core/board/as-written.ts';
import type { Board, BoardDocument } from '#core/board/document.ts';
import type { SketchView } from '#core/contract/assemblies.ts';
import { resultQuery, revisionQuery, sketchQuery, sketchVersionsQuery } from '#web/revision/revision-queries.ts';
import { call, callWritten } from '#web/server/call.ts';
import { type EditorStore, isDirty } from '../editor-store.ts';
import { type Autosave, startAutosave } from './autosave.ts';
import { draftStore } from './draft-store.ts';
import { restoreDraft } from './restore-draft.ts';

type Sketch = SketchView & { board: Board; written: BoardDocument };
type Place = { revisionId: string; userId: string; sketch: Sketch };

/** Saves while the page is open, brings back what a crash left unsaved, and guards against closing too early. */
export function useAutosave(store: EditorStore, { revisionId, userId, sketch }: Place): Omit<Autosave, 'stop'> {
  const client = useQueryClient();
  const running = useRef<Autosave | null>(null);
  const opened = useRef(sketch);

  useEffect(() => {
    const drafts = draftStore(userId, revisionId);
    const sketchKey = sketchQuery(revisionId).queryKey;
    /** The document as the server has it: what it leaves to defaults stays left to them. */
    let { written } = opened.current;
    const autosave = startAutosave({
      store,
      drafts,
      now: () => new Date().toISOString(),
      async send(board, overVersion) {
        const body = asWritten(board, written);
        const saved = await call('saveSketch', { params: { revisionId }, body, ifMatch: overVersion });
        written = body;
        return saved;
      },
      async load() {
        const theirs = await callWritten('readSketch', { params: { revisionId } });
        written = theirs.written.board;
        return theirs.answer;
      },
      onSaved: () => {
        // The editor holds the newest sketch itself; what follows from it must be asked for again.
        for (const { queryKey } of [
          revisionQuery(revisionId),
          resultQuery(revisionId),
          sketchVersionsQuery(revisionId),
        ])
          void client.invalidateQueries({ queryKey });
        void client.invalidateQueries({ queryKey: sketchKey, refetchType: 'none' });
      },
    });
    running.current = autosave;
    void restoreDraft(store, drafts, opened.current);

    const onHide = () => void (document.visibilityState === 'hidden' && autosave.flush());
    const onOnline = () => void autosave.flush();
    const onLeave = (event: BeforeUnloadEvent) => event.preventDefault();
    let guarded = false;
    const guard = () => {
      // Attached only while something is unsaved: the listener alone keeps a page out of the back/forward cache.
      const dirty = isDirty(store.getState());
      if (dirty === guarded) return;
      guarded = dirty;
      if (dirty) window.addEventListener('beforeunload', onLeave);
      else window.removeEventListener('beforeunload', onLeave);
    };
    const unguard = store.subscribe(guard);
    document.addEventListener('visibilitychange', onHide);
    window.addEventListener('online', onOnline);
    return () => {
      void autosave.flush();
      autosave.stop();
      unguard();
      window.removeEventListener('beforeunload', onLeave);
      document.removeEventListener('visibilitychange', onHide);
      window.removeEventListener('online', onOnline);
    };
  }, [store, client, revisionId, userId]);

  return useMemo(() => {
    const now = async (act: (autosave: Autosave) => Promise<void>) => {
      if (running.current) await act(running.current);
    };
    return {
      flush: () => now((autosave) => autosave.flush()),
      takeTheirs: () => now((autosave) => autosave.takeTheirs()),
      keepMine: () => now((autosave) => autosave.keepMine()),
    };
  }, []);
}
