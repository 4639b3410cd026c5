import { useState } from 'react';
import type { RevisionView } from '#core/contract/assemblies.ts';
import type { CheckResult, Finding } from '#core/result/result.ts';
import { sameFinding, submitGuards } from '#core/review/guards.ts';
import { RunCheck } from '#web/revision/run-check.tsx';
import { call } from '#web/server/call.ts';
import { Button } from '#web/ui/button.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { TextAreaField } from '#web/ui/text-area-field.tsx';
import { GuardList } from './guard-list.tsx';
import { useDecide } from './use-decide.ts';

const keyOf = ({ rule, ref, condition }: Pick<Finding, 'rule' | 'ref' | 'condition'>) =>
  JSON.stringify([rule, ref, condition]);
const nothingToSave = async () => {};

/** Submission: one reason for every warning, a note for the reviewer, and in words what still stands in the way. */
export function SubmitForm({ revision, result }: { revision: RevisionView; result: CheckResult | null }) {
  const [texts, setTexts] = useState<Record<string, string>>(() =>
    Object.fromEntries(revision.reasons.map((reason) => [keyOf(reason), reason.reason])),
  );
  const [note, setNote] = useState('');
  const warnings = uniqueWarnings(result);
  const reasons = warnings.flatMap(({ rule, ref, condition }) => {
    const reason = texts[keyOf({ rule, ref, condition })]?.trim();
    return reason ? [{ rule, ref, condition, reason }] : [];
  });
  const guards = submitGuards({ result, reasons, openComments: 0 }).filter(({ code }) => code !== 'reason-missing');
  const missing = warnings.length - reasons.length;
  const name = `${revision.assembly.number} ${revision.letter}`;
  const decide = useDecide(revision.id, `${name} is submitted for review`, () =>
    call('submit', {
      params: { revisionId: revision.id },
      ifMatch: revision.version,
      body: { reasons, ...(note.trim() && { note: note.trim() }) },
    }),
  );
  return (
    <form
      aria-label="Submit for review"
      onSubmit={(event) => {
        event.preventDefault();
        decide.mutate(undefined);
      }}
      className="flex max-w-2xl flex-col gap-4"
    >
      <GuardList guards={guards} action="submit it" />
      {result ? null : (
        <RunCheck
          revisionId={revision.id}
          maySolve={revision.allowed.includes('solve')}
          dirty={false}
          flush={nothingToSave}
        />
      )}
      {warnings.map((finding) => (
        <TextAreaField
          key={keyOf(finding)}
          label={`Why this may stay: ${finding.message}`}
          hint={finding.remedy}
          rows={2}
          required
          maxLength={1000}
          value={texts[keyOf(finding)] ?? ''}
          onChange={(event) => setTexts({ ...texts, [keyOf(finding)]: event.target.value })}
        />
      ))}
      <TextAreaField
        label="Note for the reviewer (may be left out)"
        rows={2}
        maxLength={2000}
        value={note}
        onChange={(event) => setNote(event.target.value)}
      />
      {decide.error ? <ProblemNotice error={decide.error} /> : null}
      <div className="flex flex-wrap items-center gap-3">
        <Button type="submit" variant="primary" disabled={guards.length > 0 || missing > 0 || decide.isPending}>
          Submit {name} for review
        </Button>
        {missing > 0 ? (
          <span className="text-sm text-ink-soft">
            {missing} {missing === 1 ? 'reason is' : 'reasons are'} still missing
          </span>
        ) : null}
      </div>
    </form>
  );
}

/** Warnings, each kind of a place once: a reason belongs to rule, object and condition. */
function uniqueWarnings(result: CheckResult | null): Finding[] {
  const warnings = result?.findings.filter(({ severity }) => severity === 'warn') ?? [];
  return warnings.filter((finding, index) => warnings.findIndex((other) => sameFinding(other, finding)) === index);
}
