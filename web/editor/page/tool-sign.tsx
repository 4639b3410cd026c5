import type { ReactNode } from 'react';
import type { ToolName } from '../tools/tool-name.ts';

const signs: Record<ToolName, ReactNode> = {
  select: <path d="M3.5 2l8.5 6-4 .8 2 4.2-1.8.9-2-4.3-2.7 2.6z" />,
  hand: <path d="M8 1.8v12.4M1.8 8h12.4M6 3.6l2-1.8 2 1.8M6 12.4l2 1.8 2-1.8M3.6 6L1.8 8l1.8 2M12.4 6l1.8 2-1.8 2" />,
  outline: <path d="M2 4.5L6 2h8v9.5L10.5 14H2z" />,
  pour: (
    <>
      <path d="M2.5 3h11v10h-11z" />
      <path d="M2.5 9l6-6M2.5 13l10-10M7.5 13l6-6" />
    </>
  ),
  cutout: (
    <>
      <path d="M2 2h12v12H2z" />
      <path d="M5.5 6h5v4h-5z" strokeDasharray="1.8 1.2" />
    </>
  ),
  'via-field': (
    <path d="M4.5 3a1.6 1.6 0 1 0 .01 0zM11.5 3a1.6 1.6 0 1 0 .01 0zM4.5 9.8a1.6 1.6 0 1 0 .01 0zM11.5 9.8a1.6 1.6 0 1 0 .01 0z" />
  ),
  regulator: <path d="M3.5 2.5h9v6h-9zM5 8.5V14M8 8.5V12M11 8.5V14" />,
  source: <path d="M2.5 5.5h11v5h-11zM5 2v2M8 1.4V4M11 2v2" />,
  sink: <path d="M8 2v6M3 8h10M4.8 10.5h6.4M6.5 13h3" />,
  probe: <path d="M8 4.4a3.6 3.6 0 1 0 .01 0zM8 1.5V6M8 10v4.5M1.5 8H6M10 8h4.5" />,
};

/** Small drawing beside a tool's name. */
export function ToolSign({ name }: { name: ToolName }) {
  return (
    <svg
      aria-hidden="true"
      width="15"
      height="15"
      viewBox="0 0 16 16"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.3"
      strokeLinejoin="round"
      className="shrink-0"
    >
      {signs[name]}
    </svg>
  );
}
