import { useSyncExternalStore } from 'react';
import { Icon } from '#web/ui/icon.tsx';
import { classes } from '#web/ui/classes.ts';
import { chooseTheme, onThemeChoice, themeChoice } from './theme.ts';

const choices = [
  { value: 'light', label: 'Light', icon: 'sun' },
  { value: 'graphite', label: 'Graphite', icon: 'moon' },
  { value: 'system', label: 'System', icon: 'screen' },
] as const;

/** Three ways the pages may look; `words` shows the names beside the signs. */
export function ThemeSwitch({ words = false, name }: { words?: boolean; name: string }) {
  const chosen = useSyncExternalStore(onThemeChoice, themeChoice);
  return (
    <fieldset className="inline-flex rounded-sm border border-line-strong">
      <legend className="sr-only">Theme</legend>
      {choices.map(({ value, label, icon }) => (
        <label
          key={value}
          title={label}
          className={classes(
            'relative inline-flex min-h-8 min-w-8 items-center justify-center gap-2 text-sm has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-focus',
            words && 'min-h-10 px-4',
            chosen === value ? 'bg-ink text-paper' : 'text-ink-soft hover:text-ink',
          )}
        >
          <input
            type="radio"
            name={name}
            value={value}
            checked={chosen === value}
            onChange={() => chooseTheme(value)}
            className="absolute inset-0 cursor-pointer opacity-0"
          />
          <Icon name={icon} />
          <span className={words ? undefined : 'sr-only'}>{label}</span>
        </label>
      ))}
    </fieldset>
  );
}
