import type { Criteria } from '#core/board/criteria.ts';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { Browse } from './browse.tsx';
import { citation, comparisons, markMeanings, markWords, quantityWords } from './rule-words.ts';

type Props = { criteria: readonly Criteria[]; shown: string | null; onShow: (key: string) => void };

const head = [{ label: 'Quantity' }, { label: 'Limit' }, { label: 'Document and clause' }, { label: 'How sure' }];

/** Derating rule sets; each rule says where it stands and how sure that is. */
export function CriteriaView({ criteria, shown, onShow }: Props) {
  const entries = criteria.map(({ name, version, rules }) => ({
    key: name,
    name,
    note: [version && `version ${version}`, rules.length === 1 ? '1 rule' : `${rules.length} rules`]
      .filter(Boolean)
      .join(', '),
  }));
  return (
    <Browse label="Criteria" entries={entries} shown={shown} onShow={onShow}>
      {(key) => {
        const set = criteria.find(({ name }) => name === key);
        return set ? <Rules set={set} /> : null;
      }}
    </Browse>
  );
}

function Rules({ set }: { set: Criteria }) {
  const marks = [...new Set(set.rules.flatMap(({ mark }) => (mark ? [mark] : [])))];
  return (
    <div className="mt-4">
      <Table caption={`Rules of ${set.name}`} head={head}>
        {set.rules.map((rule, index) => (
          <Row key={index}>
            <Cell className="font-semibold">{quantityWords[rule.quantity]}</Cell>
            <Cell className="min-w-32">
              {comparisons(rule).map((text) => (
                <span key={text} className="block">
                  {text}
                </span>
              ))}
            </Cell>
            <Cell className="min-w-40 text-sm">
              {citation(rule)}
              {rule.source ? <span className="block text-ink-soft">{rule.source}</span> : null}
            </Cell>
            <Cell className="text-sm">{rule.mark ? markWords[rule.mark] : 'not stated'}</Cell>
          </Row>
        ))}
      </Table>
      {marks.length > 0 ? (
        <dl className="mt-6 max-w-prose text-sm text-ink-soft">
          {marks.map((mark) => (
            <div key={mark}>
              <dt className="inline font-semibold">{markWords[mark]}: </dt>
              <dd className="inline">{markMeanings[mark]}</dd>
            </div>
          ))}
        </dl>
      ) : null}
    </div>
  );
}
