import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import type { Board } from '#core/board/document.ts';
import type { Problem } from '#core/contract/problem.ts';
import { setTitle } from '#core/board/edits/set-title.ts';
import { commit, undo } from '#web/editor/editor-store.ts';
import { startAutosave } from '#web/editor/saving/autosave.ts';
import type { Draft, DraftStore } from '#web/editor/saving/draft-store.ts';
import { saveStateText } from '#web/editor/saving/save-state.ts';
import { ProblemError, offlineProblem } from '#web/server/problem-error.ts';
import { driveEditor } from './editor-driver.ts';

beforeEach(() => vi.useFakeTimers());
afterEach(() => vi.useRealTimers());

const problemOf = (status: number, extra: Partial<Problem> = {}): ProblemError =>
  new ProblemError({ type: 'about:blank', title: 'Refused', status, code: 'refused', detail: 'Refused.', ...extra });

/** A server that answers what it is told next, and a device that keeps one draft. */
function setUp() {
  const { store } = driveEditor();
  const sent: { title: string; over: number }[] = [];
  const answers: (ProblemError | 'ok')[] = [];
  let version = 1;
  let kept: Draft | null = null;
  const drafts: DraftStore = {
    read: async () => kept,
    write: async (draft) => void (kept = draft),
    remove: async () => void (kept = null),
  };
  const theirs = setTitle(store.getState().board, 'Theirs');
  const autosave = startAutosave({
    store,
    drafts,
    now: () => '2026-03-01T10:01:00.000Z',
    async send(board: Board, over) {
      sent.push({ title: board.title, over });
      const answer = answers.shift() ?? 'ok';
      if (answer !== 'ok') throw answer;
      version = over + 1;
      return { version, savedAt: '2026-03-01T10:02:00.000Z' };
    },
    load: async () => ({ board: theirs, version: 7, savedAt: '2026-03-01T10:01:30.000Z', savedBy: 'Saoirse Quill' }),
  });
  const change = (title: string) => commit(store, title, (board) => setTitle(board, title));
  return { store, sent, answers, autosave, change, theirs, draft: () => kept, save: () => store.getState().save };
}

test('autosave – three quick changes – one save, two seconds later at most, over the version it was made from', async () => {
  const { sent, change, save, draft } = setUp();
  change('A');
  change('B');
  change('C');
  expect(save()).toEqual({ kind: 'waiting' });
  expect(draft()?.board.title).toBe('C');
  await vi.advanceTimersByTimeAsync(2000);
  expect(sent).toEqual([{ title: 'C', over: 1 }]);
  expect(save()).toEqual({ kind: 'saved', at: '2026-03-01T10:02:00.000Z' });
  expect(draft()).toBeNull();
});

test('autosave – a change while a save is under way – is saved next, over the version that came back', async () => {
  const { sent, change, autosave } = setUp();
  change('A');
  const first = autosave.flush();
  change('B');
  await first;
  await vi.advanceTimersByTimeAsync(2000);
  expect(sent).toEqual([
    { title: 'A', over: 1 },
    { title: 'B', over: 2 },
  ]);
});

test('autosave – undo back to the saved board – nothing is sent, and it says saved again', async () => {
  const { store, sent, change, save } = setUp();
  change('A');
  undo(store);
  await vi.advanceTimersByTimeAsync(5000);
  expect(sent).toEqual([]);
  expect(save()).toEqual({ kind: 'saved', at: '2026-03-01T10:00:00.000Z' });
});

test('autosave – no connection – says so, keeps the draft, tries again and saves', async () => {
  const { answers, sent, change, save, draft } = setUp();
  answers.push(new ProblemError(offlineProblem));
  change('A');
  await vi.advanceTimersByTimeAsync(2000);
  expect(save()).toEqual({ kind: 'offline' });
  expect(draft()?.board.title).toBe('A');
  await vi.advanceTimersByTimeAsync(6000);
  expect(sent).toHaveLength(2);
  expect(save().kind).toBe('saved');
});

test('autosave – refused for a field – says which, and never "saved"', async () => {
  const { answers, change, save } = setUp();
  answers.push(problemOf(422, { faults: [{ path: 'pours[0].layer', message: 'is not a layer' }] }));
  change('A');
  await vi.advanceTimersByTimeAsync(2000);
  expect(save()).toEqual({ kind: 'failed', reason: 'pours[0].layer is not a layer' });
});

const current = { version: 7, savedBy: 'Saoirse Quill', savedAt: '2026-03-01T10:01:30.000Z' };

test('conflict – somebody saved meanwhile – nothing more is sent until a way out is chosen, the draft stays', async () => {
  const { answers, sent, change, save, draft } = setUp();
  answers.push(problemOf(412, { current }));
  change('A');
  await vi.advanceTimersByTimeAsync(2000);
  expect(save()).toEqual({ kind: 'conflict', current });
  change('B');
  await vi.advanceTimersByTimeAsync(20_000);
  expect(sent).toHaveLength(1);
  expect(draft()?.board.title).toBe('B');
});

test('conflict, keep mine – saves over their version', async () => {
  const { answers, sent, change, save, autosave } = setUp();
  answers.push(problemOf(412, { current }));
  change('Mine');
  await vi.advanceTimersByTimeAsync(2000);
  await autosave.keepMine();
  expect(sent.at(-1)).toEqual({ title: 'Mine', over: 7 });
  expect(save().kind).toBe('saved');
});

test('conflict, take theirs – shows theirs as saved; undo brings mine back, which is then saved over theirs', async () => {
  const { store, answers, sent, change, autosave, theirs } = setUp();
  answers.push(problemOf(412, { current }));
  change('Mine');
  await vi.advanceTimersByTimeAsync(2000);
  await autosave.takeTheirs();
  expect(store.getState().board).toBe(theirs);
  expect(store.getState().save).toEqual({ kind: 'saved', at: current.savedAt });
  await vi.advanceTimersByTimeAsync(5000);
  expect(sent).toHaveLength(1);
  undo(store);
  await vi.advanceTimersByTimeAsync(2000);
  expect(sent.at(-1)).toEqual({ title: 'Mine', over: 7 });
});

test('save state – in words – says how many changes are kept here', () => {
  const time = () => '12:03';
  expect(saveStateText({ kind: 'saved', at: '' }, 0, time)).toBe('Saved 12:03');
  expect(saveStateText({ kind: 'offline' }, 3, time)).toBe('Offline, 3 changes kept here');
  expect(saveStateText({ kind: 'conflict', current }, 1, time)).toBe(
    'Not saved: Saoirse Quill saved meanwhile, 1 change kept here',
  );
});
