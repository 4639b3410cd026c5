import { useSyncExternalStore } from 'react';
import { graphitePalette, type Palette, paperPalette } from './palette.ts';

/** Palette of the theme that the page stands in. */
export function useThemePalette(): Palette {
  const theme = useSyncExternalStore(watchTheme, () => document.documentElement.dataset.theme);
  return theme === 'graphite' ? graphitePalette : paperPalette;
}

function watchTheme(changed: () => void): () => void {
  const observer = new MutationObserver(changed);
  observer.observe(document.documentElement, { attributeFilter: ['data-theme'] });
  return () => observer.disconnect();
}
