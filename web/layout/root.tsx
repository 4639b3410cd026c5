import { Outlet, ScrollRestoration } from 'react-router-dom';
import { Toaster } from 'sonner';
import { NavigationProgress } from './navigation-progress.tsx';
import { LiveRegion } from '#web/ui/live-region.tsx';

/** What every page has, signed in or not. */
export function Root() {
  return (
    <>
      <a
        href="#content"
        className="sr-only rounded-sm bg-ink px-4 py-2 font-semibold text-paper focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-50"
      >
        Skip to the content
      </a>
      <NavigationProgress />
      <Outlet />
      <ScrollRestoration />
      <LiveRegion />
      <Toaster
        position="bottom-right"
        closeButton
        style={{ fontFamily: 'inherit' }}
        duration={6000}
        toastOptions={{
          unstyled: true,
          classNames: {
            toast:
              'flex w-full items-start gap-3 rounded-md border border-line-strong border-l-4 border-l-copper bg-panel px-4 py-3 text-sm text-ink',
            title: 'font-semibold',
            description: 'text-ink-soft',
            closeButton: 'order-last ml-auto size-6 rounded-sm text-ink-soft hover:text-ink',
            actionButton: 'ml-auto font-semibold text-copper underline underline-offset-4',
          },
        }}
      />
    </>
  );
}
