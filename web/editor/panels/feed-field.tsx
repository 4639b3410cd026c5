import type { Feed, Regulator } from '#core/board/placement.ts';
import { SelectField } from '#web/ui/select-field.tsx';
import { useEditor } from '../editor-context.ts';

type Props = { regulator: Regulator; onChange: (feed: Feed | null) => void; disabled: boolean };

/** What the regulator is fed from: a supply, or another regulator's output. */
export function FeedField({ regulator, onChange, disabled }: Props) {
  const supplies = useEditor((state) => state.board.supplies);
  const regulators = useEditor((state) => state.board.regulators);
  const feeds: { value: string; label: string; feed: Feed | null }[] = [
    { value: '', label: 'not stated', feed: null },
    ...supplies.map(({ name }) => ({ value: `supply ${name}`, label: `Supply ${name}`, feed: { supply: name } })),
    ...regulators
      .filter(({ ref }) => ref !== regulator.ref)
      .map(({ ref }) => ({ value: `regulator ${ref}`, label: `Output of ${ref}`, feed: { regulator: ref } })),
  ];
  const { feed } = regulator;
  const value = feed === null ? '' : 'supply' in feed ? `supply ${feed.supply}` : `regulator ${feed.regulator}`;
  const isKnown = feeds.some((option) => option.value === value);
  return (
    <SelectField
      label="Fed from"
      value={value}
      disabled={disabled}
      options={isKnown ? feeds : [...feeds, { value, label: `${value} (missing)` }]}
      onChange={(chosen) => onChange(feeds.find((option) => option.value === chosen)?.feed ?? null)}
    />
  );
}
