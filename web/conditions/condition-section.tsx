import { addCondition } from '#core/board/edits/add-condition.ts';
import { duplicateCondition } from '#core/board/edits/duplicate-condition.ts';
import { removeCondition } from '#core/board/edits/remove-condition.ts';
import { useSearchParams } from 'react-router-dom';
import { useEditor } from '#web/editor/editor-context.ts';
import { useEdit } from '#web/editor/panels/use-edit.ts';
import { Button } from '#web/ui/button.tsx';
import { classes } from '#web/ui/classes.ts';
import { blankCondition } from './blank-condition.ts';
import { ConditionFields } from './condition-fields.tsx';
import { freeName } from './free-name.ts';
import { Section } from './section.tsx';

/** List of the operating conditions, and the one that the address names as a form. */
export function ConditionSection() {
  const conditions = useEditor((state) => state.board.conditions);
  const { edit, disabled } = useEdit();
  const [search, setSearch] = useSearchParams();
  const names = conditions.map(({ name }) => name);
  const wanted = search.get('condition');
  const shown = conditions.find(({ name }) => name === wanted) ?? conditions[0];
  const show = (name: string) => setSearch({ condition: name }, { replace: true });
  const add = () => {
    const name = freeName('Condition', names);
    edit(`Add condition ${name}`, (board) => addCondition(board, blankCondition(name)));
    show(name);
  };
  return (
    <Section
      title="Operating conditions"
      note="Each is checked by itself; the one with the least margin governs a regulator."
      action={
        disabled ? null : (
          <Button size="small" onClick={add}>
            Add condition
          </Button>
        )
      }
    >
      {shown ? (
        <div className="grid gap-6 lg:grid-cols-[16rem_1fr]">
          <ul aria-label="Conditions" className="flex flex-col">
            {conditions.map(({ name }) => (
              <li key={name}>
                <button
                  type="button"
                  aria-current={name === shown.name || undefined}
                  onClick={() => show(name)}
                  className={classes(
                    'min-h-9 w-full border-l-4 px-3 py-1.5 text-left text-sm break-words hover:bg-copper-soft',
                    name === shown.name ? 'border-copper bg-copper-soft font-semibold' : 'border-line',
                  )}
                >
                  {name}
                </button>
              </li>
            ))}
          </ul>
          <div className="min-w-0">
            <ConditionFields condition={shown} names={names} onRenamed={show} />
            {disabled ? null : (
              <div className="mt-4 flex flex-wrap gap-3">
                <Button
                  size="small"
                  onClick={() => {
                    const copy = freeName(`${shown.name}, copy`, names);
                    edit(`Duplicate condition ${shown.name}`, (board) => duplicateCondition(board, shown.name, copy));
                    show(copy);
                  }}
                >
                  Duplicate
                </Button>
                <Button
                  size="small"
                  variant="danger"
                  onClick={() => edit(`Remove condition ${shown.name}`, (board) => removeCondition(board, shown.name))}
                >
                  Remove “{shown.name}”
                </Button>
              </div>
            )}
          </div>
        </div>
      ) : (
        <p className="text-sm text-ink-soft">
          There is no condition yet. Add the worst corner first: highest input, load and ambient, least air.
        </p>
      )}
    </Section>
  );
}
