import type { RevisionView } from '#core/contract/assemblies.ts';
import type { CheckResult } from '#core/result/result.ts';
import { clearGuards } from '#core/review/guards.ts';
import { GuardList } from './guard-list.tsx';
import { ReasonForm } from './reason-form.tsx';
import { refusalText } from './refusal-text.ts';
import { SignForm } from './sign-form.tsx';
import { SubmitForm } from './submit-form.tsx';

type Props = { revision: RevisionView; result: CheckResult | null };

/** What the caller may decide now; where they may not, a sentence says why. */
export function Decision({ revision, result }: Props) {
  const may = (action: RevisionView['allowed'][number]) => revision.allowed.includes(action);
  const guards = clearGuards({ result, reasons: [], openComments: revision.openComments });
  const refused = refusalText(revision);
  return (
    <section aria-label="Decision" className="border-t border-line-strong pt-4">
      <h2 className="mb-3 text-lg font-semibold">Decision</h2>
      {refused ? <p className="mb-4 max-w-prose">{refused}</p> : null}
      <div className="grid gap-8 lg:grid-cols-2">
        {may('submit') ? <SubmitForm revision={revision} result={result} /> : null}
        {may('clear') ? (
          <div>
            <GuardList guards={guards} action="clear it" />
            <SignForm
              revision={revision}
              endpoint="clear"
              disabled={guards.length > 0}
              title="Clear"
              meaning="My name stands for: I have reviewed this sketch, its conditions and its results, and clear it for issue."
            />
          </div>
        ) : null}
        {may('issue') ? (
          <div>
            <GuardList guards={guards} action="issue it" />
            <SignForm
              revision={revision}
              endpoint="issue"
              disabled={guards.length > 0}
              title="Issue"
              meaning="My name stands for: I release this revision. It is frozen from then on; an earlier issued one is superseded."
            />
          </div>
        ) : null}
        {may('send-back') ? (
          <ReasonForm revision={revision} endpoint="sendBack" title="Send back" label="What has to change" />
        ) : null}
        {may('withdraw') ? (
          <ReasonForm revision={revision} endpoint="withdraw" title="Withdraw" label="Why it is withdrawn" danger />
        ) : null}
      </div>
    </section>
  );
}
