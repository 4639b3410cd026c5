import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import type { SessionView } from '#core/contract/people.ts';
import { Button } from '#web/ui/button.tsx';
import { RenewSession } from './renew-session.tsx';
import { sessionKey } from './session-query.ts';

const warnBeforeMs = 10 * 60_000;
/** The longest wait that a timer of a browser can hold. */
const longestWaitMs = 2 ** 31 - 1;
const clock = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });

/** Says ten minutes ahead when the session will end, with a way to go on without leaving the page. One per session. */
export function SessionEnding({ session }: { session: SessionView }) {
  const client = useQueryClient();
  const end = Date.parse(session.expiresAt);
  const [near, setNear] = useState(() => end - Date.now() <= warnBeforeMs);
  const [renewing, setRenewing] = useState(false);
  useEffect(() => {
    const left = end - Date.now();
    const warn = setTimeout(() => setNear(true), Math.min(Math.max(left - warnBeforeMs, 0), longestWaitMs));
    // A second late, so that the server has ended it for certain when it is asked.
    const finish = setTimeout(
      () => void client.invalidateQueries({ queryKey: sessionKey }),
      Math.min(Math.max(left, 0) + 1000, longestWaitMs),
    );
    return () => {
      clearTimeout(warn);
      clearTimeout(finish);
    };
  }, [client, end]);
  return (
    <>
      <div role="status">
        {near ? (
          <div className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-line bg-copper-soft px-4 py-1.5 text-sm sm:px-8 print:hidden">
            <p>
              Your session ends at <strong>{clock.format(end)}</strong>.
            </p>
            <Button size="small" onClick={() => setRenewing(true)}>
              Stay signed in
            </Button>
          </div>
        ) : null}
      </div>
      {renewing ? <RenewSession email={session.member.email} onClose={() => setRenewing(false)} /> : null}
    </>
  );
}
