import { useEffect } from 'react';
import { announce } from './announce.ts';

/** Names the page in the window and to those who cannot see it change. */
export function useDocumentTitle(title: string): void {
  useEffect(() => {
    document.title = `${title} – Dropwatt`;
    announce(title);
  }, [title]);
}
