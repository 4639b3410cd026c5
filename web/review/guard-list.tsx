import type { GuardFailure } from '#core/review/guards.ts';

/** What stands in the way, in words; nothing when nothing does. */
export function GuardList({ guards, action }: { guards: readonly GuardFailure[]; action: string }) {
  if (guards.length === 0) return null;
  return (
    <div className="mb-4 border-l-4 border-over pl-3">
      <p className="font-semibold">Before you can {action}:</p>
      <ul className="list-disc pl-5 text-sm">
        {guards.map((guard) => (
          <li key={`${guard.code} ${guard.message}`}>{guard.message}</li>
        ))}
      </ul>
    </div>
  );
}
