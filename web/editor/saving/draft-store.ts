import type { BoardDocument } from '#core/board/document.ts';

/** A sketch that has not reached the server yet, with the version that it was made from. */
export type Draft = { baseVersion: number; changedAt: string; board: BoardDocument };

export type DraftStore = {
  read: () => Promise<Draft | null>;
  write: (draft: Draft) => Promise<void>;
  remove: () => Promise<void>;
};

const databaseName = 'dropwatt-drafts';
const storeName = 'drafts';

/** Drafts of one user and revision on this device; where the browser keeps nothing, every call quietly does nothing. */
export function draftStore(userId: string, revisionId: string): DraftStore {
  const key = `${userId}/${revisionId}`;
  return {
    read: async () => (await request<Draft | undefined>('readonly', (store) => store.get(key))) ?? null,
    write: async (draft) => void (await request('readwrite', (store) => store.put(draft, key))),
    remove: async () => void (await request('readwrite', (store) => store.delete(key))),
  };
}

/** Removes every draft from this device; called at sign-out. */
export async function clearDrafts(): Promise<void> {
  await request('readwrite', (store) => store.clear());
}

async function request<T>(
  mode: IDBTransactionMode,
  act: (store: IDBObjectStore) => IDBRequest,
): Promise<T | undefined> {
  if (!('indexedDB' in globalThis)) return undefined;
  try {
    const database = await opened();
    try {
      return await new Promise<T>((resolve, reject) => {
        const asked = act(database.transaction(storeName, mode).objectStore(storeName));
        asked.onsuccess = () => resolve(asked.result as T);
        asked.onerror = () => reject(asked.error ?? new Error('the browser refused to keep the draft'));
      });
    } finally {
      database.close();
    }
  } catch {
    // A private window may refuse; the server's copy and the page's own memory are still there.
    return undefined;
  }
}

function opened(): Promise<IDBDatabase> {
  return new Promise((resolve, reject) => {
    const asked = indexedDB.open(databaseName, 1);
    asked.onupgradeneeded = () => asked.result.createObjectStore(storeName);
    asked.onsuccess = () => resolve(asked.result);
    asked.onerror = () => reject(asked.error ?? new Error('the browser keeps no drafts'));
  });
}
