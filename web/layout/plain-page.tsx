import type { ReactNode } from 'react';
import { useDocumentTitle } from '#web/ui/document-title.ts';
import { OfflineNotice } from './offline-notice.tsx';
import { ThemeSwitch } from './theme-switch.tsx';
import { Wordmark } from './wordmark.tsx';

/** Page of somebody who is not signed in: the name, what the product is for, and one form. */
export function PlainPage({ title, children }: { title: string; children: ReactNode }) {
  useDocumentTitle(title);
  return (
    <div className="flex min-h-dvh flex-col">
      <OfflineNotice />
      <main
        id="content"
        tabIndex={-1}
        className="mx-auto grid w-full max-w-[72rem] flex-1 content-center gap-x-20 gap-y-12 px-4 py-12 outline-none sm:px-8 md:grid-cols-[1.1fr_1fr]"
      >
        <div className="self-center">
          <Wordmark large />
          <p className="mt-5 max-w-[24rem] text-lg text-ink-soft">
            Every linear regulator inside its derated limits, on the board it really sits on.
          </p>
          <div className="mt-8">
            <ThemeSwitch name="plain-theme" words />
          </div>
        </div>
        <div className="self-center border-line md:border-l md:pl-14">
          <h1 className="mb-6 text-2xl tracking-tight">{title}</h1>
          {children}
        </div>
      </main>
    </div>
  );
}
