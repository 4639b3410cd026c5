import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { sessionQuery } from '#web/session/session-query.ts';
import { Button } from '#web/ui/button.tsx';
import { Empty } from '#web/ui/empty.tsx';
import { Icon } from '#web/ui/icon.tsx';
import { Loading } from '#web/ui/loading.tsx';
import { Page } from '#web/ui/page.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { AssembliesTable } from './assemblies-table.tsx';
import { assembliesQuery } from './assembly-queries.ts';
import { CreateAssembly } from './create-assembly.tsx';
import { matchingAssemblies } from './matching-assemblies.ts';
import { SearchBox } from './search-box.tsx';

export function Component() {
  const { data: session } = useQuery(sessionQuery);
  const assemblies = useQuery(assembliesQuery);
  const [search, setSearch] = useSearchParams();
  const [creating, setCreating] = useState(false);
  const find = search.get('find') ?? '';
  const mayCreate = session?.allowed.includes('create-assembly') ?? false;
  const items = assemblies.data?.items ?? [];
  const found = matchingAssemblies(items, find);
  const create = mayCreate ? (
    <Button variant="primary" onClick={() => setCreating(true)}>
      <Icon name="plus" />
      New assembly
    </Button>
  ) : null;

  return (
    <Page title="Assemblies" actions={items.length > 0 ? create : null}>
      {assemblies.error && !assemblies.data ? (
        <ProblemNotice error={assemblies.error} retry={() => void assemblies.refetch()} />
      ) : !assemblies.data ? (
        <Loading what="the assemblies" />
      ) : items.length === 0 ? (
        <Empty title="No assembly yet" action={create}>
          An assembly is one printed board with its revisions.{' '}
          {mayCreate
            ? 'Create the first one; it starts as revision A with a blank board.'
            : 'A layout designer or hardware lead of the team creates the first one.'}
        </Empty>
      ) : (
        <>
          <SearchBox
            value={find}
            count={found.length}
            total={items.length}
            onChange={(value) => setSearch(value ? { find: value } : {}, { replace: true })}
          />
          {found.length > 0 ? (
            <AssembliesTable assemblies={found} />
          ) : (
            <Empty title="Nothing matches" action={<Button onClick={() => setSearch({})}>Show all assemblies</Button>}>
              No assembly has “{find}” in its number, title, state or verdict.
            </Empty>
          )}
        </>
      )}
      {creating ? <CreateAssembly onClose={() => setCreating(false)} /> : null}
    </Page>
  );
}
