import type { Board } from '#core/board/document.ts';
import { ProblemError } from '#web/server/problem-error.ts';
import { type EditorStore, adopt, isDirty } from '../editor-store.ts';
import type { DraftStore } from './draft-store.ts';

export type Saved = { version: number; savedAt: string };

export type AutosaveDependencies = {
  store: EditorStore;
  /** Stores the board over the named version. @throws ProblemError, 412 with `current` when somebody else saved */
  send: (board: Board, overVersion: number) => Promise<Saved>;
  /** What is on the server now. */
  load: () => Promise<Saved & { board: Board; savedBy: string }>;
  drafts: DraftStore;
  now: () => string;
  /** Told after every save that the server has confirmed. */
  onSaved?: (saved: Saved) => void;
  debounceMs?: number;
  retryMs?: number;
};

export type Autosave = {
  /** Saves at once what is not saved. */
  flush: () => Promise<void>;
  /** Ways out of a conflict; both keep the other version: theirs in the list of versions, mine on the undo stack. */
  takeTheirs: () => Promise<void>;
  keepMine: () => Promise<void>;
  stop: () => void;
};

/**
 * Saves the sketch two seconds at most after each change, one save at a time, with the version it was made from.
 * What could not be sent stays on this device as a draft until the server has it.
 */
export function startAutosave(dependencies: AutosaveDependencies): Autosave {
  const { store, send, load, drafts, now, onSaved, debounceMs = 1200, retryMs = 5000 } = dependencies;
  let timer: ReturnType<typeof setTimeout> | undefined;
  let running: Promise<void> | null = null;

  const later = (delayMs: number) => {
    clearTimeout(timer);
    timer = setTimeout(() => void flush(), delayMs);
  };

  const unsubscribe = store.subscribe((state, before) => {
    if (state.board === before.board || state.readOnly !== null) return;
    if (!isDirty(state)) return backAtSaved();
    void drafts.write({ baseVersion: state.savedVersion, changedAt: now(), board: state.board });
    if (state.save.kind === 'conflict') return;
    if (state.save.kind !== 'saving') store.setState({ save: { kind: 'waiting' } });
    later(debounceMs);
  });

  /** Undo has led back to what the server has. */
  function backAtSaved(): void {
    void drafts.remove();
    const { save, savedAt } = store.getState();
    if (save.kind !== 'saving' && save.kind !== 'conflict') store.setState({ save: { kind: 'saved', at: savedAt } });
  }

  async function flush(): Promise<void> {
    clearTimeout(timer);
    if (running) await running;
    const { save } = store.getState();
    if (!isDirty(store.getState()) || save.kind === 'conflict') return;
    running = once();
    try {
      await running;
    } finally {
      running = null;
    }
  }

  async function once(): Promise<void> {
    const { board, savedVersion } = store.getState();
    store.setState({ save: { kind: 'saving' } });
    try {
      const saved = await send(board, savedVersion);
      const { version, savedAt } = saved;
      store.setState({ savedBoard: board, savedVersion: version, savedAt, save: { kind: 'saved', at: savedAt } });
      onSaved?.(saved);
      if (isDirty(store.getState())) {
        store.setState({ save: { kind: 'waiting' } });
        later(debounceMs);
      } else {
        await drafts.remove();
      }
    } catch (error) {
      refuse(error);
    }
  }

  function refuse(error: unknown): void {
    if (!(error instanceof ProblemError)) {
      store.setState({ save: { kind: 'failed', reason: 'this page met a fault of its own' } });
      return;
    }
    const { current } = error.problem;
    if (error.status === 412 && current) {
      store.setState({ save: { kind: 'conflict', current } });
    } else if (error.code === 'offline' || error.status >= 502) {
      store.setState({ save: { kind: 'offline' } });
      later(retryMs);
    } else {
      const fault = error.problem.faults?.[0];
      store.setState({
        save: { kind: 'failed', reason: fault ? `${fault.path} ${fault.message}` : error.problem.detail },
      });
    }
  }

  return {
    flush,
    takeTheirs: async () => {
      const theirs = await load();
      adopt(store, `Take the version of ${theirs.savedBy}`, theirs.board, theirs.version, theirs.savedAt);
      await drafts.remove();
    },
    keepMine: async () => {
      const { save } = store.getState();
      if (save.kind !== 'conflict') return;
      store.setState({ savedVersion: save.current.version, save: { kind: 'waiting' } });
      await flush();
    },
    stop: () => {
      clearTimeout(timer);
      unsubscribe();
    },
  };
}
