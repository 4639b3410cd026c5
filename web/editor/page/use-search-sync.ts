import { useEffect } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { EditorStore } from '../editor-store.ts';
import { idOf, objectKeys } from '#core/board/object-key.ts';

/** Condition and selection live in the address, so that a link leads to the same view. */
export function useSearchSync(store: EditorStore): void {
  const [search, setSearch] = useSearchParams();
  const condition = search.get('condition');
  const select = search.get('select');

  useEffect(() => {
    const { board, activeCondition } = store.getState();
    if (condition !== activeCondition && board.conditions.some((candidate) => candidate.name === condition)) {
      store.setState({ activeCondition: condition });
    }
  }, [store, condition]);

  useEffect(() => {
    const { board, selection } = store.getState();
    if (selection.some((key) => idOf(key) === select)) return;
    const key = select && objectKeys(board).find((candidate) => idOf(candidate) === select);
    if (key) store.setState({ selection: [key] });
  }, [store, select]);

  useEffect(
    () =>
      store.subscribe((state, before) => {
        if (state.selection === before.selection && state.activeCondition === before.activeCondition) return;
        const only = state.selection.length === 1 && state.selection[0] ? idOf(state.selection[0]) : '';
        setSearch(
          (previous) => {
            const next = new URLSearchParams(previous);
            if (state.activeCondition) next.set('condition', state.activeCondition);
            if (only) next.set('select', only);
            else next.delete('select');
            return next;
          },
          { replace: true, preventScrollReset: true },
        );
      }),
    [store, setSearch],
  );
}
