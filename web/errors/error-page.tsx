import { useRouteError } from 'react-router-dom';
import { useDocumentTitle } from '#web/ui/document-title.ts';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { Wordmark } from '#web/layout/wordmark.tsx';

/** Last resort: a page that could not be loaded or drawn. */
export function ErrorPage() {
  const thrown = useRouteError();
  const error = thrown instanceof Error ? thrown : new Error('The page could not be loaded.');
  useDocumentTitle('Page not shown');
  return (
    <main id="content" className="mx-auto flex max-w-[44rem] flex-col gap-8 px-4 py-16 sm:px-8">
      <a href="/" className="self-start" aria-label="Dropwatt, start again">
        <Wordmark />
      </a>
      <div>
        <h1 className="text-2xl tracking-tight">This page could not be shown</h1>
        <p className="mt-3">
          What was saved before is kept. Load the page again; if it fails again, quote the text below.
        </p>
      </div>
      <ProblemNotice error={error} retry={() => window.location.reload()} />
    </main>
  );
}
