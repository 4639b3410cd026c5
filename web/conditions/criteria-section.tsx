import { useQuery } from '@tanstack/react-query';
import type { Criteria, Rule, RuleQuantity } from '#core/board/criteria.ts';
import { setCriteria } from '#core/board/edits/set-criteria.ts';
import { useEditor } from '#web/editor/editor-context.ts';
import { NameField } from '#web/editor/panels/name-field.tsx';
import { useEdit } from '#web/editor/panels/use-edit.ts';
import { libraryQuery } from '#web/library/library-query.ts';
import { quantityWords } from '#web/library/rule-words.ts';
import { Button } from '#web/ui/button.tsx';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { Section } from './section.tsx';

const quantities: readonly RuleQuantity[] = ['junctionC', 'inputV', 'outputA'];

/** Derating rules of this sketch: copied from a set of the library, then its own. */
export function CriteriaSection() {
  const criteria = useEditor((state) => state.board.criteria);
  const library = useQuery(libraryQuery);
  const { edit, disabled } = useEdit();
  const change = (what: string, patch: Partial<Criteria>) =>
    edit(what, (board) => setCriteria(board, { ...board.criteria, ...patch }));
  const changeRule = (index: number, patch: Partial<Rule>) =>
    change(`Change rule ${index + 1}`, {
      rules: criteria.rules.map((rule, k) => (k === index ? cleaned({ ...rule, ...patch }) : rule)),
    });
  const sets = library.data?.criteria ?? [];
  return (
    <Section
      title="Derating criteria"
      note="Of several comparisons in one rule the lowest limit counts. The maker’s own maximum always applies too."
      action={
        disabled ? null : (
          <Button
            size="small"
            onClick={() =>
              change('Add rule', {
                rules: [
                  ...criteria.rules,
                  { quantity: 'junctionC', belowMaxK: 25, source: 'House rule', mark: 'house' },
                ],
              })
            }
          >
            Add rule
          </Button>
        )
      }
    >
      <div className="mb-3 grid gap-4 sm:grid-cols-2">
        <NameField
          label="Name of the rule set"
          value={criteria.name}
          disabled={disabled}
          onCommit={(name) => change('Rename the criteria', { name })}
        />
        <SelectField
          label="Copy a set from the library"
          value=""
          disabled={disabled || sets.length === 0}
          options={[{ value: '', label: 'choose a set …' }, ...sets.map(({ name }) => ({ value: name, label: name }))]}
          onChange={(name) => {
            const set = sets.find((candidate) => candidate.name === name);
            if (set) edit(`Take criteria ${name}`, (board) => setCriteria(board, set));
          }}
        />
      </div>
      {criteria.rules.length === 0 ? (
        <p className="text-sm text-ink-soft">There is no rule yet, so no junction is judged.</p>
      ) : null}
      {criteria.rules.map((rule, index) => (
        <fieldset
          key={index}
          className="grid grid-cols-2 gap-x-4 gap-y-2 border-b border-line py-3 lg:grid-cols-[1.4fr_1fr_1fr_1fr_2fr_auto] lg:items-end"
        >
          <legend className="sr-only">Rule {index + 1}</legend>
          <SelectField<RuleQuantity>
            label="Quantity"
            value={rule.quantity}
            disabled={disabled}
            options={quantities.map((quantity) => ({ value: quantity, label: quantityWords[quantity] }))}
            onChange={(quantity) =>
              changeRule(
                index,
                quantity === 'junctionC'
                  ? { quantity }
                  : { quantity, belowMaxK: undefined, atMostC: undefined, ratio: rule.ratio ?? 0.8 },
              )
            }
          />
          <QuantityField
            label="Below maximum"
            unit="K"
            value={rule.belowMaxK ?? null}
            minimum={0}
            maximum={500}
            optional={rule.atMostC !== undefined || rule.ratio !== undefined}
            disabled={disabled || rule.quantity !== 'junctionC'}
            onCommit={(value) => changeRule(index, { belowMaxK: value ?? undefined })}
          />
          <QuantityField
            label="At most"
            unit="°C"
            value={rule.atMostC ?? null}
            minimum={-50}
            maximum={3000}
            optional={rule.belowMaxK !== undefined || rule.ratio !== undefined}
            disabled={disabled || rule.quantity !== 'junctionC'}
            onCommit={(value) => changeRule(index, { atMostC: value ?? undefined })}
          />
          <QuantityField
            label="Stress ratio"
            unit=""
            value={rule.ratio ?? null}
            minimum={0.01}
            maximum={1}
            optional={rule.belowMaxK !== undefined || rule.atMostC !== undefined}
            disabled={disabled}
            onCommit={(value) => changeRule(index, { ratio: value ?? undefined })}
          />
          <NameField
            label="Source"
            value={rule.source ?? [rule.document, rule.revision, rule.clause, rule.level].filter(Boolean).join(', ')}
            maxLength={400}
            disabled={disabled}
            onCommit={(source) => changeRule(index, { source })}
          />
          {disabled ? null : (
            <Button
              size="small"
              variant="danger"
              aria-label={`Remove rule ${index + 1}`}
              onClick={() =>
                change(`Remove rule ${index + 1}`, { rules: criteria.rules.filter((_, k) => k !== index) })
              }
            >
              Remove
            </Button>
          )}
        </fieldset>
      ))}
    </Section>
  );
}

/** A comparison that was taken away is no field of the document. */
function cleaned(rule: Rule): Rule {
  return Object.fromEntries(Object.entries(rule).filter(([, value]) => value !== undefined)) as Rule;
}
