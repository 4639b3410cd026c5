import type { Board } from '#core/board/document.ts';
import { type EditorState, type EditorStore, shownBoard } from '../editor-store.ts';
import { type ConditionCheck, conditionCheck, isCurrent, withCheck } from './checks.ts';
import { previewCellMm } from './preview-cell.ts';
import type { SolveAnswer } from './solve.worker.ts';

export type Solve = (board: Board, condition: string, cellMm: number | null) => Promise<SolveAnswer>;
/** Two places to calculate, so that a long settled calculation never keeps a preview waiting. */
export type Solvers = { preview: Solve; settled: Solve };

type Lane = keyof Solvers;
type Fidelity = ConditionCheck['fidelity'];
type Job = { board: Board; condition: string; fidelity: Fidelity };

/**
 * Keeps the temperatures up with the board: coarse for the active condition while something is moved, finer as soon as
 * it rests, and at last every condition with the normal cell, the active one first. One calculation in each place at a
 * time; the newest board wins.
 * @returns function that ends it
 */
export function startSolving(store: EditorStore, solvers: Solvers): () => void {
  const running = new Set<Lane>();
  let stopped = false;
  /** Boards and conditions that could not be calculated, so that they are not tried without end. */
  const refused: Record<Lane, WeakMap<Board, Set<string>>> = { preview: new WeakMap(), settled: new WeakMap() };

  const isOpen = (lane: Lane, { board, condition, fidelity }: Job) => {
    const check = store.getState().checks.byCondition.get(condition);
    const isDone = check?.board === board && ranks[check.fidelity] >= ranks[fidelity];
    return !isDone && !refused[lane].get(board)?.has(condition);
  };

  const run = async (lane: Lane): Promise<void> => {
    if (running.has(lane) || stopped) return;
    running.add(lane);
    const next = () => jobs[lane](store.getState()).find((job) => isOpen(lane, job));
    for (let job = next(); job && !stopped; job = next()) {
      tell();
      await perform(lane, job);
    }
    running.delete(lane);
    tell();
  };

  const perform = async (lane: Lane, job: Job): Promise<void> => {
    const { board, condition, fidelity } = job;
    try {
      const { result, field } = await solvers[lane](board, condition, cellOf(job));
      const check = conditionCheck(board, fidelity, condition, result, field);
      if (!check) return refuse(lane, job, 'the condition is not in the result');
      if (stopped) return;
      store.setState((state) => {
        const present = state.checks.byCondition.get(condition);
        // A preview that comes late must not take the place of the full answer.
        if (lane === 'preview' && present && isCurrent(present, shownBoard(state))) return {};
        return { checks: withCheck(state.checks, condition, check) };
      });
    } catch (error) {
      refuse(lane, job, error instanceof Error ? error.message : String(error));
    }
  };

  const refuse = (lane: Lane, { board, condition }: Job, fault: string): void => {
    refused[lane].set(board, (refused[lane].get(board) ?? new Set()).add(condition));
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

const ranks: Record<Fidelity, number> = { preview: 0, refined: 1, settled: 2 };

const jobs: Record<Lane, (state: EditorState) => Job[]> = {
  preview({ board, live, activeCondition: condition }) {
    if (condition === null) return [];
    return [live ? { board: live, condition, fidelity: 'preview' } : { board, condition, fidelity: 'refined' }];
  },
  settled({ board, live, activeCondition }) {
    if (live) return [];
    const names = board.conditions.map((condition) => condition.name);
    const ordered = [...names].sort((a, b) => Number(b === activeCondition) - Number(a === activeCondition));
    return ordered.map((condition) => ({ board, condition, fidelity: 'settled' }));
  },
};

function cellOf({ board, fidelity }: Job): number | null {
  return fidelity === 'settled' ? null : previewCellMm(board, fidelity);
}
