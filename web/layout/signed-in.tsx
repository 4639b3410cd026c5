import { useQuery } from '@tanstack/react-query';
import { Navigate, Outlet, useLocation, useMatches } from 'react-router-dom';
import { paths } from '#web/paths.ts';
import { SessionEnding } from '#web/session/session-ending.tsx';
import { sessionQuery } from '#web/session/session-query.ts';
import { useFocusAfterNavigation } from './focus-after-navigation.ts';
import { Header } from './header.tsx';
import { OfflineNotice } from './offline-notice.tsx';

/** A route with `handle: { fill: true }` takes the height of the window instead of scrolling as a whole. */
function useFill(): boolean {
  return useMatches().some(({ handle }) => typeof handle === 'object' && handle !== null && 'fill' in handle);
}

/** Frame of every page behind the sign-in; when the session ends it leads there, and back afterwards. */
export function SignedIn() {
  const { data: session } = useQuery(sessionQuery);
  const location = useLocation();
  const fill = useFill();
  useFocusAfterNavigation();
  if (session === null) {
    return <Navigate to={paths.signIn(location.pathname + location.search)} replace state={{ ended: true }} />;
  }
  if (!session) return null;
  return (
    <div className={fill ? 'flex h-dvh min-h-[36rem] flex-col' : 'flex min-h-dvh flex-col'}>
      <Header session={session} />
      <OfflineNotice />
      <SessionEnding key={session.expiresAt} session={session} />
      <main id="content" tabIndex={-1} className="flex min-h-0 min-w-0 flex-1 flex-col outline-none">
        <Outlet />
      </main>
    </div>
  );
}
