import { useQueries } from '@tanstack/react-query';
import type { Board } from '#core/board/document.ts';
import type { RevisionView } from '#core/contract/assemblies.ts';
import type { CommentView } from '#core/contract/review.ts';
import { buildRecord } from '#core/record/build-record.ts';
import { governingConditions } from '#core/record/governing.ts';
import type { CheckResult } from '#core/result/result.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';
import { decodeHeatField } from '#web/heat/decode-heat-field.ts';
import { heatFieldQuery } from '#web/revision/revision-queries.ts';
import { Loading } from '#web/ui/loading.tsx';
import { RecordBlockView } from './record-block-view.tsx';

type Props = {
  revision: RevisionView;
  board: Board;
  result: CheckResult;
  comments: readonly CommentView[];
  solvedAt: string;
};

/** The sections of the record as the PDF holds them, from the same data. */
export function RecordSections({ revision, board, result, comments, solvedAt }: Props) {
  const names = governingConditions(result)
    .filter(({ status }) => status === 'converged')
    .map(({ name }) => name);
  const fields = useQueries({
    queries: names.map((name) => ({ ...heatFieldQuery(revision.id, name, solvedAt), select: decodeHeatField })),
  });
  if (fields.some(({ isPending }) => isPending)) return <Loading what="the heat pictures" />;
  const byName = new Map<string, HeatField>();
  names.forEach((name, index) => {
    const field = fields[index]?.data;
    if (field) byName.set(name, field);
  });
  const record = buildRecord({
    board,
    result,
    fields: byName,
    revision: {
      assemblyNumber: revision.assembly.number,
      assemblyTitle: revision.assembly.title,
      letter: revision.letter,
      state: revision.state,
      changedAt: revision.changedAt,
      authors: revision.authors.map(({ name }) => name),
      stateReason: revision.stateReason,
      reasons: revision.reasons,
      signatures: revision.signatures,
      comments: comments.map(({ author, text, createdAt, resolvedBy }) => ({ author, text, createdAt, resolvedBy })),
    },
  });
  return (
    <div className="grid gap-10 lg:grid-cols-[14rem_1fr]">
      <nav aria-label="Sections of the record" className="print:hidden">
        <ol className="flex flex-col text-sm lg:sticky lg:top-4">
          {record.sections.map((section, index) => (
            <li key={section.id}>
              <a
                href={`#record-${section.id}`}
                className="inline-flex min-h-7 items-center hover:text-copper hover:underline"
              >
                {index + 1} {section.title}
              </a>
            </li>
          ))}
        </ol>
      </nav>
      <div className="flex min-w-0 flex-col gap-10">
        {record.sections.map((section, index) => (
          <section key={section.id} id={`record-${section.id}`} aria-label={section.title} className="scroll-mt-4">
            <h2 className="mb-3 border-t border-line-strong pt-4 text-lg font-semibold">
              {index + 1} {section.title}
            </h2>
            <div className="flex flex-col gap-4">
              {section.blocks.map((block, place) => (
                <RecordBlockView key={place} block={block} result={result} />
              ))}
            </div>
          </section>
        ))}
      </div>
    </div>
  );
}
