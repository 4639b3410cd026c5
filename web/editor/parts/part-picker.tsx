import { useQuery } from '@tanstack/react-query';
import { useId, useMemo, useState } from 'react';
import type { PackageModel } from '#core/board/package.ts';
import { formatGiven, formatQuantity } from '#core/format.ts';
import { libraryQuery } from '#web/library/library-query.ts';
import { Dialog } from '#web/ui/dialog.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import type { ChosenPart } from '../tools/tool-name.ts';
import { PackageSketch } from './package-sketch.tsx';

type Props = { chosen: ChosenPart | null; onChoose: (part: ChosenPart) => void };

/** Parts of the library: outline, output, limits, and where the values come from. */
export function PartPicker({ chosen, onChoose }: Props) {
  const [open, setOpen] = useState(chosen === null);
  return (
    <>
      <button
        type="button"
        onClick={() => setOpen(true)}
        className="inline-flex min-h-8 items-center gap-2 rounded-sm border border-line-strong bg-panel px-2 text-sm hover:border-ink"
      >
        <span className="text-ink-soft">Part</span>
        <span className="font-semibold">{chosen ? chosen.part.name : 'choose …'}</span>
        {chosen ? <span className="text-ink-soft">{chosen.model.name}</span> : null}
      </button>
      <Dialog title="Choose a part" open={open} onOpenChange={setOpen}>
        <PartList
          onChoose={(part) => {
            onChoose(part);
            setOpen(false);
          }}
        />
      </Dialog>
    </>
  );
}

/** The library as a list to choose from. */
export function PartList({ onChoose }: { onChoose: (part: ChosenPart) => void }) {
  const library = useQuery(libraryQuery);
  const [search, setSearch] = useState('');
  const searchId = useId();
  const found = useMemo(() => {
    const words = search.toLowerCase().split(/\s+/).filter(Boolean);
    return Object.entries(library.data?.parts ?? {}).flatMap(([key, part]) => {
      const model: PackageModel | undefined = library.data?.packages[part.package];
      if (!model) return [];
      const text = `${part.name} ${model.name} ${part.outputV} V ${part.passElement}`.toLowerCase();
      return words.every((word) => text.includes(word)) ? [{ key, part, model }] : [];
    });
  }, [library.data, search]);
  if (library.error) return <ProblemNotice error={library.error} retry={() => void library.refetch()} />;
  return (
    <>
      <label htmlFor={searchId} className="block text-sm font-semibold">
        Search by name, package or voltage
      </label>
      <input
        id={searchId}
        type="search"
        value={search}
        onChange={(event) => setSearch(event.target.value)}
        className="mt-1 mb-3 min-h-10 w-full rounded-sm border border-line-strong bg-panel px-3"
      />
      {found.length === 0 ? (
        <p className="py-4 text-ink-soft">
          {library.data ? 'No part of the library fits these words.' : 'Loading the library …'}
        </p>
      ) : null}
      <ul className="border-t border-line">
        {found.map((choice) => (
          <li key={choice.key} className="border-b border-line">
            <button
              type="button"
              onClick={() => onChoose(choice)}
              className="flex w-full items-center gap-4 px-1 py-2 text-left hover:bg-copper-soft"
            >
              <PackageSketch model={choice.model} />
              <span className="min-w-0 flex-1">
                <span className="flex flex-wrap gap-x-3">
                  <span className="font-semibold">{choice.part.name}</span>
                  <span>{choice.model.name}</span>
                  <span>{formatGiven(choice.part.outputV, 'V')}</span>
                  <span>{formatGiven(choice.part.outputMaxA, 'A')} at most</span>
                </span>
                <span className="block text-sm text-ink-soft">
                  Junction at most {formatQuantity(choice.part.junctionMaxC, '°C', 0)} · input at most{' '}
                  {formatGiven(choice.part.inputMaxV, 'V')} · {choice.part.source}
                </span>
              </span>
            </button>
          </li>
        ))}
      </ul>
    </>
  );
}
