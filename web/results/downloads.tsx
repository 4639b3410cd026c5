import type { RevisionView } from '#core/contract/assemblies.ts';
import type { CheckResult } from '#core/result/result.ts';
import { Button } from '#web/ui/button.tsx';
import { matrixCsv } from './matrix-csv.ts';

/** The stored result as files: the whole document as JSON, the matrix as CSV. */
export function Downloads({ revision, result }: { revision: RevisionView; result: CheckResult }) {
  const name = `${revision.assembly.number}-${revision.letter}-result`;
  return (
    <div className="flex gap-3">
      <Button
        size="small"
        onClick={() => save(`${name}.json`, 'application/json', `${JSON.stringify(result, null, 2)}\n`)}
      >
        Result as JSON
      </Button>
      {/* The mark in front tells spreadsheets that the text is UTF-8. */}
      <Button size="small" onClick={() => save(`${name}.csv`, 'text/csv', `\uFEFF${matrixCsv(result)}`)}>
        Matrix as CSV
      </Button>
    </div>
  );
}

function save(fileName: string, type: string, text: string) {
  const url = URL.createObjectURL(new Blob([text], { type }));
  const link = document.createElement('a');
  link.href = url;
  link.download = fileName;
  link.click();
  URL.revokeObjectURL(url);
}
