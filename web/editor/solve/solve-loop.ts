import type { Board } from '#core/board/document.ts';
import { type EditorStore, shownBoard } from '../editor-store.ts';
import { conditionCheck, withCheck } from './checks.ts';
import { previewCellMm } from './preview-cell.ts';
import type { SolveAnswer } from './solve.worker.ts';

export type Solve = (board: Board, condition: string, cellMm: number | null) => Promise<SolveAnswer>;

type Job = { board: Board; condition: string; fidelity: 'preview' | 'settled' };

/**
 * Keeps the temperatures up with the board: coarse for the active condition while a gesture is under way,
 * then every condition with the normal cell, the active one first. One calculation at a time; the newest board wins.
 * @returns function that ends it
 */
export function startSolving(store: EditorStore, solve: Solve): () => void {
  let running = false;
  let stopped = false;
  /** Boards that could not be calculated, so that they are not tried without end. */
  const refused = new WeakMap<Board, Set<string>>();

  const nextJob = (): Job | null => {
    const { board, live, checks, activeCondition } = store.getState();
    const isDone = (job: Job) => {
      const check = checks.byCondition.get(job.condition);
      return (
        (check?.board === job.board && (check.fidelity === 'settled' || job.fidelity === 'preview')) ||
        Boolean(refused.get(job.board)?.has(job.condition))
      );
    };
    if (live) {
      const job: Job | null = activeCondition ? { board: live, condition: activeCondition, fidelity: 'preview' } : null;
      return job && !isDone(job) ? job : null;
    }
    const names = board.conditions.map((condition) => condition.name);
    const ordered = [...names].sort((a, b) => Number(b === activeCondition) - Number(a === activeCondition));
    return (
      ordered.map((condition): Job => ({ board, condition, fidelity: 'settled' })).find((job) => !isDone(job)) ?? null
    );
  };

  const run = async (): Promise<void> => {
    if (running || stopped) return;
    running = true;
    for (let job = nextJob(); job && !stopped; job = nextJob()) {
      if (!store.getState().checks.busy) store.setState(({ checks }) => ({ checks: { ...checks, busy: true } }));
      await perform(job);
    }
    running = false;
    if (!stopped) store.setState(({ checks }) => (checks.busy ? { checks: { ...checks, busy: false } } : {}));
  };

  const perform = async (job: Job): Promise<void> => {
    try {
      const cellMm = job.fidelity === 'preview' ? previewCellMm(job.board) : null;
      const { result, field } = await solve(job.board, job.condition, cellMm);
      const check = conditionCheck(job.board, job.fidelity, job.condition, result, field);
      if (!check) return refuse(job, 'the condition is not in the result');
      if (!stopped) store.setState(({ checks }) => ({ checks: withCheck(checks, job.condition, check) }));
    } catch (error) {
      refuse(job, error instanceof Error ? error.message : String(error));
    }
  };

  const refuse = (job: Job, fault: string): void => {
    refused.set(job.board, (refused.get(job.board) ?? new Set()).add(job.condition));
    if (!stopped) store.setState(({ checks }) => ({ checks: { ...checks, fault } }));
  };

  const unsubscribe = store.subscribe((state, before) => {
    if (shownBoard(state) !== shownBoard(before) || state.activeCondition !== before.activeCondition) void run();
  });
  void run();
  return () => {
    stopped = true;
    unsubscribe();
  };
}
