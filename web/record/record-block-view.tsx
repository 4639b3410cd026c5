import type { RecordBlock, RecordCell } from '#core/record/record-document.ts';
import type { CheckResult } from '#core/result/result.ts';
import { BoardPicture } from '#web/heat/board-picture.tsx';
import { RiseLadder } from '#web/ladder/rise-ladder.tsx';
import { Notice } from '#web/ui/notice.tsx';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';
import { CopperPicture } from './copper-picture.tsx';

/** One block of the record on screen. */
export function RecordBlockView({ block, result }: { block: RecordBlock; result: CheckResult }) {
  switch (block.kind) {
    case 'heading':
      return <h3 className="font-semibold">{block.text}</h3>;
    case 'text':
      return <p className="max-w-prose break-words">{block.text}</p>;
    case 'list':
      return (
        <ul className="max-w-prose list-disc pl-5">
          {block.items.map((item) => (
            <li key={item}>{item}</li>
          ))}
        </ul>
      );
    case 'notice':
      return (
        <Notice tone="note" title="Notice">
          {block.text}
        </Notice>
      );
    case 'caution':
      return (
        <Notice
          tone="caution"
          title={[block.caution.ref, block.caution.condition].filter(Boolean).join(', ') || 'Whole board'}
        >
          {block.caution.message}
        </Notice>
      );
    case 'pairs':
      return (
        <dl className="text-sm">
          {block.rows.map(([label, value]) => (
            <div key={label} className="grid gap-x-4 border-b border-line py-1.5 sm:grid-cols-[18rem_1fr]">
              <dt className="text-ink-soft">{label}</dt>
              <dd className="break-words">{value}</dd>
            </div>
          ))}
        </dl>
      );
    case 'table':
      return <BlockTable block={block} />;
    case 'ladders':
      return (
        <div className="grid gap-6 md:grid-cols-2">
          {block.ladders.map((ladder) => {
            const regulator = result.conditions
              .find(({ name }) => name === ladder.condition)
              ?.regulators.find(({ ref }) => ref === ladder.ref);
            return regulator ? (
              <div key={ladder.ref}>
                <p className="mb-1 font-semibold">
                  {ladder.ref} · <span className="font-normal">{ladder.condition}</span>
                </p>
                <RiseLadder regulator={regulator} ambientC={ladder.ambientC} limitC={ladder.limitC} />
              </div>
            ) : null;
          })}
        </div>
      );
    case 'copper':
      return <CopperPicture board={block.board} />;
    case 'heat': {
      const { drawing } = block;
      const condition = result.conditions.find(({ name }) => name === drawing.condition);
      return condition ? (
        <div>
          <p className="mb-2 font-semibold">{drawing.condition}</p>
          <BoardPicture
            board={drawing.board}
            condition={condition}
            field={drawing.field}
            layer={drawing.layer}
            airC={drawing.airC}
          />
        </div>
      ) : null;
    }
  }
}

function BlockTable({ block }: { block: Extract<RecordBlock, { kind: 'table' }> }) {
  if (block.rows.length === 0) return block.empty ? <p className="text-ink-soft">{block.empty}</p> : null;
  return (
    <Table
      caption={block.columns.map(({ title }) => title).join(', ')}
      head={block.columns.map(({ title, align }) => ({ label: title, numeric: align === 'right' }))}
    >
      {block.rows.map((row, index) => (
        <Row key={index} className="text-sm">
          {row.map((cell, place) => (
            <Cell key={place} numeric={block.columns[place]?.align === 'right'} className="break-words">
              {cellContent(cell)}
            </Cell>
          ))}
        </Row>
      ))}
    </Table>
  );
}

const cellContent = (cell: RecordCell) =>
  typeof cell === 'string' ? cell : <VerdictMark verdict={cell.verdict} size={11} />;
