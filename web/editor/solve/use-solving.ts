import * as Comlink from 'comlink';
import { useEffect } from 'react';
import { formatQuantity } from '#core/format.ts';
import { announce } from '#web/ui/announce.ts';
import { verdictWords } from '#web/ui/verdict-words.ts';
import { activeCheck } from '../canvas/use-heat-picture.ts';
import type { EditorStore } from '../editor-store.ts';
import { type ConditionCheck, isCurrent } from './checks.ts';
import { type Solve, startSolving } from './solve-loop.ts';
import type { SolveWorker } from './solve.worker.ts';

/** Runs the calculation in workers as long as the page is open, and says the settled results aloud. */
export function useSolving(store: EditorStore): void {
  useEffect(() => {
    const workers = { preview: startWorker(), settled: startWorker() };
    const solveIn = (worker: Worker): Solve => {
      const remote = Comlink.wrap<SolveWorker>(worker);
      return (board, condition, cellMm) => remote.solve(board, condition, cellMm);
    };
    const stop = startSolving(store, { preview: solveIn(workers.preview), settled: solveIn(workers.settled) });
    const silence = store.subscribe((state, before) => {
      const check = activeCheck(state);
      if (check && check !== activeCheck(before) && isCurrent(check, state.board)) announce(spoken(check));
    });
    return () => {
      stop();
      silence();
      workers.preview.terminate();
      workers.settled.terminate();
    };
  }, [store]);
}

function startWorker(): Worker {
  return new Worker(new URL('./solve.worker.ts', import.meta.url), { type: 'module' });
}

/** Junction temperatures and verdicts of a condition in one sentence. */
export function spoken({ condition }: ConditionCheck): string {
  const parts = condition.regulators.map(
    (regulator) => `${regulator.ref} ${formatQuantity(regulator.junctionC, '°C')}, ${verdictWords[regulator.verdict]}`,
  );
  return `${condition.name}: ${verdictWords[condition.verdict]}. ${parts.join('; ')}`;
}
