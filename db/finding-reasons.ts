import type { FindingReason } from '#core/review/guards.ts';
import type { Database } from './database.ts';

type Row = { rule: string; ref: string | null; condition: string | null; reason: string };

/** Reasons of the newest submission, by rule. */
export async function listReasons(database: Database, revisionId: string): Promise<FindingReason[]> {
  return database('finding_reasons')
    .where({ revision_id: revisionId })
    .orderBy(['rule', 'ref', 'condition'])
    .select<Row[]>('rule', 'ref', 'condition', 'reason');
}

/** Puts the reasons of a submission in place of those of the one before. */
export async function replaceReasons(
  database: Database,
  revisionId: string,
  givenBy: string,
  reasons: readonly (FindingReason & { id: string })[],
): Promise<void> {
  await database('finding_reasons').where({ revision_id: revisionId }).delete();
  if (reasons.length === 0) return;
  await database('finding_reasons').insert(
    reasons.map(({ id, rule, ref, condition, reason }) => ({
      id,
      revision_id: revisionId,
      rule,
      ref,
      condition,
      reason,
      given_by: givenBy,
    })),
  );
}
