import { useMemo } from 'react';
import type { Caution, Finding } from '#core/result/result.ts';
import { useEditor } from '../editor-context.ts';
import { merged } from '../solve/checks.ts';

const ranks = { stop: 0, warn: 1, note: 2 } as const;

/** Findings and cautions of every condition that was calculated here, the gravest first. */
export function useFindings(): { findings: Finding[]; cautions: Caution[] } {
  const byCondition = useEditor((state) => state.checks.byCondition);
  return useMemo(() => {
    const checks = [...byCondition.values()];
    return {
      findings: merged(checks.map((check) => check.findings)).sort((a, b) => ranks[a.severity] - ranks[b.severity]),
      cautions: merged(checks.map((check) => check.cautions)),
    };
  }, [byCondition]);
}
