import type { Part } from '#core/board/part.ts';
import { formatGiven } from '#core/format.ts';
import { Browse } from './browse.tsx';
import { CurrentTable } from './current-table.tsx';
import { limitWords, netWords, passElementWords } from './part-words.ts';
import { Source, Values } from './values.tsx';

type Props = {
  parts: Record<string, Part>;
  shown: string | null;
  onShow: (key: string) => void;
  onPackage: (key: string) => void;
};

/** Regulators of the library. */
export function PartsView({ parts, shown, onShow, onPackage }: Props) {
  const entries = Object.entries(parts).map(([key, part]) => ({
    key,
    name: part.name,
    note: `${formatGiven(part.outputV, 'V')}, ${formatGiven(part.outputMaxA, 'A')}, ${part.package}`,
  }));
  return (
    <Browse label="Parts" entries={entries} shown={shown} onShow={onShow}>
      {(key) => {
        const part = parts[key];
        return part ? <PartDetail part={part} onPackage={onPackage} /> : null;
      }}
    </Browse>
  );
}

function PartDetail({ part, onPackage }: { part: Part; onPackage: (key: string) => void }) {
  return (
    <>
      <Source>{part.source}</Source>
      <Values
        values={[
          [
            'Package',
            <button
              key="package"
              type="button"
              onClick={() => onPackage(part.package)}
              className="min-h-6 underline underline-offset-4 hover:text-copper"
            >
              {part.package}
            </button>,
          ],
          ['Pass element', passElementWords[part.passElement]],
          ['Output', `${formatGiven(part.outputV, 'V')} ± ${formatGiven(part.outputTolerancePct, '%')}`],
          ['Highest input', formatGiven(part.inputMaxV, 'V')],
          ['Highest output current', formatGiven(part.outputMaxA, 'A')],
          ['Current limit', part.currentLimit ? limitWords(part.currentLimit) : null],
          ['Highest junction temperature', formatGiven(part.junctionMaxC, '°C')],
          ['Thermal shutdown', part.shutdownC === null ? null : formatGiven(part.shutdownC, '°C')],
          ...Object.entries(part.landNets).map(
            ([land, net]) => [`Land “${land}” lies on`, netWords[net]] as [string, string],
          ),
        ]}
      />
      <div className="mt-8 grid gap-8 sm:grid-cols-2">
        <CurrentTable title="Largest dropout" unit="V" points={part.dropoutV} />
        <CurrentTable title="Ground-pin current" unit="A" points={part.groundA} />
      </div>
    </>
  );
}
