import { sameFinding } from '#core/review/guards.ts';
import { formatTime } from '../format-time.ts';
import type { RecordBlock, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

const withoutReason = { stop: 'has to be mended', warn: 'none given', note: 'none needed' } as const;

/** Findings with the reasons given for them, and the comments of the review with what became of them. */
export function findingsSection({ result, revision }: RecordInput): RecordSection {
  const blocks: RecordBlock[] = [
    {
      kind: 'table',
      columns: [
        { title: 'Severity', weight: 0.9 },
        { title: 'Place', weight: 1.5 },
        { title: 'Finding and remedy', weight: 4.4 },
        { title: 'Reason given', weight: 2.4 },
      ],
      rows: result.findings.map((finding) => [
        finding.severity,
        [finding.ref, finding.condition].filter(Boolean).join(', ') || 'whole board',
        `${finding.message} ${finding.remedy}`.trim(),
        revision?.reasons.find((reason) => sameFinding(reason, finding))?.reason ?? withoutReason[finding.severity],
      ]),
      empty: 'Nothing was found.',
    },
  ];
  if (revision && revision.comments.length > 0) {
    blocks.push(
      { kind: 'heading', text: 'Comments of the review' },
      {
        kind: 'table',
        columns: [
          { title: 'By', weight: 1.4 },
          { title: 'At', weight: 1.4 },
          { title: 'Comment', weight: 4.6 },
          { title: 'Resolved by', weight: 1.4 },
        ],
        rows: revision.comments.map(({ author, createdAt, text, resolvedBy }) => [
          author,
          formatTime(createdAt),
          text,
          resolvedBy ?? 'open',
        ]),
        empty: '',
      },
    );
  }
  return { id: 'findings', title: 'Findings', blocks };
}
