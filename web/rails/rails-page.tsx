import { useQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { railTable } from '#core/electrical/rail-table.ts';
import { paths } from '#web/paths.ts';
import { useRevision } from '#web/revision/revision-context.ts';
import { sketchQuery } from '#web/revision/revision-queries.ts';
import { Empty } from '#web/ui/empty.tsx';
import { Loading } from '#web/ui/loading.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { feedTree } from './feed-tree.ts';
import { RailsTable } from './rails-table.tsx';
import { TreeDrawing } from './tree-drawing.tsx';
import { TreeList } from './tree-list.tsx';

/** Rails of the saved sketch in one condition: table, tree of feeds and the tree in words. The condition lives in the address. */
export function Component() {
  const revision = useRevision();
  const sketch = useQuery(sketchQuery(revision.id));
  const [search, setSearch] = useSearchParams();
  if (sketch.error && !sketch.data) return <ProblemNotice error={sketch.error} retry={() => void sketch.refetch()} />;
  if (!sketch.data) return <Loading what="the rails" />;
  const { board } = sketch.data;
  const condition = board.conditions.find(({ name }) => name === search.get('condition')) ?? board.conditions[0];
  if (!condition || board.regulators.length === 0) {
    return (
      <Empty title={condition ? 'No regulator' : 'No operating condition'}>
        {condition ? 'Place a regulator on the sketch' : 'Rails are computed for a condition'}:{' '}
        <Link
          className="underline underline-offset-4"
          to={condition ? paths.sketch(revision.id) : paths.conditions(revision.id)}
        >
          {condition ? 'open the sketch' : 'add the worst corner'}
        </Link>
        .
      </Empty>
    );
  }
  const rails = railTable(board, condition);
  const roots = feedTree(board, rails);
  return (
    <div className="flex flex-col gap-8">
      <div className="max-w-96">
        <SelectField
          label="Condition"
          value={condition.name}
          options={board.conditions.map(({ name }) => ({ value: name, label: name }))}
          onChange={(name) => setSearch({ condition: name }, { replace: true, preventScrollReset: true })}
        />
      </div>
      <section aria-label="Rail table">
        <h2 className="mb-3 text-lg font-semibold">Rails</h2>
        <RailsTable rails={rails} />
        <p className="mt-2 text-sm text-ink-soft">
          Input at the pin, after its dropper. Headroom: lowest input, highest output, dropout at this load. Efficiency
          at the highest input, dropper included. “starves”: held at the highest input, not at the lowest.
        </p>
      </section>
      <section aria-label="Feeds">
        <h2 className="mb-3 text-lg font-semibold">Feeds</h2>
        <TreeDrawing board={board} roots={roots} />
        <h3 className="mt-4 mb-1 font-semibold">In words</h3>
        <TreeList board={board} nodes={roots} />
      </section>
    </div>
  );
}
