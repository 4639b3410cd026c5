import { type KeyboardEvent, useDeferredValue, useMemo, useRef, useState } from 'react';
import { formatNumber } from '#core/format.ts';
import { classes } from '#web/ui/classes.ts';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';
import { activeCheck } from '../canvas/use-heat-picture.ts';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { shownBoard } from '../editor-store.ts';
import { type ObjectKey, objectName } from '#core/board/object-key.ts';
import { objectRows } from './object-rows.ts';

const rowClass = 'col-span-full grid grid-cols-subgrid border-b border-line';
const cellClass = 'px-1.5 py-1.5 first:pl-4 last:pr-4';

/** Every object as a row: arrows move, space selects (Shift adds), Delete deletes. */
export function ObjectTable() {
  const store = useEditorStore();
  const board = useDeferredValue(useEditor(shownBoard));
  const check = useEditor(activeCheck);
  const selection = useEditor((state) => state.selection);
  const rows = useMemo(() => objectRows(board, check?.condition ?? null), [board, check]);
  const [focused, setFocused] = useState<ObjectKey | null>(null);
  const body = useRef<HTMLDivElement>(null);
  const stop = rows.some((row) => row.key === focused) ? focused : (rows[0]?.key ?? null);

  const select = (key: ObjectKey, extend: boolean) => {
    const toggled = selection.includes(key) ? selection.filter((other) => other !== key) : [...selection, key];
    store.setState({ selection: extend ? toggled : [key], crosshair: null });
  };
  const onKeyDown = (event: KeyboardEvent<HTMLDivElement>, index: number) => {
    const row = rows[index];
    if (!row) return;
    const target = { ArrowDown: index + 1, ArrowUp: index - 1, Home: 0, End: rows.length - 1 }[event.key];
    if (target !== undefined) {
      event.preventDefault();
      const place = Math.min(rows.length - 1, Math.max(0, target));
      body.current?.querySelectorAll<HTMLElement>('[data-object]')[place]?.focus();
    } else if (event.key === ' ' || event.key === 'Enter') {
      event.preventDefault();
      select(row.key, event.shiftKey || event.ctrlKey || event.metaKey);
    } else if (event.key === 'Delete' && !selection.includes(row.key)) {
      // What has the focus is what a person expects to go.
      store.setState({ selection: [row.key] });
    }
  };

  return (
    <div
      ref={body}
      role="grid"
      aria-label="Objects of the board"
      aria-multiselectable="true"
      aria-rowcount={rows.length + 1}
      className="grid grid-cols-[1fr_repeat(6,auto)] overflow-x-auto text-xs"
    >
      <div role="row" className={`${rowClass} text-ink-soft`}>
        {['Object', 'Net', 'Layer', 'x, mm', 'y, mm', '°C', 'Verdict'].map((title, column) => (
          <span
            key={title}
            role="columnheader"
            className={classes(cellClass, column > 2 && column < 6 && 'text-right')}
          >
            {column === 6 ? <span className="sr-only">{title}</span> : title}
          </span>
        ))}
      </div>
      {rows.map((row, index) => (
        <div
          key={row.key}
          role="row"
          data-object
          tabIndex={row.key === stop ? 0 : -1}
          aria-selected={selection.includes(row.key)}
          onFocus={() => setFocused(row.key)}
          onKeyDown={(event) => onKeyDown(event, index)}
          onClick={(event) => select(row.key, event.shiftKey || event.ctrlKey || event.metaKey)}
          className={classes(
            rowClass,
            'cursor-default outline-offset-[-2px]',
            selection.includes(row.key) ? 'bg-copper-soft' : 'hover:bg-paper',
          )}
        >
          <span role="rowheader" className={`${cellClass} font-semibold whitespace-nowrap`}>
            {objectName(row.key)}
          </span>
          <span role="gridcell" className={`${cellClass} max-w-20 truncate`}>
            {row.net}
          </span>
          <span role="gridcell" className={`${cellClass} whitespace-nowrap`}>
            {row.layer}
          </span>
          <span role="gridcell" className={`${cellClass} text-right`}>
            {formatNumber(row.xMm, 2)}
          </span>
          <span role="gridcell" className={`${cellClass} text-right`}>
            {formatNumber(row.yMm, 2)}
          </span>
          <span role="gridcell" className={`${cellClass} text-right`}>
            {row.temperatureC === null ? '' : formatNumber(row.temperatureC, 1)}
          </span>
          <span role="gridcell" className={cellClass}>
            {row.verdict ? <VerdictMark verdict={row.verdict} wordHidden /> : null}
          </span>
        </div>
      ))}
    </div>
  );
}
