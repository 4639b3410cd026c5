import { useQueryClient, useMutation } from '@tanstack/react-query';
import { Link, useLocation, useNavigate } from 'react-router-dom';
import type { SessionView } from '#core/contract/people.ts';
import { paths } from '#web/paths.ts';
import { clearDrafts } from '#web/editor/saving/draft-store.ts';
import { call } from '#web/server/call.ts';
import { sessionKey } from '#web/session/session-query.ts';
import { Button } from '#web/ui/button.tsx';
import { tabClass } from '#web/ui/tab-class.ts';
import { toast } from 'sonner';
import { ThemeSwitch } from './theme-switch.tsx';
import { Wordmark } from './wordmark.tsx';

/** Name, navigation, theme, who is signed in, the way out. */
export function Header({ session }: { session: SessionView }) {
  const client = useQueryClient();
  const navigate = useNavigate();
  const { pathname } = useLocation();
  const signOut = useMutation({
    mutationFn: () => call('signOut'),
    onSuccess: async () => {
      await navigate(paths.signIn(), { state: { signedOut: true } });
      // What this device has kept of sketches belongs to who signed out.
      await clearDrafts();
      client.clear();
      client.setQueryData(sessionKey, null);
    },
    onError: (error) => toast.error('You are still signed in', { description: error.message }),
  });
  const pages = [
    { to: paths.assemblies(), label: 'Assemblies', shown: true, also: '/revisions/' },
    { to: paths.library(), label: 'Library', shown: true },
    { to: paths.method(), label: 'Method', shown: true },
    { to: paths.team(), label: 'Team', shown: true },
    { to: paths.audit(), label: 'Audit', shown: session.allowed.includes('read-audit') },
    { to: paths.mail(), label: 'Mail', shown: session.allowed.includes('read-mail') },
  ];
  return (
    <header className="flex flex-wrap items-stretch gap-x-4 border-b border-line bg-panel px-4 sm:px-8 md:flex-nowrap lg:gap-x-7 print:hidden">
      <Link to={paths.assemblies()} className="flex min-h-12 items-center" aria-label="Dropwatt, all assemblies">
        <Wordmark />
      </Link>
      <nav
        aria-label="Main"
        className="flex min-h-12 min-w-0 items-stretch gap-x-2 overflow-x-auto text-sm lg:gap-x-5 lg:text-base"
      >
        {pages
          .filter((page) => page.shown)
          .map((page) => (
            <Link
              key={page.to}
              to={page.to}
              aria-current={
                pathname.startsWith(page.to) || (page.also && pathname.startsWith(page.also)) ? 'page' : undefined
              }
              className={tabClass}
            >
              {page.label}
            </Link>
          ))}
      </nav>
      <div className="ml-auto flex min-h-12 items-center gap-x-3 py-1 lg:gap-x-4">
        <Link
          to={paths.account()}
          className="flex min-h-8 max-w-28 flex-col lg:max-w-56 justify-center text-right text-xs leading-tight hover:text-copper"
        >
          <span className="truncate font-semibold">{session.member.name}</span>
          <span className="truncate text-ink-soft">{session.team.name}</span>
        </Link>
        <ThemeSwitch name="header-theme" />
        <Button
          size="small"
          variant="quiet"
          className="-mr-2.5"
          onClick={() => signOut.mutate()}
          disabled={signOut.isPending}
        >
          Sign out
        </Button>
      </div>
    </header>
  );
}
