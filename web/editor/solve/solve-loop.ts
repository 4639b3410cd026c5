import type { Board } from '#core/board/document.ts';
import { type EditorState, type EditorStore, shownBoard } from '../editor-store.ts';
import { conditionCheck, isCurrent, withCheck } from './checks.ts';
import { previewCellMm } from './preview-cell.ts';
import type { SolveAnswer } from './solve.worker.ts';

export type Solve = (board: Board, condition: string, cellMm: number | null) => Promise<SolveAnswer>;
/** Two places to calculate, so that a long settled calculation never keeps a preview waiting. */
export type Solvers = { preview: Solve; settled: Solve };

type Fidelity = keyof Solvers;
type Job = { board: Board; condition: string };

/**
 * Keeps the temperatures up with the board: coarse for the active condition as soon as anything changes, then, once no
 * gesture is under way, every condition with the normal cell, the active one first. One calculation of each kind at a
 * time; the newest board wins.
 * @returns function that ends it
 */
export function startSolving(store: EditorStore, solvers: Solvers): () => void {
  const running = new Set<Fidelity>();
  let stopped = false;
  /** Boards and conditions that could not be calculated, so that they are not tried without end. */
  const refused: Record<Fidelity, WeakMap<Board, Set<string>>> = { preview: new WeakMap(), settled: new WeakMap() };

  const isOpen = (fidelity: Fidelity, { board, condition }: Job) => {
    const check = store.getState().checks.byCondition.get(condition);
    const isDone = check?.board === board && (fidelity === 'preview' || check.fidelity === 'settled');
    return !isDone && !refused[fidelity].get(board)?.has(condition);
  };

  const run = async (fidelity: Fidelity): Promise<void> => {
    if (running.has(fidelity) || stopped) return;
    running.add(fidelity);
    const next = () => jobs[fidelity](store.getState()).find((job) => isOpen(fidelity, job));
    for (let job = next(); job && !stopped; job = next()) {
      tell();
      await perform(fidelity, job);
    }
    running.delete(fidelity);
    tell();
  };

  const perform = async (fidelity: Fidelity, job: Job): Promise<void> => {
    try {
      const cellMm = fidelity === 'preview' ? previewCellMm(job.board) : null;
      const { result, field } = await solvers[fidelity](job.board, job.condition, cellMm);
      const check = conditionCheck(job.board, fidelity, job.condition, result, field);
      if (!check) return refuse(fidelity, job, 'the condition is not in the result');
      if (stopped) return;
      store.setState((state) => {
        const present = state.checks.byCondition.get(job.condition);
        // A preview that comes late must not take the place of the full answer.
        if (fidelity === 'preview' && present && isCurrent(present, shownBoard(state))) return {};
        return { checks: withCheck(state.checks, job.condition, check) };
      });
    } catch (error) {
      refuse(fidelity, job, error instanceof Error ? error.message : String(error));
    }
  };

  const refuse = (fidelity: Fidelity, { board, condition }: Job, fault: string): void => {
    refused[fidelity].set(board, (refused[fidelity].get(board) ?? new Set()).add(condition));
    if (!stopped) store.setState(({ checks }) => ({ checks: { ...checks, fault } }));
  };

  const tell = (): void => {
    const busy = running.has('settled');
    if (!stopped) store.setState(({ checks }) => (checks.busy === busy ? {} : { checks: { ...checks, busy } }));
  };

  const unsubscribe = store.subscribe((state, before) => {
    if (shownBoard(state) === shownBoard(before) && state.activeCondition === before.activeCondition) {
      // A gesture that ends where it began leaves the board as it was, but settles.
      if (state.live === before.live) return;
    }
    void run('preview');
    void run('settled');
  });
  void run('preview');
  void run('settled');
  return () => {
    stopped = true;
    unsubscribe();
  };
}

const jobs: Record<Fidelity, (state: EditorState) => Job[]> = {
  preview: (state) =>
    state.activeCondition === null ? [] : [{ board: shownBoard(state), condition: state.activeCondition }],
  settled({ board, live, activeCondition }) {
    if (live) return [];
    const names = board.conditions.map((condition) => condition.name);
    const ordered = [...names].sort((a, b) => Number(b === activeCondition) - Number(a === activeCondition));
    return ordered.map((condition) => ({ board, condition }));
  },
};
