import type { ReactNode } from 'react';

export type NoticeTone = 'note' | 'warn' | 'stop' | 'caution';

const tones: Record<NoticeTone, { edge: string; text: string; word: string; sign: ReactNode }> = {
  note: {
    edge: 'border-l-ink-soft',
    text: 'text-ink-soft',
    word: 'Note',
    sign: <path d="M8 2.2a5.8 5.8 0 1 0 0 11.6A5.8 5.8 0 0 0 8 2.2zM8 7.2V11M8 4.9v.3" />,
  },
  warn: {
    edge: 'border-l-close',
    text: 'text-close',
    word: 'Warning',
    sign: <path d="M8 1.6L14.4 8 8 14.4 1.6 8zM8 5v3.6M8 10.6v.3" />,
  },
  stop: {
    edge: 'border-l-over',
    text: 'text-over',
    word: 'Stop',
    sign: <path d="M5.4 1.8h5.2l3.6 3.6v5.2l-3.6 3.6H5.4l-3.6-3.6V5.4zM4.8 8h6.4" />,
  },
  caution: {
    edge: 'border-l-close',
    text: 'text-close',
    word: 'Caution',
    sign: <path d="M8 1.6L15 14H1zM8 6v4M8 11.7v.3" />,
  },
};

type Props = {
  tone: NoticeTone;
  title: string;
  children?: ReactNode;
  action?: ReactNode;
  /** Read out at once; for what has just gone wrong. */
  alert?: boolean;
};

/** A message in the page. `caution` is kept for hazards to people or property. */
export function Notice({ tone, title, children, action, alert = false }: Props) {
  const { edge, text, word, sign } = tones[tone];
  return (
    <div
      role={alert ? 'alert' : undefined}
      className={`flex gap-3 border border-l-4 border-line bg-panel px-4 py-3 ${edge}`}
    >
      <svg
        aria-hidden="true"
        width="20"
        height="20"
        viewBox="0 0 16 16"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.5"
        className={`mt-0.5 shrink-0 ${text}`}
      >
        {sign}
      </svg>
      <div className="min-w-0 flex-1">
        <p className="font-semibold break-words">
          <span className={tone === 'caution' ? text : 'sr-only'}>{word}: </span>
          {title}
        </p>
        {children ? <div className="text-sm break-words text-ink">{children}</div> : null}
        {action ? <div className="mt-2 flex flex-wrap gap-3">{action}</div> : null}
      </div>
    </div>
  );
}
