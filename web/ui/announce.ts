type Listener = (text: string) => void;
const listeners = new Set<Listener>();

/** Says something in the polite live region, e.g. "Saved". */
export function announce(text: string): void {
  for (const listener of listeners) listener(text);
}

export function onAnnounce(listener: Listener): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
