import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { useDocumentTitle } from './document-title.ts';

type Props = {
  title: string;
  /** Pages above this one, the highest first. */
  trail?: readonly { label: string; to: string }[];
  actions?: ReactNode;
  children: ReactNode;
};

/** Frame of an ordinary page: trail, heading, actions, content. */
export function Page({ title, trail = [], actions, children }: Props) {
  useDocumentTitle(title);
  return (
    <div className="mx-auto w-full max-w-[82rem] px-4 py-8 sm:px-8">
      {trail.length > 0 ? (
        <nav aria-label="Trail" className="mb-2 flex flex-wrap gap-x-2 text-sm text-ink-soft">
          {trail.map((step) => (
            <span key={step.to}>
              <Link to={step.to} className="inline-block py-0.5 underline underline-offset-4 hover:text-copper">
                {step.label}
              </Link>
              <span aria-hidden="true"> /</span>
            </span>
          ))}
        </nav>
      ) : null}
      <div className="mb-8 flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
        <h1 className="text-2xl tracking-tight">{title}</h1>
        {actions ? <div className="flex flex-wrap gap-3">{actions}</div> : null}
      </div>
      {children}
    </div>
  );
}
