/** Where the sketch stands; shown in words, and never "saved" before the server has said so. */
export type SaveState =
  | { kind: 'saved'; at: string }
  /** Changed, the save is about to start. */
  | { kind: 'waiting' }
  | { kind: 'saving' }
  | { kind: 'offline' }
  | { kind: 'failed'; reason: string }
  /** Somebody else has saved since; nothing is sent until one of the ways out is chosen. */
  | { kind: 'conflict'; current: { version: number; savedBy: string; savedAt: string } };

/**
 * @param changes steps since the last save
 * @param timeText local time of day of an ISO timestamp
 */
export function saveStateText(state: SaveState, changes: number, timeText: (iso: string) => string): string {
  const kept = `${changes} ${changes === 1 ? 'change' : 'changes'} kept here`;
  switch (state.kind) {
    case 'saved':
      return `Saved ${timeText(state.at)}`;
    case 'waiting':
    case 'saving':
      return 'Saving…';
    case 'offline':
      return `Offline, ${kept}`;
    case 'failed':
      return `Could not save: ${state.reason}`;
    case 'conflict':
      return `Not saved: ${state.current.savedBy} saved meanwhile, ${kept}`;
  }
}
