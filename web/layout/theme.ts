export type ThemeChoice = 'light' | 'graphite' | 'system';

const key = 'dropwatt.theme';
const dark = () => window.matchMedia('(prefers-color-scheme: dark)');
const listeners = new Set<() => void>();

/** What the person chose; the system's own preference until they do. */
export function themeChoice(): ThemeChoice {
  try {
    const kept = localStorage.getItem(key);
    return kept === 'light' || kept === 'graphite' ? kept : 'system';
  } catch {
    return 'system';
  }
}

export function chooseTheme(choice: ThemeChoice): void {
  try {
    localStorage.setItem(key, choice);
  } catch {
    // Storage may be switched off; the choice then lasts until the page is left.
  }
  applyTheme(choice);
  for (const listener of listeners) listener();
}

export function onThemeChoice(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

function applyTheme(choice: ThemeChoice): void {
  const graphite = choice === 'graphite' || (choice === 'system' && dark().matches);
  document.documentElement.dataset.theme = graphite ? 'graphite' : 'light';
}

/** Sets the theme before the first picture and follows the system while nothing was chosen. */
export function startTheme(): void {
  applyTheme(themeChoice());
  dark().addEventListener('change', () => applyTheme(themeChoice()));
}
