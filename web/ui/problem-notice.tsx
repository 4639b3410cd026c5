import { ProblemError } from '#web/server/problem-error.ts';
import { Button } from './button.tsx';
import { Notice } from './notice.tsx';

type Props = {
  error: Error;
  retry?: () => void;
  /** Paths whose faults the form shows at their fields, so that they are not said twice. */
  fields?: readonly string[];
};

/** What went wrong in the server's own words, every fault and reason listed, with a way to try again. */
export function ProblemNotice({ error, retry, fields = [] }: Props) {
  // What is not there, or not allowed, is so the second time too.
  const final = error instanceof ProblemError && (error.status === 403 || error.status === 404);
  const action =
    retry && !final ? (
      <Button size="small" onClick={retry}>
        Try again
      </Button>
    ) : null;
  if (!(error instanceof ProblemError)) {
    return (
      <Notice tone="stop" alert title="This page met a fault of its own" action={action}>
        <p>{error.message}</p>
      </Notice>
    );
  }
  const { title, detail, reasons = [], instance } = error.problem;
  const faults = error.problem.faults?.filter(({ path }) => !fields.includes(path)) ?? [];
  return (
    <Notice tone={error.code === 'offline' ? 'warn' : 'stop'} alert title={title} action={action}>
      {detail !== title ? <p>{detail}</p> : null}
      {faults.length + reasons.length > 0 ? (
        <ul className="mt-1 list-disc pl-5">
          {reasons.map((reason) => (
            <li key={reason.code + reason.message}>{reason.message}</li>
          ))}
          {faults.map((fault) => (
            <li key={fault.path + fault.message}>
              {fault.path ? <strong>{fault.path}</strong> : null} {fault.message}
            </li>
          ))}
        </ul>
      ) : null}
      {instance ? <p className="mt-1 text-ink-soft">Reference: {instance}</p> : null}
    </Notice>
  );
}
