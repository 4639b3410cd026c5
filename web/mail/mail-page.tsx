import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { Button } from '#web/ui/button.tsx';
import { Empty } from '#web/ui/empty.tsx';
import { Loading } from '#web/ui/loading.tsx';
import { Page } from '#web/ui/page.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { Timestamp } from '#web/ui/timestamp.tsx';
import { MailText } from './mail-text.tsx';
import { mailQuery } from './mail-query.ts';

export function Component() {
  const mail = useQuery(mailQuery);
  const [search, setSearch] = useSearchParams();
  const messages = mail.data?.items ?? [];
  const open = messages.find(({ id }) => id === search.get('show')) ?? messages[0];
  return (
    <Page
      title="Mail"
      actions={
        <Button onClick={() => void mail.refetch()} disabled={mail.isFetching}>
          {mail.isFetching ? 'Looking …' : 'Look for new mail'}
        </Button>
      }
    >
      <p className="-mt-4 mb-6 max-w-prose text-ink-soft">
        This installation sends no mail to the outside. What it would have sent is caught and shown here, to
        administrators only.
      </p>
      {mail.error && !mail.data ? (
        <ProblemNotice error={mail.error} retry={() => void mail.refetch()} />
      ) : !mail.data ? (
        <Loading what="the mail" />
      ) : !open ? (
        <Empty title="No message yet">
          Invite a member or ask for a password reset; the message with its link appears here within seconds.
        </Empty>
      ) : (
        <div className="grid gap-x-10 gap-y-8 border-t border-line-strong md:grid-cols-[20rem_1fr]">
          <ul aria-label="Messages" className="max-h-[70dvh] overflow-y-auto md:border-r md:border-line">
            {messages.map((message) => (
              <li key={message.id} className="border-b border-line">
                <button
                  type="button"
                  aria-current={message.id === open.id || undefined}
                  onClick={() => setSearch({ show: message.id }, { replace: true })}
                  className="block w-full border-l-2 border-transparent px-4 py-3 text-left -outline-offset-2 hover:bg-panel aria-[current=true]:border-copper aria-[current=true]:bg-panel"
                >
                  <span className="block font-semibold break-words">{message.subject}</span>
                  <span className="block text-sm break-all">{message.to}</span>
                  <span className="block text-sm">
                    <Timestamp at={message.receivedAt} />
                  </span>
                </button>
              </li>
            ))}
          </ul>
          <article aria-labelledby="subject" className="min-w-0 py-4">
            <h2 id="subject" className="text-xl break-words">
              {open.subject}
            </h2>
            <dl className="mt-3 mb-6 grid grid-cols-[4.5rem_1fr] gap-y-1 text-sm">
              <dt className="text-ink-soft">To</dt>
              <dd className="break-all">{open.to}</dd>
              <dt className="text-ink-soft">From</dt>
              <dd className="break-all">{open.from}</dd>
              <dt className="text-ink-soft">Received</dt>
              <dd>
                <Timestamp at={open.receivedAt} />
              </dd>
            </dl>
            <MailText text={open.text} />
          </article>
        </div>
      )}
    </Page>
  );
}
