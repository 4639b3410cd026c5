import { Tabs } from 'radix-ui';
import { useMemo, useState } from 'react';
import { tabClass } from '#web/ui/tab-class.ts';
import { FindingList } from '../findings/finding-list.tsx';
import { useFindings } from '../findings/use-findings.ts';
import { useEditor } from '../editor-context.ts';
import { objectKeys } from '#core/board/object-key.ts';
import { ObjectTable } from '../objects/object-table.tsx';
import { PropertiesPanel } from '../panels/properties-panel.tsx';

/** What is selected in figures, everything on the board as a table, and what is wrong with it. */
export function SidePanel() {
  const [tab, setTab] = useState('properties');
  const board = useEditor((state) => state.board);
  const count = useMemo(() => objectKeys(board).length, [board]);
  const { findings, cautions } = useFindings();
  const tabs = [
    { value: 'properties', label: 'Properties', content: <PropertiesPanel /> },
    { value: 'objects', label: `Objects ${count}`, content: <ObjectTable /> },
    { value: 'findings', label: `Findings ${findings.length + cautions.length}`, content: <FindingList /> },
  ];
  return (
    <Tabs.Root
      value={tab}
      onValueChange={setTab}
      className="flex min-h-0 min-w-0 flex-[2] flex-col border-t border-line bg-panel lg:w-[25rem] lg:flex-none lg:border-t-0 lg:border-l"
    >
      <Tabs.List aria-label="Board in figures" className="flex gap-5 overflow-x-auto border-b border-line px-4">
        {tabs.map(({ value, label }) => (
          <Tabs.Trigger key={value} value={value} className={tabClass}>
            {label}
          </Tabs.Trigger>
        ))}
      </Tabs.List>
      {tabs.map(({ value, content }) => (
        <Tabs.Content key={value} value={value} tabIndex={-1} className="min-h-0 flex-1 overflow-y-auto outline-none">
          {content}
        </Tabs.Content>
      ))}
    </Tabs.Root>
  );
}
