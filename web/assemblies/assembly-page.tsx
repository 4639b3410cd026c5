import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useParams } from 'react-router-dom';
import { paths } from '#web/paths.ts';
import { sessionQuery } from '#web/session/session-query.ts';
import { buttonClass } from '#web/ui/button-class.ts';
import { Button } from '#web/ui/button.tsx';
import { Loading } from '#web/ui/loading.tsx';
import { Page } from '#web/ui/page.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { Timestamp } from '#web/ui/timestamp.tsx';
import { assemblyQuery } from './assembly-queries.ts';
import { ChangeAssembly } from './change-assembly.tsx';
import { OpenNextRevision } from './open-next-revision.tsx';
import { RevisionsTable } from './revisions-table.tsx';

const trail = [{ label: 'Assemblies', to: paths.assemblies() }];

export function Component() {
  const { assemblyId = '' } = useParams();
  const assembly = useQuery(assemblyQuery(assemblyId));
  const { data: session } = useQuery(sessionQuery);
  const [changing, setChanging] = useState(false);
  if (!assembly.data) {
    return (
      <Page title="Assembly" trail={trail}>
        {assembly.error ? (
          <>
            <ProblemNotice error={assembly.error} retry={() => void assembly.refetch()} />
            <Link to={paths.assemblies()} className={`mt-6 ${buttonClass()}`}>
              All assemblies
            </Link>
          </>
        ) : (
          <Loading what="the assembly" />
        )}
      </Page>
    );
  }
  const { number, title, createdAt, revisions } = assembly.data;
  const mayCreate = session?.allowed.includes('create-assembly') ?? false;
  return (
    <Page
      title={number}
      trail={trail}
      actions={
        mayCreate ? (
          <>
            <Button onClick={() => setChanging(true)}>Change number or title</Button>
            <OpenNextRevision assembly={assembly.data} />
          </>
        ) : null
      }
    >
      <p className="-mt-6 mb-8 text-lg">
        {title}
        <span className="ml-4 text-sm text-ink-soft">
          Created <Timestamp at={createdAt} dayOnly />
        </span>
      </p>
      <h2 className="mb-2 text-xl">Revisions</h2>
      <RevisionsTable number={number} revisions={revisions} />
      {changing ? <ChangeAssembly assembly={assembly.data} onClose={() => setChanging(false)} /> : null}
    </Page>
  );
}
