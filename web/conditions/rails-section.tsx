import type { Regulator } from '#core/board/placement.ts';
import { changeRegulator } from '#core/board/edits/change-regulator.ts';
import { formatGiven } from '#core/format.ts';
import { useEditor } from '#web/editor/editor-context.ts';
import { DropperFields } from '#web/editor/panels/dropper-fields.tsx';
import { FeedField } from '#web/editor/panels/feed-field.tsx';
import { useEdit } from '#web/editor/panels/use-edit.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { Section } from './section.tsx';

/** What each regulator is fed from, through which dropper, or its dissipation where that is known. */
export function RailsSection() {
  const board = useEditor((state) => state.board);
  const { edit, disabled } = useEdit();
  const sources = board.sources.map(({ ref }) => ref);
  const change = (regulator: Regulator, what: string, patch: Partial<Omit<Regulator, 'ref'>>) =>
    edit(`Change ${what} of ${regulator.ref}`, (before) => changeRegulator(before, regulator.ref, patch));
  return (
    <Section
      title="Rails"
      note="Input currents are carried up the tree of feeds; a dropper’s heat goes to the heat source that it names."
    >
      {board.regulators.length === 0 ? (
        <p className="text-sm text-ink-soft">There is no regulator yet; place one on the sketch.</p>
      ) : null}
      {board.regulators.map((regulator) => {
        const part = board.parts[regulator.part];
        return (
          <fieldset key={regulator.ref} className="border-b border-line py-3">
            <legend className="float-left w-full text-sm">
              <span className="font-semibold">{regulator.ref}</span> {part?.name ?? regulator.part}
              {part ? (
                <span className="text-ink-soft">
                  {' '}
                  · {formatGiven(part.outputV, 'V')}, up to {formatGiven(part.outputMaxA, 'A')}, input up to{' '}
                  {formatGiven(part.inputMaxV, 'V')}
                </span>
              ) : null}
            </legend>
            <div className="clear-both grid grid-cols-2 gap-x-4 gap-y-2 pt-2 lg:grid-cols-5">
              <FeedField
                regulator={regulator}
                disabled={disabled}
                onChange={(feed) => change(regulator, 'the feed', { feed })}
              />
              <DropperFields
                dropper={regulator.dropper}
                sources={sources}
                disabled={disabled}
                onChange={(dropper) => change(regulator, 'the dropper', { dropper })}
              />
              <QuantityField
                label="Known dissipation"
                unit="W"
                value={regulator.powerW}
                minimum={0}
                maximum={500}
                optional
                disabled={disabled}
                onCommit={(powerW) => change(regulator, 'the known dissipation', { powerW })}
              />
            </div>
          </fieldset>
        );
      })}
    </Section>
  );
}
