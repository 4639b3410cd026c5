import { sameFinding } from '#core/review/guards.ts';
import type { RecordBlock, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** Findings with the reasons given for them, and the comments of the review with what became of them. */
export function findingsSection({ result, revision }: RecordInput): RecordSection {
  const blocks: RecordBlock[] = [
    {
      kind: 'table',
      columns: [
        { title: 'Severity', weight: 0.9 },
        { title: 'Place', weight: 1.4 },
        { title: 'Finding and remedy', weight: 4.4 },
        { title: 'Reason given', weight: 2.6 },
      ],
      rows: result.findings.map((finding) => [
        finding.severity,
        [finding.ref, finding.condition].filter(Boolean).join(', ') || 'board',
        `${finding.message} ${finding.remedy}`,
        revision?.reasons.find((reason) => sameFinding(reason, finding))?.reason ??
          (finding.severity === 'warn' ? 'none given' : '–'),
      ]),
      empty: 'Nothing was found.',
    },
  ];
  if (revision && revision.comments.length > 0) {
    blocks.push(
      { kind: 'heading', text: 'Comments' },
      {
        kind: 'table',
        columns: [
          { title: 'By', weight: 1.2 },
          { title: 'Comment', weight: 5 },
          { title: 'Resolved by', weight: 1.2 },
        ],
        rows: revision.comments.map((comment) => [comment.author, comment.text, comment.resolvedBy ?? 'open']),
        empty: '',
      },
    );
  }
  return { id: 'findings', title: 'Findings', blocks };
}
