import type { ReactNode } from 'react';
import type { Finding } from '#core/result/result.ts';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { idOf, objectKeys } from '#core/board/object-key.ts';
import { useFindings } from './use-findings.ts';

const severities = {
  stop: { word: 'Stop', className: 'text-over', sign: 'M5.4 1.8h5.2l3.6 3.6v5.2l-3.6 3.6H5.4l-3.6-3.6V5.4zM4.8 8h6.4' },
  warn: { word: 'Warning', className: 'text-close', sign: 'M8 1.6L14.4 8 8 14.4 1.6 8zM8 5v3.6M8 10.6v.3' },
  note: {
    word: 'Note',
    className: 'text-ink-soft',
    sign: 'M8 2.2a5.8 5.8 0 1 0 0 11.6A5.8 5.8 0 0 0 8 2.2zM8 7.2V11M8 4.9v.3',
  },
  caution: { word: 'Caution', className: 'text-close', sign: 'M8 1.6L15 14H1zM8 6v4M8 11.7v.3' },
} as const;

/** What is wrong or doubtful, with place and remedy; what stops the board stands first, then the hazards. */
export function FindingList() {
  const { findings, cautions } = useFindings();
  const isThere = useEditor((state) => state.checks.byCondition.size > 0);
  if (findings.length === 0 && cautions.length === 0) {
    return (
      <p className="p-4 text-sm text-ink-soft">
        {isThere
          ? 'Nothing was found wrong or doubtful in this sketch.'
          : 'Findings appear when the first condition has been calculated.'}
      </p>
    );
  }
  return (
    <ul>
      {findings.filter(isStop).map(findingEntry)}
      {cautions.map((caution) => (
        <Entry key={`${caution.kind} ${caution.ref} ${caution.condition}`} severity="caution" item={caution} />
      ))}
      {findings.filter((finding) => !isStop(finding)).map(findingEntry)}
    </ul>
  );
}

const isStop = ({ severity }: Finding) => severity === 'stop';

function findingEntry(finding: Finding) {
  const { rule, ref, condition, message, severity, remedy } = finding;
  return (
    <Entry key={`${rule} ${ref} ${condition} ${message}`} severity={severity} item={finding}>
      <span className="block text-sm text-ink-soft">{remedy}</span>
    </Entry>
  );
}

type Item = { ref: string | null; condition: string | null; message: string };

function Entry({ severity, item, children }: { severity: keyof typeof severities; item: Item; children?: ReactNode }) {
  const store = useEditorStore();
  const { word, className, sign } = severities[severity];
  const place = [item.ref, item.condition].filter(Boolean).join(' · ') || 'Whole board';
  const show = () => {
    const { board } = store.getState();
    const key = objectKeys(board).find((candidate) => item.ref !== null && idOf(candidate) === item.ref);
    store.setState({
      ...(key && { selection: [key] }),
      ...(item.condition && { activeCondition: item.condition }),
    });
  };
  return (
    <li className="border-b border-line">
      <button type="button" onClick={show} className="flex w-full gap-3 px-4 py-2.5 text-left hover:bg-copper-soft">
        <svg
          aria-hidden="true"
          width="18"
          height="18"
          viewBox="0 0 16 16"
          fill="none"
          stroke="currentColor"
          strokeWidth="1.5"
          className={`mt-0.5 shrink-0 ${className}`}
        >
          <path d={sign} />
        </svg>
        <span className="min-w-0">
          <span className="block text-sm">
            <span className={`font-semibold ${className}`}>{word}</span> · {place}
          </span>
          <span className="block text-sm font-semibold break-words">{item.message}</span>
          {children}
        </span>
      </button>
    </li>
  );
}
