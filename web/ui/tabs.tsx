import { Tabs as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { tabClass } from './tab-class.ts';

type Props = {
  /** Name of the row of tabs for those who cannot see it. */
  label: string;
  value: string;
  onChange: (value: string) => void;
  tabs: readonly { value: string; label: ReactNode; content: ReactNode }[];
};

export function Tabs({ label, value, onChange, tabs }: Props) {
  return (
    <Radix.Root value={value} onValueChange={onChange}>
      <Radix.List aria-label={label} className="flex gap-6 overflow-x-auto border-b border-line">
        {tabs.map((tab) => (
          <Radix.Trigger key={tab.value} value={tab.value} className={tabClass}>
            {tab.label}
          </Radix.Trigger>
        ))}
      </Radix.List>
      {tabs.map((tab) => (
        <Radix.Content key={tab.value} value={tab.value} className="pt-6">
          {tab.content}
        </Radix.Content>
      ))}
    </Radix.Root>
  );
}
