import { expect, test } from 'vitest';
import { changesSinceSave, commit, isDirty, redo, undo } from '#web/editor/editor-store.ts';
import { setTitle } from '#core/board/edits/set-title.ts';
import { driveEditor } from './editor-driver.ts';

test('undo – 300 edits, then 300 times undo – the very same board as before, and redo leads back to the very same last one', () => {
  const { store } = driveEditor();
  const first = store.getState().board;
  for (let index = 1; index <= 300; index++)
    commit(store, `Title ${index}`, (board) => setTitle(board, `Title ${index}`));
  const last = store.getState().board;
  for (let index = 300; index >= 1; index--) expect(undo(store)).toBe(`Title ${index}`);
  expect(store.getState().board).toBe(first);
  expect(undo(store)).toBeNull();
  for (let index = 1; index <= 300; index++) expect(redo(store)).toBe(`Title ${index}`);
  expect(store.getState().board).toBe(last);
});

test('commit – an edit that changes nothing – no step', () => {
  const { store } = driveEditor();
  commit(store, 'Nothing', (board) => board);
  expect(store.getState().history.undo).toHaveLength(0);
});

test('commit – after an undo – what had been taken back cannot be redone', () => {
  const { store } = driveEditor();
  commit(store, 'A', (board) => setTitle(board, 'A'));
  undo(store);
  commit(store, 'B', (board) => setTitle(board, 'B'));
  expect(redo(store)).toBeNull();
  expect(store.getState().board.title).toBe('B');
});

test('commit – in a read-only sketch – neither board nor history changes', () => {
  const { store } = driveEditor('The revision is cleared.');
  const before = store.getState().board;
  commit(store, 'A', (board) => setTitle(board, 'A'));
  expect(store.getState().board).toBe(before);
  expect(store.getState().history.undo).toHaveLength(0);
});

test('undo – of a deletion – the object is back with its loads and feeds; of its placement – it is no longer selected', () => {
  const hand = driveEditor();
  hand.tool('probe');
  hand.click([25, 25]);
  expect(hand.selection()).toEqual(['probe:t1']);
  hand.undo();
  expect(hand.selection()).toEqual([]);
});

test('changes since the save – three steps done, two of them taken back – one; back at the saved board – none', () => {
  const { store } = driveEditor();
  for (const title of ['A', 'B', 'C']) commit(store, title, (board) => setTitle(board, title));
  expect(changesSinceSave(store.getState())).toBe(3);
  undo(store);
  undo(store);
  expect(changesSinceSave(store.getState())).toBe(1);
  undo(store);
  expect(changesSinceSave(store.getState())).toBe(0);
  expect(isDirty(store.getState())).toBe(false);
});
