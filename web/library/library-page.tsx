import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { Loading } from '#web/ui/loading.tsx';
import { Page } from '#web/ui/page.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { Tabs } from '#web/ui/tabs.tsx';
import { CriteriaView } from './criteria-view.tsx';
import { LaminatesView } from './laminates-view.tsx';
import { libraryQuery } from './library-query.ts';
import { PackagesView } from './packages-view.tsx';
import { PartsView } from './parts-view.tsx';

export function Component() {
  const library = useQuery(libraryQuery);
  const [search, setSearch] = useSearchParams();
  const shown = search.get('show');
  const tab = search.get('tab') ?? 'parts';
  const show = (key: string, of = tab) => setSearch({ tab: of, show: key });
  return (
    <Page title="Library">
      <p className="-mt-4 mb-6 max-w-prose text-ink-soft">
        What a sketch can be drawn with. A sketch takes a copy of what it uses, so an older revision never changes when
        the library does.
      </p>
      {library.data ? (
        <Tabs
          label="Library"
          value={tab}
          onChange={(value) => setSearch({ tab: value })}
          tabs={[
            {
              value: 'parts',
              label: 'Parts',
              content: (
                <PartsView
                  parts={library.data.parts}
                  shown={shown}
                  onShow={show}
                  onPackage={(key) => show(key, 'packages')}
                />
              ),
            },
            {
              value: 'packages',
              label: 'Packages',
              content: <PackagesView packages={library.data.packages} shown={shown} onShow={show} />,
            },
            {
              value: 'laminates',
              label: 'Laminates',
              content: <LaminatesView laminates={library.data.laminates} />,
            },
            {
              value: 'criteria',
              label: 'Criteria',
              content: <CriteriaView criteria={library.data.criteria} shown={shown} onShow={show} />,
            },
          ]}
        />
      ) : library.error ? (
        <ProblemNotice error={library.error} retry={() => void library.refetch()} />
      ) : (
        <Loading what="the library" />
      )}
    </Page>
  );
}
