import { type KeyboardEvent, useDeferredValue, useMemo, useRef, useState } from 'react';
import { formatNumber } from '#core/format.ts';
import { classes } from '#web/ui/classes.ts';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';
import { activeCheck } from '../canvas/use-heat-picture.ts';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { shownBoard } from '../editor-store.ts';
import { type ObjectKey, objectName } from '../object-key.ts';
import { objectRows } from './object-rows.ts';

const cellClass = 'px-1.5 py-1.5 first:pl-4 last:pr-4';

/** Every object as a row: arrows move, space selects (Shift adds), Delete deletes. */
export function ObjectTable() {
  const store = useEditorStore();
  const board = useDeferredValue(useEditor(shownBoard));
  const check = useEditor(activeCheck);
  const selection = useEditor((state) => state.selection);
  const rows = useMemo(() => objectRows(board, check?.condition ?? null), [board, check]);
  const [focused, setFocused] = useState<ObjectKey | null>(null);
  const body = useRef<HTMLTableSectionElement>(null);
  const stop = rows.some((row) => row.key === focused) ? focused : (rows[0]?.key ?? null);

  const select = (key: ObjectKey, extend: boolean) => {
    const toggled = selection.includes(key) ? selection.filter((other) => other !== key) : [...selection, key];
    store.setState({ selection: extend ? toggled : [key], crosshair: null });
  };
  const onKeyDown = (event: KeyboardEvent<HTMLTableRowElement>, index: number) => {
    const row = rows[index];
    if (!row) return;
    const target = { ArrowDown: index + 1, ArrowUp: index - 1, Home: 0, End: rows.length - 1 }[event.key];
    if (target !== undefined) {
      event.preventDefault();
      const next = body.current?.rows[Math.min(rows.length - 1, Math.max(0, target))];
      next?.focus();
    } else if (event.key === ' ' || event.key === 'Enter') {
      event.preventDefault();
      select(row.key, event.shiftKey || event.ctrlKey || event.metaKey);
    } else if (event.key === 'Delete' && !selection.includes(row.key)) {
      // What has the focus is what a person expects to go.
      store.setState({ selection: [row.key] });
    }
  };

  return (
    <div className="overflow-x-auto">
      <table role="grid" aria-label="Objects of the board" aria-multiselectable="true" className="w-full text-xs">
        <thead>
          <tr className="border-b border-line text-left text-ink-soft">
            {['Object', 'Net', 'Layer'].map((title) => (
              <th key={title} scope="col" className={`${cellClass} font-normal`}>
                {title}
              </th>
            ))}
            {['x, mm', 'y, mm', '°C'].map((title) => (
              <th key={title} scope="col" className={`${cellClass} text-right font-normal`}>
                {title}
              </th>
            ))}
            <th scope="col" className={`${cellClass} font-normal`}>
              <span className="sr-only">Verdict</span>
            </th>
          </tr>
        </thead>
        <tbody ref={body}>
          {rows.map((row, index) => (
            <tr
              key={row.key}
              tabIndex={row.key === stop ? 0 : -1}
              aria-selected={selection.includes(row.key)}
              onFocus={() => setFocused(row.key)}
              onKeyDown={(event) => onKeyDown(event, index)}
              onClick={(event) => select(row.key, event.shiftKey || event.ctrlKey || event.metaKey)}
              className={classes(
                'cursor-default border-b border-line outline-offset-[-2px]',
                selection.includes(row.key) ? 'bg-copper-soft' : 'hover:bg-paper',
              )}
            >
              <th scope="row" className={`${cellClass} text-left font-semibold whitespace-nowrap`}>
                {objectName(row.key)}
              </th>
              <td className={`${cellClass} max-w-20 truncate`}>{row.net}</td>
              <td className={`${cellClass} whitespace-nowrap`}>{row.layer}</td>
              <td className={`${cellClass} text-right`}>{formatNumber(row.xMm, 2)}</td>
              <td className={`${cellClass} text-right`}>{formatNumber(row.yMm, 2)}</td>
              <td className={`${cellClass} text-right`}>
                {row.temperatureC === null ? '' : formatNumber(row.temperatureC, 1)}
              </td>
              <td className={cellClass}>{row.verdict ? <VerdictMark verdict={row.verdict} wordHidden /> : null}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
